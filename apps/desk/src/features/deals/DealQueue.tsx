import { useWords } from '@lydite/client';
import type { DeskDeal } from '@lydite/contracts';
import { Link, useSearchParams } from 'react-router-dom';
import { isEnded, stateWords, waitWords } from './deal-words.ts';

/** Deals by their next deadline. */
export function DealQueue({ deals, selected }: { deals: DeskDeal[]; selected: string | undefined }) {
  const [search] = useSearchParams();
  const { shortMoment, relative, money } = useWords();
  const to = (code: string) => {
    const next = new URLSearchParams(search);
    next.set('deal', code);
    return `?${next.toString()}`;
  };
  return (
    <ol className="border-t-[1.5px] border-ink mt-3">
      {deals.map((deal) => (
        <li key={deal.code} className="border-b border-line">
          <Link to={to(deal.code)} className="queue-link small" aria-current={deal.code === selected || undefined}>
            <span className="flex justify-between gap-4">
              <b>
                <span className="mono">{deal.code}</span> {stateWords(deal)}
              </b>
              <span className="num">{money(deal.holdMinor)}</span>
            </span>
            <span className="block truncate">{deal.title}</span>
            <span className="tiny mute block">
              {deal.dueAt
                ? `${deal.dueWhat} by ${shortMoment(deal.dueAt)}, ${relative(deal.dueAt)}`
                : isEnded(deal)
                  ? 'Ended'
                  : waitWords(deal)}
            </span>
          </Link>
        </li>
      ))}
    </ol>
  );
}
