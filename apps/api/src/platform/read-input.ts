import type { z } from 'zod';
import { AppError } from './app-error.ts';

/**
 * Parses one part of a request by its schema. Without a schema the part must be empty.
 * @throws AppError request.invalid that names every bad field, not only the first.
 */
export function readInput(schema: z.ZodType | undefined, value: unknown, part: 'path' | 'query' | 'body'): unknown {
  if (!schema) {
    const empty = value === undefined || value === null || Object.keys(value).length === 0;
    if (empty || part === 'path') return undefined;
    throw new AppError('request.invalid', `This call takes no ${part}.`);
  }
  const bad = unkeepableIn(value);
  if (bad !== null)
    throw new AppError('request.invalid', `${bad || part}: ${unkeepable}`, {
      fields: [{ path: bad, message: unkeepable }],
    });
  const parsed = schema.safeParse(isEmptyBody(part, value) ? undefined : value);
  if (parsed.success) return parsed.data;
  const fields = parsed.error.issues.flatMap((issue) =>
    issue.code === 'unrecognized_keys'
      ? issue.keys.map((key) => ({
          path: [...issue.path, key].join('.'),
          message: 'This field is not known here; leave it out.',
        }))
      : [{ path: issue.path.join('.'), message: issue.message }],
  );
  throw new AppError('request.invalid', fields.map((field) => `${field.path || part}: ${field.message}`).join(' '), {
    fields,
  });
}

const unkeepable = 'Leave out characters that are no text: NUL, or half of a pair.';

/** Path of the first text that the database could not keep, or null: NUL and halves of surrogate pairs are no characters to it. */
function unkeepableIn(value: unknown): string | null {
  if (typeof value === 'string') return value.includes('\0') || /\p{Surrogate}/u.test(value) ? '' : null;
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, one] of Object.entries(value)) {
    const inner = unkeepableIn(one);
    if (inner !== null) return inner ? `${key}.${inner}` : key;
  }
  return null;
}

/** A client may send `{}` where nothing is expected. */
const isEmptyBody = (part: string, value: unknown): boolean =>
  part === 'body' &&
  typeof value === 'object' &&
  value !== null &&
  !Array.isArray(value) &&
  Object.keys(value).length === 0;
