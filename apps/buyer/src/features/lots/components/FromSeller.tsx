import { useWords } from '@lydite/client';
import type { LotView } from '@lydite/contracts';

/** The seller's own words, how the lot is handed over, what it may hold that harms, and on what terms it is sold. */
export function FromSeller({ lot }: { lot: LotView }) {
  const hazards = [...new Set(lot.lines.map(({ hazards: words }) => words).filter(Boolean))];
  return (
    <>
      <section className="mt-8">
        <h2>From the seller</h2>
        <p className="lot-words">{lot.description || 'The seller wrote nothing more.'}</p>
      </section>
      <section className="mt-8">
        <h2>Delivery and terms</h2>
        <ul className="notes">
          <li>
            <Delivery lot={lot} />
          </li>
          <li>
            Sold outright, as it stands. Claims only on what was stated: mass, count, kind, plating, delivery, hazards.
          </li>
          <li>Gold only: other metals go to the buyer and are in the price.</li>
        </ul>
      </section>
      {hazards.length > 0 && (
        <section className="mt-8">
          <h2>Handling</h2>
          <ul className="notes">
            {hazards.map((words) => (
              <li key={words}>{words}</li>
            ))}
          </ul>
        </section>
      )}
    </>
  );
}

function Delivery({ lot: { delivery, place } }: { lot: LotView }) {
  const { money } = useWords();
  if (delivery.way === 'collection')
    return `Collection in ${place}${delivery.hours && `, ${delivery.hours}`}. The risk passes at hand-over.`;
  const freight =
    delivery.freightMinor === 0
      ? 'no freight is charged'
      : `freight of ${money(delivery.freightMinor)} is charged with the price`;
  return `The seller sends it from ${place}; ${freight}. The seller insures it, and the risk passes on receipt.`;
}
