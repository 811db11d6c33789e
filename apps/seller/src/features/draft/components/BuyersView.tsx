import { formatSignificant, MINUS, NBSP, StreakCard, StreakInline } from '@lydite/ui';
import type { LiveEstimate } from '../use-live-estimate.ts';
import { SavedNote } from './SavedLine.tsx';

/** What buyers would see of the draft as it stands, and what would narrow it. */
export function BuyersView({ estimate, before, narrowing }: LiveEstimate) {
  return (
    <section aria-labelledby="buyers-view">
      <h2 id="buyers-view" className="mb-2">
        What buyers would see
      </h2>
      <StreakCard estimate={estimate} before={before && { estimate: before, label: 'With nothing measured' }} />
      {narrowing.length > 0 && (
        <>
          <h3 className="ruled-head mt-6">What would narrow it most</h3>
          <ul className="ruled small">
            {narrowing.map(({ question, lessG }) => (
              <li key={question} className="flex justify-between gap-4">
                <span>{question}</span>
                <b className="num nowrap">
                  {MINUS}
                  {formatSignificant(lessG, 2)}
                  {NBSP}
                  <span className="unit">g</span>
                </b>
              </li>
            ))}
          </ul>
        </>
      )}
      {estimate && (
        <p className="tiny mute mt-3">
          Figures at the right: by how much the range would get shorter. The narrower the streak, the less a buyer has
          to keep back for doubt.
        </p>
      )}
    </section>
  );
}

/** The same in one line, for the foot of the page on phones. */
export function BuyersViewLine({ estimate }: Pick<LiveEstimate, 'estimate'>) {
  return (
    <div className="mb-3">
      {estimate && <StreakInline estimate={estimate} size="row" />}
      <p className="tiny mute mt-1 flex justify-between gap-4">
        <span>{estimate && '8 results in 10, as buyers would see it'}</span>
        <span>
          <SavedNote />
        </span>
      </p>
    </div>
  );
}
