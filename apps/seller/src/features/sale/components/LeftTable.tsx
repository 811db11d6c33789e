import { formatMoney, formatShare, MINUS, MoneyText } from '@lydite/ui';
import type { LeftRow } from '../what-is-left.ts';

interface LeftTableProps {
  rows: readonly LeftRow[];
  currency: string;
  sellerFeeShare: number;
  /** What a buyer with usual terms could safely bid; explained under the table. */
  usualMinor: number | null;
}

/** What a price leaves in the seller's hand, with every step to it. */
export function LeftTable({ rows, currency, sellerFeeShare, usualMinor }: LeftTableProps) {
  if (rows.length === 0) return null;
  const cents = { currency, cents: 'always' } as const;
  return (
    <section className="mt-10" aria-labelledby="what-is-left">
      <h2 id="what-is-left">What it leaves you</h2>
      <div className="table-scroll" role="region" aria-labelledby="what-is-left" tabIndex={0}>
        <table className="table">
          <thead>
            <tr>
              <th scope="col">If sold at</th>
              <th scope="col" className="r">
                Price
              </th>
              <th scope="col" className="r">
                Freight
              </th>
              <th scope="col" className="r whitespace-normal!">
                Market’s fee, {formatShare(sellerFeeShare)}
              </th>
              <th scope="col" className="r">
                In hand
              </th>
            </tr>
          </thead>
          <tbody>
            {rows.map(({ label, priceMinor, freightMinor, feeMinor, netMinor }) => (
              <tr key={label}>
                <th scope="row">{label}</th>
                <td className="r">
                  <MoneyText amountMinor={priceMinor} {...cents} />
                </td>
                <td className="r">
                  <MoneyText amountMinor={freightMinor} {...cents} />
                </td>
                <td className="r">
                  {MINUS}
                  <MoneyText amountMinor={feeMinor} {...cents} />
                </td>
                <td className="r">
                  <b>
                    <MoneyText amountMinor={netMinor} {...cents} />
                  </b>
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {usualMinor !== null && (
        <p className="small mute mt-3">
          With the market’s usual costs, yields and margin, a buyer could safely bid about{' '}
          {formatMoney(usualMinor, currency)} for this lot as you describe it. Buyers reckon with their own.
        </p>
      )}
    </section>
  );
}
