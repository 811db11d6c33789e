/** Template tag: numbers are rounded to a hundredth, lists are joined, empty values vanish. */
export function svg(strings, ...values) {
  return strings.reduce((text, part, index) => text + part + (index < values.length ? show(values[index]) : ''), '');
}

function show(value) {
  if (typeof value === 'number') return String(Math.round(value * 100) / 100);
  if (Array.isArray(value)) return value.join('');
  return value ? String(value) : '';
}

/** Calls `draw(index)` `count` times and joins what it returns. */
export const times = (count, draw) => Array.from({ length: count }, (_, index) => draw(index)).join('');

/** Moves and turns a drawing about its own origin. */
export const at = (x, y, drawing, turn = 0) =>
  svg`<g transform="translate(${x} ${y})${turn ? svg` rotate(${turn})` : ''}">${drawing}</g>`;

/** A rectangle centred on the origin. */
export const box = (width, height, fill, rest = '') =>
  svg`<rect x="${-width / 2}" y="${-height / 2}" width="${width}" height="${height}" fill="${fill}" ${rest}/>`;

/** The path of a rectangle centred on the origin, its corners cut square by `cut`. */
export function rectanglePath(width, height, cut = 0) {
  const [x, y] = [width / 2, height / 2];
  if (!cut) return svg`M${-x} ${-y}H${x}V${y}H${-x}Z`;
  return svg`M${cut - x} ${-y}H${x - cut}L${x} ${cut - y}V${y - cut}L${x - cut} ${y}H${cut - x}L${-x} ${y - cut}V${cut - y}Z`;
}

/** A line of lettering centred on (x, y). */
export const mark = (x, y, size, text, fill = '#8f9191', rest = '') =>
  svg`<text x="${x}" y="${y}" font-family="DejaVu Sans Mono, monospace" font-size="${size}" fill="${fill}" text-anchor="middle" ${rest}>${text}</text>`;
