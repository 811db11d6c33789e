import type { LineDraft } from '@lydite/contracts';
import { ChoiceRow, NumberField } from '@lydite/ui';
import { useState } from 'react';
import type { LineChange } from '../line-draft.ts';
import { HeldMeasure } from './HeldMeasure.tsx';

interface MoreFiguresProps {
  id: string;
  line: LineDraft;
  isPlated: boolean;
  onChange: (change: LineChange) => void;
}

const mm2PerCm2 = 100;
const within = (value: number | null, least: number, most: number) =>
  value !== null && value >= least && value <= most ? value : null;

/** Figures few sellers have, each of which takes the place of the kind's own guess. */
export function MoreFigures({ id, line, isPlated, onChange }: MoreFiguresProps) {
  return (
    <div className="fields pt-4">
      <ChoiceRow
        legend="How do you know the kind?"
        name={`${id}.identityEvidence`}
        value={line.identityEvidence}
        options={[
          { value: 'stated', label: 'Stated', hint: 'as it came to you' },
          { value: 'photographed', label: 'Photographed', hint: 'markings can be read' },
          { value: 'inspected', label: 'Inspected', hint: 'piece by piece' },
        ]}
        onChange={(identityEvidence) => onChange({ identityEvidence })}
      />
      <HeldMeasure
        label="Mass of one piece"
        optional
        kind="mass"
        unit="g"
        units={['g', 'kg', 'oz']}
        most={100_000}
        value={line.pieceMassG}
        onChange={(pieceMassG) => onChange({ pieceMassG })}
      />
      {isPlated && <PlatedFigures line={line} onChange={onChange} />}
      <AssayFigures assay={line.assay} onChange={(assay) => onChange({ assay })} />
    </div>
  );
}

function PlatedFigures({ line, onChange }: Pick<MoreFiguresProps, 'line' | 'onChange'>) {
  return (
    <>
      <div className="field-pair">
        <NumberField
          label="Contacts of one piece"
          optional
          isWhole
          value={line.contactsPerPiece}
          onChange={(contacts) => onChange({ contactsPerPiece: within(contacts, 1, 5000) })}
        />
        <HeldMeasure
          label="Area of one contact"
          optional
          kind="area"
          unit="mm2"
          units={['mm2', 'cm2']}
          most={10_000 / mm2PerCm2}
          value={line.padAreaMm2 === null ? null : line.padAreaMm2 / mm2PerCm2}
          onChange={(cm2) => onChange({ padAreaMm2: cm2 === null ? null : cm2 * mm2PerCm2 })}
        />
      </div>
      <div className="field-pair">
        <HeldMeasure
          label="Plated area of one piece"
          optional
          kind="area"
          unit="cm2"
          most={10_000}
          value={line.areaCm2PerPiece}
          onChange={(areaCm2PerPiece) => onChange({ areaCm2PerPiece })}
        />
        <NumberField
          label="Plating worn off"
          optional
          suffix="%"
          shownPer={100}
          value={line.wear}
          onChange={(wear) => onChange({ wear: within(wear, 0, 1) })}
        />
      </div>
    </>
  );
}

const usualAssaySd = 0.1;

/** A laboratory's figure outranks everything else that is known of a line. */
function AssayFigures({
  assay,
  onChange,
}: {
  assay: LineDraft['assay'];
  onChange: (assay: LineDraft['assay']) => void;
}) {
  const [relativeSd, setRelativeSd] = useState<number | null>(assay?.relativeSd ?? usualAssaySd);
  const [gradeGPerT, setGrade] = useState(assay?.gradeGPerT ?? null);
  const set = (grade: number | null, sd: number | null) => {
    setGrade(grade);
    setRelativeSd(sd);
    onChange(grade !== null && sd !== null && sd > 0 && sd <= 1 ? { gradeGPerT: grade, relativeSd: sd } : null);
  };
  return (
    <div className="field-pair">
      <HeldMeasure
        label="Assay of a sample"
        optional
        kind="grade"
        unit="g/t"
        most={1_000_000}
        mayBeZero
        value={gradeGPerT}
        onChange={(grade) => set(grade, relativeSd)}
      />
      <NumberField
        label="Doubt of the assay, ±"
        hint="Laboratory and sampling together, one standard deviation."
        suffix="%"
        shownPer={100}
        value={relativeSd}
        onChange={(sd) => set(gradeGPerT, sd)}
      />
    </div>
  );
}
