import type { LineDraft } from '@lydite/contracts';
import { ChoiceRow } from '@lydite/ui';
import { weighedLike, type LineChange } from '../line-draft.ts';
import { HeldMeasure } from './HeldMeasure.tsx';

const mostScaleG = 100_000;

interface ScaleFieldProps {
  id?: string;
  scaleResolutionG: number | null;
  onChange: (scaleResolutionG: number | null) => void;
}

/** The steps in which a scale counts; they are carried as the doubt of what it showed. */
export function ScaleField({ id, scaleResolutionG, onChange }: ScaleFieldProps) {
  return (
    <HeldMeasure
      label="Steps the scale shows"
      id={id}
      hint="The smallest change of its reading, often printed on it as d."
      kind="mass"
      unit={(scaleResolutionG ?? 0) >= 1000 ? 'kg' : 'g'}
      units={['g', 'kg']}
      value={scaleResolutionG}
      most={mostScaleG}
      onChange={onChange}
    />
  );
}

interface MassEvidenceProps {
  id: string;
  line: LineDraft;
  /** All lines of the lot: a scale named once need not be named again. */
  lines: readonly LineDraft[];
  onChange: (change: LineChange) => void;
}

/** How the mass is known, and by which scale. */
export function MassEvidence({ id, line, lines, onChange }: MassEvidenceProps) {
  return (
    <>
      <ChoiceRow
        legend="How do you know the mass?"
        name={`${id}.massEvidence`}
        value={line.massEvidence}
        options={[
          { value: 'weighed', label: 'Weighed', hint: 'on a scale, without packing' },
          { value: 'stated', label: 'Stated', hint: 'from papers, or a guess' },
        ]}
        onChange={(known) =>
          onChange(known === 'weighed' ? weighedLike(lines) : { massEvidence: 'stated', scaleResolutionG: null })
        }
      />
      {line.massEvidence === 'weighed' && (
        <ScaleField
          scaleResolutionG={line.scaleResolutionG}
          onChange={(scaleResolutionG) => onChange({ scaleResolutionG })}
        />
      )}
    </>
  );
}
