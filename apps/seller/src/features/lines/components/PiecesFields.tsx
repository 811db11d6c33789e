import type { LineDraft } from '@lydite/contracts';
import { ChoiceRow, NumberField, type Choice } from '@lydite/ui';
import { useState } from 'react';
import type { LineChange } from '../line-draft.ts';

interface PiecesProps {
  id: string;
  line: LineDraft;
  onChange: (change: LineChange) => void;
}

const most = 10_000_000;

/** The number of pieces, where it is known. */
export function PiecesField({ id, line, onChange }: PiecesProps) {
  return (
    <NumberField
      label="Pieces"
      id={id}
      isWhole
      value={line.pieces}
      onChange={(pieces) => onChange({ pieces: pieces !== null && pieces > 0 && pieces <= most ? pieces : null })}
    />
  );
}

type Known = LineDraft['countEvidence'] | 'not-known';

const choices: readonly Choice<Known>[] = [
  { value: 'counted', label: 'Counted', hint: 'each one' },
  { value: 'counted-on-photo', label: 'On a photo', hint: 'each one visible' },
  { value: 'stated', label: 'Estimate', hint: 'by eye or from papers' },
  { value: 'not-known', label: 'Not known', hint: 'mass only' },
];

/** How the number of pieces is known. Choosing before the number is typed waits for the number. */
export function CountEvidence({ id, line, onChange }: PiecesProps) {
  const [isAwaited, setIsAwaited] = useState(false);
  const isKnown = line.pieces !== null || isAwaited;
  return (
    <ChoiceRow
      legend="How do you know the number of pieces?"
      name={`${id}.countEvidence`}
      value={isKnown ? line.countEvidence : 'not-known'}
      options={choices}
      onChange={(known) => {
        setIsAwaited(known !== 'not-known');
        onChange(known === 'not-known' ? { pieces: null, countEvidence: 'stated' } : { countEvidence: known });
        if (known !== 'not-known' && line.pieces === null) document.getElementById(id)?.focus();
      }}
    />
  );
}
