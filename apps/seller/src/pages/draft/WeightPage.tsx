import { catalogueQuery, useTitle } from '@lydite/client';
import { EmptyState, formatMassG, buttonClass } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { useDraft } from '../../features/draft/draft-context.tsx';
import { ScaleField } from '../../features/lines/components/MassEvidence.tsx';
import { WeightRow } from '../../features/lines/components/WeightRow.tsx';
import { usualScaleG, type LineChange } from '../../features/lines/line-draft.ts';
import { classOf } from '../../features/lines/line-words.ts';
import { useHashFocus } from '../../lib/use-hash-focus.ts';

/** The net masses of all lines on one page, for standing at the scale. */
export function Component() {
  useTitle('What does it weigh?');
  const { lot, draft, edit } = useDraft();
  const { data: catalogue } = useSuspenseQuery(catalogueQuery());
  useHashFocus();
  const { lines } = draft;
  const weighed = lines.filter(({ massEvidence }) => massEvidence === 'weighed');
  const totalG = lines.reduce((sum, { massG }) => sum + (massG ?? 0), 0);

  const changeLine = (id: string, change: LineChange) =>
    edit((current) => ({
      ...current,
      lines: current.lines.map((line) => (line.id === id ? { ...line, ...change } : line)),
    }));
  const setScale = (scaleResolutionG: number | null) =>
    edit((current) => ({
      ...current,
      lines: current.lines.map((line) => (line.massEvidence === 'weighed' ? { ...line, scaleResolutionG } : line)),
    }));

  return (
    <>
      <h1 id="lines">What does it weigh?</h1>
      <p className="lead">
        Net: without pallet, box or bag. The buyer weighs in again on arrival; a difference within 0.5 % or twice the
        scale’s steps is nobody’s fault.
      </p>
      {lines.length === 0 ? (
        <div className="mt-6">
          <EmptyState
            title="No lines yet"
            action={
              <Link to={`/lots/${lot.code}/contents`} className={buttonClass()}>
                Say what is in the lot
              </Link>
            }
          >
            Each line of the contents gets its mass here.
          </EmptyState>
        </div>
      ) : (
        <>
          {weighed.length > 0 && (
            <div className="mt-6 max-w-96">
              <ScaleField
                key={weighed.length === 0 ? 'none' : 'some'}
                scaleResolutionG={weighed[0]?.scaleResolutionG ?? usualScaleG}
                onChange={setScale}
              />
            </div>
          )}
          <ul className="ruled ruled-head mt-6">
            {lines.map((line, index) => (
              <WeightRow
                key={line.id}
                index={index}
                line={line}
                lines={lines}
                kindName={classOf(catalogue, line.classCode)?.name ?? 'Kind not chosen'}
                onChange={(change) => changeLine(line.id, change)}
              />
            ))}
          </ul>
          <p className="mt-4">
            All lines together: <b className="num">{formatMassG(totalG)}</b> net
          </p>
        </>
      )}
    </>
  );
}
