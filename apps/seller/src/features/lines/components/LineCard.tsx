import { Button } from '@lydite/ui';
import { amountWords, classOf, lineName, platingWords } from '../line-words.ts';
import { LineForm, type LineFormProps } from './LineForm.tsx';

interface LineCardProps extends LineFormProps {
  isOpen: boolean;
  onOpen: () => void;
  onDone: () => void;
  onRemove: () => void;
}

/** One line of the lot: its form while it is being described, two lines of text otherwise. */
export function LineCard({ isOpen, onOpen, onDone, onRemove, ...form }: LineCardProps) {
  const { index, line, catalogue, warnings, checks } = form;
  const name = lineName(line, index);
  const kind = classOf(catalogue, line.classCode);
  const isToCheck = warnings.some(({ code }) => code === 'mass-per-piece') && !checks.isAccepted(line);
  const headId = `${line.id}-name`;
  return (
    <section className="sheet" aria-labelledby={headId}>
      <div className="sheet-head">
        <div className="min-w-0">
          <h2 id={headId}>{name}</h2>
          {!isOpen && (
            <p className="small mute">
              {kind?.name ?? 'Kind not chosen'}
              <br />
              {[amountWords(line), platingWords(line)].filter(Boolean).join(', ')}
              {isToCheck && <b className="block text-warn">One figure to check</b>}
            </p>
          )}
        </div>
        {isOpen ? (
          <>
            <Button look="quiet" onClick={onRemove} aria-label={`Remove ${name}`}>
              Remove
            </Button>
            <Button look="quiet" onClick={onDone} aria-label={`Close ${name}`}>
              Done
            </Button>
          </>
        ) : (
          <Button look="quiet" onClick={onOpen} aria-label={`Change ${name}`}>
            Change
          </Button>
        )}
      </div>
      {isOpen && <LineForm {...form} />}
    </section>
  );
}
