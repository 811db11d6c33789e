import { z } from 'zod';
import { badParameter, type ProcessorError } from './errors.ts';

const coded = (code: string, message: string) => ({ params: { code }, message });

/** A whole number sent as text, as everything in a form body is. */
export const integer = () =>
  z
    .string()
    .refine((text) => /^-?\d{1,15}$/.test(text), coded('parameter_invalid_integer', 'Invalid integer'))
    .transform(Number);

/** An amount in minor units: at least 1, at most 99 999 999. */
export const amount = () =>
  integer()
    .refine((minor) => minor >= 1, coded('parameter_invalid_integer', 'This value must be greater than or equal to 1.'))
    .refine((minor) => minor <= 99_999_999, coded('amount_too_large', 'Amount must be no more than 999,999.99'));

/** The amount of a payment: the processor takes nothing under 0.50. */
export const payableAmount = () =>
  amount().refine((minor) => minor >= 50, coded('amount_too_small', 'Amount must be at least 50 minor units.'));

export const flag = () => z.enum(['true', 'false']).transform((text) => text === 'true');
export const text = () => z.string().max(5_000);
export const currency = () =>
  z
    .string()
    .regex(/^[a-zA-Z]{3}$/)
    .transform((code) => code.toLowerCase());
export const metadata = () => z.record(z.string().max(40), z.string().max(500)).or(z.literal('').transform(() => ({})));

/** A list that arrives as `a[0]=…`, which the query parser turns into an array or, above 20 entries, an object. */
export const listOf = <T extends z.ZodType>(item: T) =>
  z.preprocess((value) => (value && typeof value === 'object' ? Object.values(value) : value), z.array(item));

const moment = z.union([
  integer(),
  z.strictObject({ gt: integer(), gte: integer(), lt: integer(), lte: integer() }).partial(),
]);

export type Moment = z.output<typeof moment>;

/** The paging fields and filters every list takes. */
export const paging = {
  limit: integer()
    .refine((n) => n >= 1 && n <= 100, coded('parameter_invalid_integer', 'Limit must be between 1 and 100.'))
    .optional(),
  starting_after: text().optional(),
  ending_before: text().optional(),
  created: moment.optional(),
};

export const momentFilter = () => moment.optional();

/** Fields the processor knows and the stand-in accepts without acting on them. */
export function ignored<K extends string>(...names: K[]): Record<K, z.ZodOptional<z.ZodUnknown>> {
  return Object.fromEntries(names.map((name) => [name, z.unknown().optional()])) as never;
}

/** Reads a request's parameters; throws the processor's error for the first bad one. */
export function readParameters<T extends z.ZodType>(schema: T, input: unknown): z.output<T> {
  const result = schema.safeParse(input ?? {});
  if (result.success) return result.data;
  throw toError(result.error.issues[0]!, input);
}

function toError(issue: z.core.$ZodIssue, input: unknown): ProcessorError {
  const param = bracketed(issue.path);
  if (issue.code === 'unrecognized_keys') {
    const name = bracketed([...issue.path, issue.keys[0] ?? '']);
    return badParameter('parameter_unknown', `Received unknown parameter: ${name}`, name);
  }
  if (issue.code === 'custom') return badParameter(String(issue.params?.code), issue.message, param);
  const value = issue.path.reduce<unknown>((at, key) => (at as Record<PropertyKey, unknown> | undefined)?.[key], input);
  if (value === undefined) return badParameter('parameter_missing', `Missing required param: ${param}.`, param);
  if (value === '') {
    return badParameter('parameter_invalid_empty', `You passed an empty string for '${param}'.`, param);
  }
  return badParameter('parameter_invalid', `Invalid ${param}: ${issue.message}`, param);
}

function bracketed(path: PropertyKey[]): string {
  const [first, ...rest] = path.map(String);
  return (first ?? '') + rest.map((key) => `[${key}]`).join('');
}
