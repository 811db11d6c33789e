import { formatNumber, MeasureField, unitsOf, type MeasureKind } from '@lydite/ui';
import { useState, type ReactNode } from 'react';

interface HeldMeasureProps {
  label: string;
  kind: MeasureKind;
  /** In the kind's base unit; null while nothing is known. */
  value: number | null;
  onChange: (value: number | null) => void;
  unit: string;
  units?: readonly string[];
  /** Largest figure the market takes, in the base unit. */
  most: number;
  /** Whether nothing at all is a sensible figure. */
  mayBeZero?: boolean;
  id?: string;
  hint?: ReactNode;
  optional?: boolean;
}

/** A measured figure of which only the value is kept: the text and unit typed live as long as the page. */
export function HeldMeasure({ value, onChange, unit, most, mayBeZero = false, ...field }: HeldMeasureProps) {
  const perUnit = (id: string) => unitsOf(field.kind).find((one) => one.id === id)?.perUnit ?? 1;
  const written = (base: number | null, id: string) =>
    base === null ? '' : formatNumber(base / perUnit(id), { maximumSignificantDigits: 6, useGrouping: false });
  const [entry, setEntry] = useState({ text: written(value, unit), unit, value });
  const [isOut, setIsOut] = useState(false);
  const shown = isOut || entry.value === value ? entry : { text: written(value, entry.unit), unit: entry.unit, value };
  const unitLabel = unitsOf(field.kind).find((one) => one.id === entry.unit)?.label ?? '';
  const error = isOut
    ? `Enter ${mayBeZero ? 'at most' : 'more than 0 and at most'} ${formatNumber(most / perUnit(entry.unit), { maximumSignificantDigits: 3 })} ${unitLabel}`
    : null;
  return (
    <MeasureField
      {...field}
      error={error}
      entry={shown}
      onChange={(next) => {
        const out = next.value !== null && (next.value > most || (next.value === 0 && !mayBeZero));
        const kept = out ? null : next.value;
        setIsOut(out);
        setEntry({ ...next, value: kept });
        onChange(kept);
      }}
    />
  );
}
