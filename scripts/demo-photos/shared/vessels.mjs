import { rectanglePath, svg, times } from './svg.mjs';

/** A round steel dish about its own origin: what lies behind its contents, and the rim in front of them. */
export function dish({ radius }) {
  const back = svg`<circle cx="14" cy="34" r="${radius + 8}" fill="#000" opacity=".35" filter="url(#blur-soft)"/><circle r="${radius}" fill="url(#steel-bright)"/><circle r="${radius * 0.94}" fill="#6f7577"/><circle r="${radius * 0.9}" cy="6" fill="url(#steel)"/><circle r="${radius * 0.86}" cy="-4" fill="none" stroke="#000" stroke-opacity=".28" stroke-width="40" filter="url(#blur-soft)"/>`;
  const rim = svg`<circle r="${radius * 0.985}" fill="none" stroke="#eef0f0" stroke-width="7"/><circle r="${radius * 0.955}" fill="none" stroke="#5a6062" stroke-width="4" opacity=".7"/>`;
  return { back, rim };
}

const segments = {
  0: 'abcdef',
  1: 'bc',
  2: 'abged',
  3: 'abgcd',
  4: 'fgbc',
  5: 'afgcd',
  6: 'afgedc',
  7: 'abc',
  8: 'abcdefg',
  9: 'abcdfg',
  '-': 'g',
};
const strokes = {
  a: 'M4 0H24',
  b: 'M28 3V23',
  c: 'M28 29V49',
  d: 'M4 52H24',
  e: 'M0 29V49',
  f: 'M0 3V23',
  g: 'M4 26H24',
};

/** A liquid-crystal reading such as `88.74` about its own origin; `height` in scene pixels. */
export function segmentDisplay(reading, { width, height, unit, note }) {
  const scale = (height * 0.56) / 52;
  let x = width / 2 - height * 0.5;
  const digits = [...reading].toReversed().map((sign) => {
    if (sign === '.') {
      x -= 9 * scale;
      return svg`<circle cx="${x}" cy="${height * 0.32}" r="${4.6 * scale}" fill="#1b261a"/>`;
    }
    x -= 40 * scale;
    const lit = Object.entries(strokes).map(
      ([name, path]) => svg`<path d="${path}" opacity="${segments[sign].includes(name) ? 1 : 0.06}"/>`,
    );
    return svg`<g transform="translate(${x} ${-height * 0.24}) skewX(-4) scale(${scale})" stroke="#1b261a" stroke-width="6.5" stroke-linecap="round">${lit}</g>`;
  });
  const small = svg`font-family="DejaVu Sans, sans-serif" fill="#1b261a"`;
  return svg`<path d="${rectanglePath(width, height, 4)}" fill="url(#display)" stroke="#15181a" stroke-width="4"/><path d="M${-width / 2} ${-height / 2}H${width * 0.1}L${-width * 0.1} ${height / 2}H${-width / 2}Z" fill="#fff" opacity=".1"/>${digits}<text x="${-width / 2 + 12}" y="${-height * 0.26}" ${small} font-size="${height * 0.16}">${note}</text><text x="${width / 2 - height * 0.46}" y="${height * 0.3}" ${small} font-size="${height * 0.2}">${unit}</text>`;
}

/** The head of a scale: display and keys, about its own origin. */
export function scaleHead(reading, { width, note = 'GROSS' }) {
  const height = width * 0.48;
  const keys = times(
    5,
    (index) =>
      svg`<rect x="${-width * 0.42 + index * width * 0.172}" y="${height * 0.24}" width="${width * 0.13}" height="${height * 0.14}" rx="5" fill="#5b6164"/><rect x="${-width * 0.42 + index * width * 0.172}" y="${height * 0.24}" width="${width * 0.13}" height="3" rx="1" fill="#899093"/>`,
  );
  return svg`<path d="${rectanglePath(width + 24, height + 30, 16)}" fill="#000" opacity=".3" transform="translate(10 18)" filter="url(#blur-soft)"/><path d="${rectanglePath(width, height, 12)}" fill="url(#rubber)"/><path d="${rectanglePath(width - 6, height - 6, 10)}" fill="none" stroke="#fff" stroke-opacity=".14" stroke-width="3"/><g transform="translate(0 ${-height * 0.14})">${segmentDisplay(reading, { width: width * 0.86, height: height * 0.5, unit: 'kg', note })}</g>${keys}`;
}

/** A ribbed plastic crate seen from the front, its mouth at the origin's height; `width` at the rim. */
export function crateFront({ width, height }) {
  const [top, bottom] = [width / 2, width / 2 - height * 0.07];
  const ribs = times(9, (index) => {
    const x = (index - 4) * (bottom * 0.22);
    return svg`<path d="M${x * 1.03 - 7} 66L${x - 7} ${height - 18}h14L${x * 1.03 + 7} 66Z" fill="#17293c" opacity=".55"/><path d="M${x * 1.03 - 9} 66L${x - 9} ${height - 18}" stroke="#6d92b8" stroke-opacity=".5" stroke-width="2"/>`;
  });
  const inside = svg`<path d="M${-top} 0L${30 - top} -70H${top - 30}L${top} 0Z" fill="url(#crate-inside)"/><path d="M${26 - top} -74H${top - 26}" stroke="#4c759e" stroke-width="14"/>`;
  const front = svg`<path d="M${-top + 8} 20H${top - 8}L${bottom} ${height}H${-bottom}Z" fill="url(#crate-blue)"/>${ribs}<rect x="-110" y="92" width="220" height="56" rx="24" fill="#101b27"/><rect x="-110" y="138" width="220" height="8" rx="4" fill="#5a82ab" opacity=".7"/><rect x="${-top - 6}" y="-14" width="${width + 12}" height="54" rx="7" fill="#3f678f"/><rect x="${-top - 6}" y="-14" width="${width + 12}" height="9" rx="4" fill="#7ba0c4"/><rect x="${-top - 6}" y="34" width="${width + 12}" height="12" fill="#0d1a27" opacity=".45"/>`;
  return { inside, front };
}
