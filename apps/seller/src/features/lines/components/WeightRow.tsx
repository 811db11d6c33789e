import type { LineDraft } from '@lydite/contracts';
import { Checkbox } from '@lydite/ui';
import { weighedLike, type LineChange } from '../line-draft.ts';
import { lineName } from '../line-words.ts';
import { MassField } from './MassField.tsx';

interface WeightRowProps {
  index: number;
  line: LineDraft;
  lines: readonly LineDraft[];
  kindName: string;
  onChange: (change: LineChange) => void;
}

/** One line's net mass on the page where all of them are weighed. */
export function WeightRow({ index, line, lines, kindName, onChange }: WeightRowProps) {
  const name = lineName(line, index);
  return (
    <li className="weight-row">
      <div>
        <h2>{name}</h2>
        <p className="small mute">{kindName}</p>
      </div>
      <MassField
        label={
          <>
            Net mass<span className="sr-only"> of {name}</span>
          </>
        }
        id={`lines.${index}.massG`}
        line={line}
        onChange={onChange}
      />
      <Checkbox
        label={
          <>
            Weighed<span className="sr-only">: {name}</span>
          </>
        }
        checked={line.massEvidence === 'weighed'}
        onChange={(event) =>
          onChange(event.target.checked ? weighedLike(lines) : { massEvidence: 'stated', scaleResolutionG: null })
        }
      />
    </li>
  );
}
