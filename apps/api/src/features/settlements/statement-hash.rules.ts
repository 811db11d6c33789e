import { createHash } from 'node:crypto';

/** JSON with the keys of every object in order, so that equal content is equal text. */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  const pairs = Object.entries(value)
    .filter(([, one]) => one !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : 1));
  return `{${pairs.map(([key, one]) => `${JSON.stringify(key)}:${canonicalJson(one)}`).join(',')}}`;
}

/** SHA-256 of a statement's content, in hexadecimal: whoever holds the statement can show that it was not changed. */
export const hashOfStatement = (content: object): string =>
  createHash('sha256').update(canonicalJson(content)).digest('hex');
