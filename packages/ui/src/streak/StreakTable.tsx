import { formatBreakEvenG } from '../text/format-mass.ts';
import { formatAbout } from '../text/format-money.ts';
import { formatSignificant } from '../text/format-number.ts';
import { streakTable } from './streak-rows.ts';
import type { StreakBid, StreakEstimate } from './streak-types.ts';

interface StreakTableProps {
  estimate: StreakEstimate;
  currency: string;
  pricePerGMinor?: number | null;
  bid?: StreakBid | null;
}

/** The same estimate as figures: the long alternative of the drawing. */
export function StreakTable({ estimate, currency, pricePerGMinor, bid }: StreakTableProps) {
  const rows = streakTable({ estimate, pricePerGMinor, bid });
  const hasValue = pricePerGMinor != null;
  return (
    <div className="table-scroll" role="region" aria-label="Estimate as a table" tabIndex={0}>
      <table className="table">
        <caption>{bid ? `You break even at ${formatBreakEvenG(bid.breakEvenG)}.` : 'Gold the lot may hold.'}</caption>
        <thead>
          <tr>
            <th scope="col">Of equally likely results</th>
            <th scope="col" className="r">
              Gold, g
            </th>
            <th scope="col" className="r">
              Gold, ozt
            </th>
            {hasValue && (
              <th scope="col" className="r">
                Value of the gold
              </th>
            )}
            {bid && (
              <th scope="col" className="r">
                Result at this bid
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.percentile}>
              <th scope="row">{row.label}</th>
              <td className="r">{formatSignificant(row.goldG, 2)}</td>
              <td className="r">{formatSignificant(row.goldOzt, 2)}</td>
              {row.valueMinor !== null && <td className="r">{formatAbout(row.valueMinor, currency)}</td>}
              {row.resultMinor !== null && (
                <td className="r">{formatAbout(row.resultMinor, currency, { signed: true })}</td>
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
