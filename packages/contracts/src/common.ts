import { z } from 'zod';

/** Integer minor units of the market's currency, at most 99 999 999 an operation (rules.md). */
export const amountMinor = z.int().min(0).max(99_999_999);
export const positiveMinor = z.int().min(1).max(99_999_999);
export const isoTime = z.iso.datetime();
export const lotCode = z.string().regex(/^L-\d{1,9}$/, 'A lot code looks like L-2481.');
export const dealCode = z.string().regex(/^D-\d{1,9}$/, 'A deal code looks like D-1043.');
export const shortText = (max: number) => z.string().trim().max(max, `At most ${max} characters.`);
export const nothing = z.undefined();

export const role = z.enum(['seller', 'buyer', 'assayer', 'operator']);
export type Role = z.infer<typeof role>;

export const page = <T extends z.ZodType>(row: T) =>
  z.object({ rows: z.array(row), total: z.int(), page: z.int(), pageSize: z.int() });

/** Page number in a query string. */
export const pageNumber = z.coerce.number().int().min(1).max(1000).default(1);

/** A step of the chain of custody as the rail shows it. */
export const chainStep = z.object({
  key: z.string(),
  title: z.string(),
  note: z.string(),
  state: z.enum(['done', 'now', 'todo']),
  at: isoTime.nullable(),
  by: z.string().nullable(),
});
export type ChainStep = z.infer<typeof chainStep>;
