import { addressOf, useWords } from '@lydite/client';
import type { DealRow, PayoutAccount } from '@lydite/contracts';
import { EmptyState } from '@lydite/ui';
import { Link } from 'react-router-dom';

const payoutWords: Record<string, string> = {
  pending: 'On its way',
  in_transit: 'On its way',
  paid: 'Paid to your bank',
  failed: 'Sent back by your bank',
  cancelled: 'Cancelled',
};

const transferWords: Record<string, string> = {
  waiting: 'Waits for your payout account',
  queued: 'On its way',
  sent: 'With your payout account',
  failed: 'Did not go out; the desk looks at it',
};

/** Settled deals with what each brought and its statement. */
export function SettlementsTable({ deals }: { deals: readonly DealRow[] }) {
  const { exactMoney, shortMoment } = useWords();
  const settled = deals.filter(({ sellerGetsMinor }) => sellerGetsMinor !== null);
  return (
    <section className="mt-10" aria-labelledby="settlements">
      <h2 id="settlements">Settlements</h2>
      {settled.length === 0 ? (
        <div className="mt-3">
          <EmptyState title="None yet">Each sold lot gets a statement here that you can check by hand.</EmptyState>
        </div>
      ) : (
        <div className="table-scroll" role="region" aria-labelledby="settlements" tabIndex={0}>
          <table className="table">
            <thead>
              <tr>
                <th scope="col">Deal</th>
                <th scope="col">When</th>
                <th scope="col">Where the money is</th>
                <th scope="col">Statement</th>
                <th scope="col" className="r">
                  To you
                </th>
              </tr>
            </thead>
            <tbody>
              {settled.map(({ code, title, updatedAt, payoutState, sellerGetsMinor }) => (
                <tr key={code}>
                  <th scope="row">
                    <Link to={`/deals/${code}`}>{title}</Link>
                    <small className="block mono mute">{code}</small>
                  </th>
                  <td>{shortMoment(updatedAt)}</td>
                  <td>{transferWords[payoutState ?? ''] ?? '–'}</td>
                  <td>
                    <Link to={`/deals/${code}/statement`}>Read</Link>,{' '}
                    <a href={addressOf('GET /deals/:dealCode/statement.pdf', { dealCode: code })}>PDF</a>
                  </td>
                  <td className="r">{exactMoney(sellerGetsMinor ?? 0)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </section>
  );
}

/** Payouts of the processor to the seller's bank, as last heard. */
export function PayoutsTable({ payouts }: Pick<PayoutAccount, 'payouts'>) {
  const { exactMoney, shortMoment } = useWords();
  if (payouts.length === 0) return null;
  return (
    <section className="mt-10" aria-labelledby="bank-payouts">
      <h2 id="bank-payouts">Paid out to your bank</h2>
      <table className="table">
        <thead>
          <tr>
            <th scope="col">When</th>
            <th scope="col">State</th>
            <th scope="col" className="r">
              Amount
            </th>
          </tr>
        </thead>
        <tbody>
          {payouts.map(({ id, at, state, amountMinor }) => (
            <tr key={id}>
              <td>{shortMoment(at)}</td>
              <td>{payoutWords[state] ?? state}</td>
              <td className="r">{exactMoney(amountMinor)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
