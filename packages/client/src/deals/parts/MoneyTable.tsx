import { MoneyText } from '@lydite/ui';
import type { ReactNode } from 'react';
import { useMarket } from '../../market/market.queries.ts';

export interface MoneyRow {
  label: string;
  detail?: ReactNode;
  amountMinor: number;
  /** A line that sums up those above it. */
  total?: boolean;
}

/** Amounts one below the other, as they are added up by hand; what is taken off carries a minus. */
export function MoneyTable({ caption, rows }: { caption: string; rows: readonly MoneyRow[] }) {
  const { currency } = useMarket();
  return (
    <table className="table">
      <caption className="sr-only">{caption}</caption>
      <tbody>
        {rows.map(({ label, detail, amountMinor, total }) => (
          <tr key={label} className={total ? 'font-semibold' : undefined}>
            <th scope="row" className={total ? 'font-semibold!' : undefined}>
              {label}
              {detail && <small className="block tiny mute font-normal">{detail}</small>}
            </th>
            <td className={total ? 'r font-medium!' : 'r'}>
              <MoneyText amountMinor={amountMinor} currency={currency} cents="always" />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
