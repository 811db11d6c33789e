import type { LineDraft } from '@lydite/contracts';
import { ChoiceRow, FieldError, Select, type Choice } from '@lydite/ui';
import { platingStandards } from '@lydite/valuation';
import { useState } from 'react';
import { fromEntry, mostThicknessUm, toEntry, type PlatingEntry } from '../plating-entry.ts';
import { HeldMeasure } from './HeldMeasure.tsx';

const choices: readonly Choice<PlatingEntry['known']>[] = [
  { value: 'not-known', label: 'Not known', hint: 'what the kind usually has' },
  { value: 'standard', label: 'By a standard', hint: 'a class on the data sheet' },
  { value: 'range', label: 'A range', hint: 'least and most' },
  { value: 'xrf', label: 'XRF reading', hint: 'measured on these' },
];

interface PlatingFieldsProps {
  id: string;
  plating: LineDraft['plating'];
  onChange: (plating: LineDraft['plating']) => void;
}

/** The thickness of the gold plating and how it is known, in µm or µin as the seller has it. */
export function PlatingFields({ id, plating, onChange }: PlatingFieldsProps) {
  const [entry, setEntry] = useState(() => toEntry(plating));
  const set = (change: Partial<PlatingEntry>) => {
    const next = { ...entry, ...change };
    setEntry(next);
    onChange(fromEntry(next));
  };
  const thickness = (label: string, field: 'leastUm' | 'mostUm' | 'thicknessUm') => (
    <HeldMeasure
      label={label}
      kind="plating"
      unit="um"
      most={mostThicknessUm}
      mayBeZero={field !== 'mostUm'}
      value={entry[field]}
      onChange={(value) => set({ [field]: value })}
    />
  );
  const isUpsideDown = entry.leastUm !== null && entry.mostUm !== null && entry.leastUm > entry.mostUm;
  return (
    <div className="fields">
      <ChoiceRow
        id={id}
        legend="How do you know the thickness of the gold plating?"
        value={entry.known}
        options={choices}
        onChange={(known) => set({ known })}
      />
      {entry.known === 'standard' && (
        <Select
          label="Standard and class"
          value={entry.standardId}
          onChange={(event) => set({ standardId: event.target.value })}
          options={[
            { value: '', label: 'Choose the class' },
            ...platingStandards.map((one) => ({ value: one.id, label: one.name })),
          ]}
        />
      )}
      {entry.known === 'range' && (
        <div className={isUpsideDown ? 'field-invalid' : undefined}>
          {isUpsideDown && <FieldError id={`${id}-order`}>The least is more than the most.</FieldError>}
          <div className="field-pair">
            {thickness('Least thickness', 'leastUm')}
            {thickness('Most thickness', 'mostUm')}
          </div>
        </div>
      )}
      {entry.known === 'xrf' && thickness('Thickness by XRF', 'thicknessUm')}
    </div>
  );
}
