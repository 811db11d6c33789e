import type { DealView, SettlementView } from '@lydite/contracts';
import { Link } from 'react-router-dom';
import { addressOf } from '../../call/call.ts';
import { useWords } from '../../market/use-words.ts';
import { MoneyTable } from './MoneyTable.tsx';

/** The own side's arithmetic, and where the money is. */
export function SettlementSection({ deal, settlement }: { deal: DealView; settlement: SettlementView }) {
  const { moment } = useWords();
  const isSeller = deal.side === 'seller';
  return (
    <section aria-labelledby="settlement-title" className="mt-10">
      <h2 id="settlement-title">Settlement</h2>
      <MoneyTable caption="Settlement" rows={isSeller ? settlement.sellerSteps : settlement.buyerSteps} />
      <p className="mt-3">{isSeller ? transferWords(settlement, moment) : refundWords(settlement, moment)}</p>
      <p className="mt-3 flex flex-wrap gap-x-6 gap-y-2">
        <Link to={`/deals/${deal.code}/statement`}>Settlement statement</Link>
        <a href={addressOf('GET /deals/:dealCode/statement.pdf', { dealCode: deal.code })}>Statement as PDF</a>
      </p>
    </section>
  );
}

function transferWords({ transfer }: SettlementView, moment: (iso: string) => string): string {
  if (!transfer) return 'Nothing is due to you from this settlement.';
  const words = {
    waiting: `Your share waits: ${transfer.reason || 'your payout account is not ready yet.'}`,
    queued: 'Your share is on its way to your payout account.',
    sent: `Your share was sent to your payout account${transfer.at ? `, ${moment(transfer.at)}` : ''}.`,
    failed: `Your share could not be sent${transfer.reason ? `: ${transfer.reason}` : '.'} The market’s desk is told.`,
  };
  return words[transfer.state];
}

function refundWords({ refund }: SettlementView, moment: (iso: string) => string): string {
  if (!refund) return 'Nothing was left in the hold to come back to you.';
  const words = {
    queued: 'What is left comes back to you the way you paid. It is on its way.',
    sent: `What was left has gone back the way you paid${refund.at ? `, ${moment(refund.at)}` : ''}.`,
    failed: 'What is left could not be sent back. The market’s desk is told.',
  };
  return words[refund.state];
}
