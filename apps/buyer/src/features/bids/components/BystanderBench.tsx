import { useWords } from '@lydite/client';
import type { LotView } from '@lydite/contracts';
import { buttonClass, formatNumber, Reading } from '@lydite/ui';
import { Link } from 'react-router-dom';

interface BystanderBenchProps {
  lot: LotView;
  /** Why this reader has no bench of their own. */
  reader: 'visitor' | 'no-buyer' | 'seller';
}

/** The row under the stone for those who can't bid: what the lot stands at, and what would let them. */
export function BystanderBench({ lot, reader }: BystanderBenchProps) {
  return (
    <div className="bench">
      <Price lot={lot} />
      <div className="bench-field">
        <Invitation lot={lot} reader={reader} />
      </div>
    </div>
  );
}

function Price({ lot: { form, priceMinor, startMinor, bidders } }: { lot: LotView }) {
  const { money } = useWords();
  if (form === 'asking-price')
    return (
      <Reading name="Asking price" value={money(priceMinor ?? 0)}>
        The first buyer to take it has the lot.
      </Reading>
    );
  if (priceMinor === null)
    return (
      <Reading name="First bid from" value={money(startMinor ?? 0)}>
        No bids yet.
      </Reading>
    );
  return (
    <Reading name="Highest bid" value={money(priceMinor)}>
      {formatNumber(bidders)} {bidders === 1 ? 'buyer' : 'buyers'} so far.
    </Reading>
  );
}

function Invitation({ lot, reader }: BystanderBenchProps) {
  const next = encodeURIComponent(`/lots/${lot.code}`);
  if (reader === 'seller')
    return (
      <>
        <h3>This is your own lot</h3>
        <p className="small mute mt-1">
          Nobody bids on their own lot. <a href={`/sell/lots/${lot.code}`}>See it in My lots</a>
        </p>
      </>
    );
  if (reader === 'no-buyer')
    return (
      <>
        <h3>Bidding needs the buying role</h3>
        <p className="small mute mt-1">
          <Link to="/account">Add it in your account</Link>; then this row tells what the lot is worth to you.
        </p>
      </>
    );
  return (
    <>
      <h3>What would it be worth to you?</h3>
      <p className="small mute mt-1">
        Signed in as a buyer, you see here the bid that breaks even at your own yields and costs, and how often you
        would come out ahead.
      </p>
      <p className="actions mt-3">
        <Link className={buttonClass('primary')} to={`/sign-in?next=${next}`}>
          Sign in to bid
        </Link>
        <Link className={buttonClass('quiet')} to="/register">
          Register
        </Link>
      </p>
    </>
  );
}
