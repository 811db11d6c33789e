import type { LineDraft } from '@lydite/contracts';
import { Notice, TextField } from '@lydite/ui';
import type { Catalogue, Warning } from '@lydite/valuation';
import type { AcceptedChecks } from '../accepted-checks.ts';
import type { LineChange } from '../line-draft.ts';
import { classOf, isPlated } from '../line-words.ts';
import { KindField } from './KindField.tsx';
import { MassCheck } from './MassCheck.tsx';
import { MassEvidence } from './MassEvidence.tsx';
import { MassField } from './MassField.tsx';
import { MoreFigures } from './MoreFigures.tsx';
import { CountEvidence, PiecesField } from './PiecesFields.tsx';
import { PlatingFields } from './PlatingFields.tsx';

export interface LineFormProps {
  /** Where the line stands in the draft; names its fields as the market names what is missing. */
  index: number;
  line: LineDraft;
  lines: readonly LineDraft[];
  catalogue: Catalogue;
  warnings: readonly Warning[];
  checks: AcceptedChecks;
  onChange: (change: LineChange) => void;
}

const asked = 'mass-per-piece';

/** Everything that can be said of one kind of material in the lot. */
export function LineForm({ index, line, lines, catalogue, warnings, checks, onChange }: LineFormProps) {
  const at = (field: string) => `lines.${index}.${field}`;
  const kind = classOf(catalogue, line.classCode);
  const massCheck = warnings.find(({ code }) => code === asked);
  const others = warnings.filter(({ code }) => code !== asked && code !== 'nothing-given');
  return (
    <div className="sheet-body">
      <KindField
        id={at('classCode')}
        catalogue={catalogue}
        classCode={line.classCode}
        onChange={(classCode) => onChange({ classCode })}
      />
      <TextField
        label="Your name for it"
        id={at('label')}
        optional
        value={line.label}
        onChange={(event) => onChange({ label: event.target.value.slice(0, 80) })}
      />
      <div className="field-pair">
        <PiecesField id={at('pieces')} line={line} onChange={onChange} />
        <MassField label="Mass, net" id={at('massG')} line={line} onChange={onChange} />
      </div>
      {massCheck && kind && !checks.isAccepted(line) && (
        <MassCheck
          line={line}
          kind={kind}
          warning={massCheck}
          onChange={onChange}
          onAccept={() => checks.accept(line)}
        />
      )}
      {others.map(({ code, message }) => (
        <Notice key={code} tone="warn">
          {message.replace(/([^.?])$/, '$1.')}
        </Notice>
      ))}
      <CountEvidence id={at('pieces')} line={line} onChange={onChange} />
      <MassEvidence id={at('massG')} line={line} lines={lines} onChange={onChange} />
      {isPlated(kind) && (
        <PlatingFields id={at('plating')} plating={line.plating} onChange={(plating) => onChange({ plating })} />
      )}
      <details className="more">
        <summary>More you may know: how the kind is known, contacts, an assay</summary>
        <MoreFigures id={at('more')} line={line} isPlated={isPlated(kind)} onChange={onChange} />
      </details>
    </div>
  );
}
