import type { DealView } from '@lydite/contracts';
import { Notice } from '@lydite/ui';
import { useSearchParams } from 'react-router-dom';
import { useWords } from '../../market/use-words.ts';

/** How the payment stands. Coming back from the payment page proves nothing: only the processor's word counts. */
export function PaymentNotice({ deal }: { deal: DealView }) {
  const { exactMoney } = useWords();
  const cameBack = useSearchParams()[0].get('paid');
  const { payment, side, state, holdMinor } = deal;
  if (side !== 'buyer') return null;
  if (state === 'held' && cameBack === '1')
    return (
      <Notice tone="ok" live title={`${exactMoney(holdMinor)} is in the hold.`}>
        The seller is told to hand the lot over.
      </Notice>
    );
  if (state !== 'awaiting_payment') return null;
  if (payment.state === 'failed')
    return (
      <Notice tone="danger" live title="The payment did not go through.">
        {payment.message} Nothing was taken. You can pay again, also in another way.
      </Notice>
    );
  if (payment.state === 'processing')
    return (
      <Notice live title="Your bank is processing the payment.">
        {payment.message || 'The time to pay stands still until its word is here.'}
      </Notice>
    );
  if (cameBack === '1' || payment.state === 'succeeded')
    return (
      <Notice live title="Waiting for the processor’s word.">
        As soon as the money is in the hold, this page says so. You can close it: we write to you as well.
      </Notice>
    );
  if (cameBack === '0') return <Notice title="You came back without paying.">Nothing was taken.</Notice>;
  return null;
}
