/** The key of the next attempt: `transfer:…:create:1` becomes `transfer:…:create:2`. */
export function nextKey(key: string): string {
  const [, stem, attempt] = /^(.*):(\d+)$/.exec(key) ?? [];
  if (!stem) throw new RangeError(`Not a key that ends in its attempt: ${key}`);
  return `${stem}:${Number(attempt) + 1}`;
}
