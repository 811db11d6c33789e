import type { LineDraft } from '@lydite/contracts';
import type { ReactNode } from 'react';
import { formatNumber, MeasureField } from '@lydite/ui';
import type { LineChange } from '../line-draft.ts';

const units = ['kg', 'g', 'lb', 'oz', 'ozt'] as const;
const mostG = 100_000_000;
const mostCharacters = 40;

interface MassFieldProps {
  label: ReactNode;
  id?: string;
  line: LineDraft;
  onChange: (change: LineChange) => void;
}

const textOf = ({ massText, massG, massUnit }: LineDraft): string =>
  massText ??
  (massG === null ? '' : formatNumber(massUnit === 'kg' ? massG / 1000 : massG, { maximumSignificantDigits: 7 }));

/** The net mass of a line; the text and unit are kept as they were typed, beside the grams they mean. */
export function MassField({ label, id, line, onChange }: MassFieldProps) {
  return (
    <MeasureField
      label={label}
      id={id}
      kind="mass"
      units={units}
      entry={{ text: textOf(line), unit: line.massText === null && line.massUnit !== 'kg' ? 'g' : line.massUnit }}
      onChange={({ text: typed, unit, value }) =>
        onChange({
          massText: typed.trim() === '' ? null : typed.slice(0, mostCharacters),
          massUnit: units.find((one) => one === unit) ?? 'kg',
          massG: value !== null && value > 0 && value <= mostG ? value : null,
        })
      }
    />
  );
}
