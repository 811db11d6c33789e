import { randomInt } from 'node:crypto';

const letters = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789';

/** A fresh id such as `pi_3kQ…`: the kind's prefix and 24 random letters and digits. */
export function newId(prefix: string, length = 24): string {
  return `${prefix}_${Array.from({ length }, () => letters[randomInt(letters.length)]).join('')}`;
}

/** The id of a field that holds either an id or, when expanded, the whole object. */
export function idOf(reference: string | { id: string } | null | undefined): string | null {
  if (!reference) return null;
  return typeof reference === 'string' ? reference : reference.id;
}
