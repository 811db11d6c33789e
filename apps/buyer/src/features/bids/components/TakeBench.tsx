import { useWords } from '@lydite/client';
import type { BuyingTerms, LotView } from '@lydite/contracts';
import { buttonClass, Reading } from '@lydite/ui';
import { Link } from 'react-router-dom';
import type { BidReading, LotWorth } from '../../../lib/worth/lot-worth.ts';
import { Readings } from './Readings.tsx';

interface TakeBenchProps {
  lot: LotView;
  askingMinor: number;
  worth: LotWorth;
  terms: BuyingTerms;
  reading: BidReading;
}

/** The same row for a lot at an asking price: what that price means, and the way to take it. */
export function TakeBench({ lot, askingMinor, worth, terms, reading }: TakeBenchProps) {
  const { money } = useWords();
  const { safeBidMinor } = worth;
  return (
    <div className="bench">
      <Reading name="Asking price" value={money(askingMinor)}>
        The first buyer to take it has the lot.{' '}
        {safeBidMinor === null
          ? 'Your terms allow no price for it.'
          : `Your terms allow up to ${money(Math.floor(safeBidMinor / 100) * 100)}.`}
      </Reading>
      <Readings lotCode={lot.code} pricePerGMinor={lot.price.perGramMinor} {...{ reading, worth, terms }} />
      <div className="bench-go">
        <Link className={buttonClass('primary')} to={`/lots/${lot.code}/take`}>
          Take it at {money(askingMinor)}
        </Link>
        You check it once more before it binds.
      </div>
    </div>
  );
}
