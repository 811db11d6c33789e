import type { LineDraft } from '@lydite/contracts';
import { Button, formatMassG, Notice } from '@lydite/ui';
import { likelyMassG, type MaterialClass, type Warning } from '@lydite/valuation';
import type { LineChange } from '../line-draft.ts';

interface MassCheckProps {
  line: LineDraft;
  kind: MaterialClass;
  warning: Warning;
  onChange: (change: LineChange) => void;
  onAccept: () => void;
}

/** Asks about a mass that does not go with the number of pieces: the likely one, or the typed one, at one press. */
export function MassCheck({ line: { massG, pieces }, kind, warning, onChange, onAccept }: MassCheckProps) {
  if (massG === null || pieces === null) return null;
  const likelyG = likelyMassG({ massG, pieces }, kind);
  const [finding, ...rest] = warning.message.split(/(?<=\.) /);
  return (
    <Notice
      tone="warn"
      live
      title={finding}
      actions={
        <>
          {likelyG !== null && (
            <Button onClick={() => onChange(massInKgOrG(likelyG))}>Use {formatMassG(likelyG)}</Button>
          )}
          <Button look="quiet" onClick={onAccept}>
            {formatMassG(massG)} is right
          </Button>
        </>
      }
    >
      {rest.join(' ')}
    </Notice>
  );
}

function massInKgOrG(massG: number): LineChange {
  const unit = massG >= 1000 ? 'kg' : 'g';
  const figure = Number((unit === 'kg' ? massG / 1000 : massG).toPrecision(6));
  return { massG: Number(massG.toPrecision(6)), massText: String(figure), massUnit: unit };
}
