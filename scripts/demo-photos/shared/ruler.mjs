import { rectanglePath, svg, times } from './svg.mjs';

/**
 * A steel or white rule with millimetre marks, as a part to lay down.
 * @param {{ lengthMm: number, pixelsPerMm: number, steel?: boolean }} plan
 */
export function ruler({ lengthMm, pixelsPerMm, steel = false }) {
  const width = (lengthMm + 8) * pixelsPerMm;
  const height = Math.min(96, 20 * pixelsPerMm + 26);
  const left = -width / 2 + 4 * pixelsPerMm;
  const marks = times(lengthMm + 1, (mm) => {
    const tall = height * (mm % 10 === 0 ? 0.4 : mm % 5 === 0 ? 0.3 : 0.18);
    const digits =
      mm % 10 === 0
        ? svg`<text x="${left + mm * pixelsPerMm}" y="${-height / 2 + height * 0.7}" text-anchor="middle" font-family="DejaVu Sans, sans-serif" font-size="${height * 0.25}" fill="#1d1f20">${String(mm / 10)}</text>`
        : '';
    return svg`<rect x="${left + mm * pixelsPerMm - 0.8}" y="${-height / 2}" width="1.6" height="${tall}" fill="#1d1f20"/>${digits}`;
  });
  const unit = svg`<text x="${width / 2 - 6}" y="${height / 2 - 8}" text-anchor="end" font-family="DejaVu Sans, sans-serif" font-size="${height * 0.16}" fill="#444">cm</text>`;
  const outline = rectanglePath(width, height);
  const face = svg`<path d="${outline}" fill="url(#${steel ? 'steel-bright' : 'paper'})"/>${marks}${unit}`;
  return { outline, face, edge: steel ? '#777c7e' : '#bdb9ab', thickness: 3 };
}
