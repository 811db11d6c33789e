import type { ColumnOptions, ValueTransformer } from 'typeorm';

/** @throws RangeError for anything but a safe integer: a float has got onto the money path. */
export function assertMinorUnits(value: number): number {
  if (!Number.isSafeInteger(value)) throw new RangeError(`Not an amount in minor units: ${value}`);
  return value;
}

/** PostgreSQL's bigint arrives as text. */
const minorUnits: ValueTransformer = {
  to: (value?: number | null) => (value === null || value === undefined ? value : assertMinorUnits(value)),
  from: (text?: string | null) => (text === null || text === undefined ? text : assertMinorUnits(Number(text))),
};

/** PostgreSQL's numeric arrives as text; masses and prices per gram fit a double exactly enough to show and to value. */
const decimal: ValueTransformer = {
  to: (value?: number | null) => value,
  from: (text?: string | null) => (text === null || text === undefined ? text : Number(text)),
};

/** An amount of money in minor units. */
export const money = (name: string, extra: ColumnOptions = {}): ColumnOptions => ({
  type: 'bigint',
  name,
  transformer: minorUnits,
  ...extra,
});
/** A mass in grams or another measured figure. */
export const measure = (name: string, extra: ColumnOptions = {}): ColumnOptions => ({
  type: 'numeric',
  name,
  transformer: decimal,
  ...extra,
});
export const moment = (name: string, extra: ColumnOptions = {}): ColumnOptions => ({
  type: 'timestamptz',
  name,
  ...extra,
});
