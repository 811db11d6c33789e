import { announce, useTitle, useWords } from '@lydite/client';
import type { BidOutcome } from '@lydite/contracts';
import { buttonClass, NotchMark } from '@lydite/ui';
import { useEffect, useRef } from 'react';
import { Link } from 'react-router-dom';
import { mostParam } from '../../../lib/most-param.ts';

/** The market's word on a bid that was just sent. */
export function BidOutcomeView({ lotCode, outcome }: { lotCode: string; outcome: BidOutcome }) {
  const { money, moment } = useWords();
  const { standing, ceilingMinor, priceMinor, leastNextMinor, closesAt } = outcome;
  const isHighest = standing === 'highest';
  const title = isHighest ? 'Highest' : 'Outbid';
  const head = useRef<HTMLHeadingElement>(null);
  useTitle(`${title}, ${lotCode}`);
  useEffect(() => {
    head.current?.focus();
    announce(`${title}. The highest bid is ${money(priceMinor)}.`, { own: true });
  }, [title, money, priceMinor]);
  return (
    <>
      <h1 ref={head} tabIndex={-1}>
        <NotchMark isOwn={isHighest} />
        {title}
      </h1>
      <p className="say mt-4">
        {isHighest ? (
          <>
            Your bid leads at <b>{money(priceMinor)}</b>. If others bid, the market goes on for you up to{' '}
            <b>{money(ceilingMinor)}</b>.
          </>
        ) : (
          <>
            Your bid of at most {money(ceilingMinor)} is placed, but another buyer would pay more: the highest bid is{' '}
            <b>{money(priceMinor)}</b>. The next bid starts at {money(leastNextMinor)}.
          </>
        )}
      </p>
      <p className="mt-3 mute">
        The lot closes {moment(closesAt)}. {isHighest && 'You get a mail if you are outbid.'}
      </p>
      <p className="actions">
        {isHighest ? (
          <Link className={buttonClass('primary')} to="/bids">
            See my bids
          </Link>
        ) : (
          <Link className={buttonClass('primary')} to={`/lots/${lotCode}?${mostParam(leastNextMinor)}`}>
            Weigh another bid
          </Link>
        )}
        <Link className={buttonClass('quiet')} to={`/lots/${lotCode}`}>
          Back to the lot
        </Link>
      </p>
    </>
  );
}
