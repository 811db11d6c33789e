import { useWords } from '@lydite/client';
import type { DeskDeal } from '@lydite/contracts';
import { FactList } from '@lydite/ui';
import { ApproveStrip } from './ApproveStrip.tsx';
import { stateWords, waitWords } from './deal-words.ts';

/** One deal in read mode: its money, its deadline and its timeline. */
export function DealCase({ deal }: { deal: DeskDeal }) {
  const { moment, relative, exactMoney } = useWords();
  return (
    <article aria-labelledby="case-title">
      <h2 id="case-title" className="text-title! leading-title">
        {deal.title}
      </h2>
      <p className="facts">
        <span>
          Deal <span className="mono">{deal.code}</span>
        </span>
        <a className="link-row" href={`/lots/${deal.lotCode}`}>
          Lot <span className="mono">{deal.lotCode}</span>
        </a>
        <span>
          <b>{stateWords(deal)}</b>
        </span>
      </p>
      <p className="say mt-4">
        {deal.dueAt ? (
          <>
            {deal.dueWhat} by <b>{moment(deal.dueAt)}</b>, {relative(deal.dueAt)}.
          </>
        ) : (
          waitWords(deal)
        )}
      </p>
      <ApproveStrip deal={deal} />
      <div className="mt-4">
        <FactList
          facts={[
            { name: 'Seller', value: deal.seller },
            { name: 'Buyer', value: deal.buyer },
            { name: 'To be held', value: <span className="num">{exactMoney(deal.holdMinor)}</span> },
            { name: 'In the hold now', value: <span className="num">{exactMoney(deal.heldMinor)}</span> },
          ]}
        />
      </div>
      <h3 className="mt-8">Timeline</h3>
      <ol className="ruled mt-2 border-t-[1.5px] border-ink">
        {deal.events.toReversed().map((event) => (
          <li key={`${event.at} ${event.title}`} className="small grid gap-x-6 md:grid-cols-[12rem_minmax(0,1fr)]">
            <time dateTime={event.at} className="mono mute">
              {moment(event.at)}
            </time>
            <span>
              <b>{event.title}</b> <span className="mute">· {event.by}</span>
            </span>
          </li>
        ))}
      </ol>
    </article>
  );
}
