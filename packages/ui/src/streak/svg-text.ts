/** A coordinate with at most `digits` decimals, trailing zeros dropped, so that the same drawing is the same string. */
export function coordinate(value: number, digits = 1): string {
  const text = value.toFixed(digits);
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text;
  return short === '-0' ? '0' : short;
}

const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Text made safe for an SVG node or attribute. */
export function escapeSvg(text: string): string {
  return text.replace(/[&<>"']/g, (character) => entities[character] ?? character);
}
