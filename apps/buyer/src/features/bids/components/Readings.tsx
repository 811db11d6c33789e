import { useWords } from '@lydite/client';
import type { BuyingTerms } from '@lydite/contracts';
import { formatAbout, formatBreakEvenG, formatShare, Reading } from '@lydite/ui';
import { Link } from 'react-router-dom';
import type { BidReading, LotWorth } from '../../../lib/worth/lot-worth.ts';

interface ReadingsProps {
  lotCode: string;
  /** Null while no amount is entered. */
  reading: BidReading | null;
  worth: LotWorth;
  terms: BuyingTerms;
  pricePerGMinor: number;
}

const nothingYet = '–';
const wholeMinor = (amountMinor: number): number => Math.round(amountMinor / 100) * 100;

/** What a bid means for its maker: the gold it needs, how often that is there, and what is left in three cases. */
export function Readings({ lotCode, reading, worth, terms, pricePerGMinor }: ReadingsProps) {
  const { money, currency } = useWords();
  const about = (amountMinor: number) => formatAbout(amountMinor, currency, { signed: true });
  const [figure, unit] = reading ? formatBreakEvenG(reading.bid.breakEvenG).split('\u00a0') : [nothingYet];
  return (
    <>
      <Reading
        name="You break even at"
        value={
          <>
            {figure}
            {unit && <i> {unit}</i>}
          </>
        }
      >
        gold at {money(Math.round(pricePerGMinor))}/g, {formatShare(terms.recoveryYield * terms.accountableShare)} of it
        paid to you, your costs {money(wholeMinor(worth.costsMinor))}. <Link to={`/terms?lot=${lotCode}`}>Change</Link>
      </Reading>
      <Reading
        name="You come out ahead in"
        value={
          reading ? (
            <>
              {reading.ahead}
              <i> of </i>
              {reading.of}
            </>
          ) : (
            nothingYet
          )
        }
      >
        {terms.curseOn && terms.rivals > 0
          ? `results, with your allowance for winning against ${terms.rivals} others, who may have read it lower.`
          : 'results. Winning a contested lot often means reading it high, so leave a margin.'}
      </Reading>
      <Reading name="In the middle case you make" value={reading ? about(reading.middleMinor) : nothingYet}>
        {reading && (
          <>
            1 in 10 worse than {about(reading.worseMinor)}
            <br />1 in 10 better than {about(reading.betterMinor)}
          </>
        )}
      </Reading>
    </>
  );
}
