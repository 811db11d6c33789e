import { useWords } from '@lydite/client';
import type { LotView } from '@lydite/contracts';
import { buttonClass, Notice } from '@lydite/ui';
import { Link } from 'react-router-dom';

const dealAddress = ({ you }: LotView): string | null =>
  you?.dealCode ? (you.seller ? `/sell/deals/${you.dealCode}` : `/deals/${you.dealCode}`) : null;

/** How the sale of a closed lot ended, and where it goes on for those it concerns. */
export function SaleResult({ lot }: { lot: LotView }) {
  const words = useResultWords(lot);
  const address = dealAddress(lot);
  const look = buttonClass('primary');
  return (
    <div className="mt-5">
      <Notice title={words.title}>{words.text}</Notice>
      {address && (
        <p className="actions mt-3">
          {lot.you?.seller ? (
            <a className={look} href={address}>
              Open deal {lot.you.dealCode}
            </a>
          ) : (
            <Link className={look} to={address}>
              Open deal {lot.you?.dealCode}
            </Link>
          )}
        </p>
      )}
    </div>
  );
}

function useResultWords(lot: LotView): { title: string; text: string } {
  const { money } = useWords();
  const sold = lot.priceMinor === null ? '' : ` at ${money(lot.priceMinor)}`;
  const { standing = null, dealCode = null, seller = false } = lot.you ?? {};
  switch (lot.state) {
    case 'open':
      return { title: 'Closed.', text: 'The result is being worked out; it will be here in a moment.' };
    case 'frozen':
      return {
        title: 'Frozen by the desk.',
        text: 'Bids are taken again when it is released; the close moves by the time it stood still.',
      };
    case 'offered':
      return {
        title: 'Offered to the next bidder.',
        text:
          standing === null
            ? 'The winner did not pay in time.'
            : 'The winner did not pay in time. If it is offered to you, My bids asks for your answer.',
      };
    case 'awarded':
      if (dealCode && !seller)
        return { title: `You have this lot${sold}.`, text: 'The deal says what is due next, and when.' };
      return {
        title: `Sold${sold}.`,
        text: standing !== null && !seller ? 'It went to another buyer; nothing of yours is bound here any more.' : '',
      };
    case 'withdrawn':
      return { title: 'Withdrawn.', text: 'The lot is not for sale any more. Bids on it have lapsed.' };
    default:
      return {
        title: 'Ended unsold.',
        text: lot.reserve === 'not-reached' ? 'The seller’s lowest price was not reached.' : '',
      };
  }
}
