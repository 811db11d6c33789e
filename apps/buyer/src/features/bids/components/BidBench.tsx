import { useWords } from '@lydite/client';
import type { BuyingTerms, LotView } from '@lydite/contracts';
import { Button, MoneyField, NotchMark } from '@lydite/ui';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { keepFocus } from '../../../lib/keep-focus.ts';
import { bidStepMinor } from '../../../lib/bid-step.ts';
import { mostParam } from '../../../lib/most-param.ts';
import type { BidReading, LotWorth } from '../../../lib/worth/lot-worth.ts';
import { bidProblem, boundsOf } from '../bid-problem.ts';
import { Readings } from './Readings.tsx';

interface BidBenchProps {
  lot: LotView;
  leastNextMinor: number;
  worth: LotWorth;
  terms: BuyingTerms;
  amountMinor: number | null;
  reading: BidReading | null;
  onAmount: (amountMinor: number | null) => void;
}

/** The row under the stone where a bid is weighed: the field, what it means, and the way to check it. */
export function BidBench({ lot, leastNextMinor, worth, terms, amountMinor, reading, onAmount }: BidBenchProps) {
  const navigate = useNavigate();
  const { money } = useWords();
  const [problem, setProblem] = useState<string | null>(null);
  const change = (next: number | null) => {
    setProblem(null);
    onAmount(next);
  };
  const check = async () => {
    const found = bidProblem({ ...boundsOf(lot), amountMinor, leastNextMinor, money });
    setProblem(found);
    if (found || amountMinor === null) return document.getElementById('most')?.focus();
    const most = mostParam(amountMinor);
    // The way back leads here, and then finds the amount as it is now.
    await navigate({ search: `?${most}` }, { replace: true, preventScrollReset: true });
    await navigate(`/lots/${lot.code}/bid?${most}`);
  };
  return (
    <div className="bench">
      <div className="bench-field">
        <MoneyField
          id="most"
          label="Most you would pay"
          amountMinor={amountMinor}
          currency={worth.money.currency}
          stepMinor={bidStepMinor(Math.max(amountMinor ?? 0, leastNextMinor))}
          error={problem}
          note={<StandingNote lot={lot} leastNextMinor={leastNextMinor} />}
          onChange={change}
        />
        <SafeBid safeBidMinor={worth.safeBidMinor} leastNextMinor={leastNextMinor} onUse={change} />
      </div>
      <Readings lotCode={lot.code} pricePerGMinor={lot.price.perGramMinor} {...{ reading, worth, terms }} />
      <div className="bench-go">
        <Button look="primary" onClick={() => void check()} onMouseDown={keepFocus}>
          Check this bid
        </Button>
        If you win, the price, freight and fee go into hold within 2 days.
      </div>
    </div>
  );
}

function StandingNote({ lot, leastNextMinor }: { lot: LotView; leastNextMinor: number }) {
  const { money } = useWords();
  const next = `Next bid from ${money(leastNextMinor)}.`;
  if (lot.priceMinor === null) return `No bids yet. The first bid starts at ${money(leastNextMinor)}.`;
  if (lot.you?.standing === 'highest')
    return (
      <>
        <NotchMark isOwn /> Yours is the highest, at {money(lot.priceMinor)} of at most{' '}
        {money(lot.you.ceilingMinor ?? 0)}.
      </>
    );
  return (
    <>
      <NotchMark isOwn={false} />
      Highest so far {money(lot.priceMinor)}, not yours. {next}
    </>
  );
}

interface SafeBidProps {
  safeBidMinor: number | null;
  leastNextMinor: number;
  onUse: (amountMinor: number) => void;
}

/** The highest bid the buyer's own terms allow, and the way to take it over. */
function SafeBid({ safeBidMinor, leastNextMinor, onUse }: SafeBidProps) {
  const { money } = useWords();
  if (safeBidMinor === null) return <p className="field-echo">Your terms allow no bid on this lot.</p>;
  const wholeMinor = Math.floor(safeBidMinor / 100) * 100;
  const isBelow = wholeMinor < leastNextMinor;
  return (
    <p className="field-echo">
      Your terms allow up to <b className="text-ink">{money(wholeMinor)}</b>
      {isBelow ? ', less than the next bid.' : '. '}
      {!isBelow && (
        <button type="button" className="link-button" onClick={() => onUse(wholeMinor)}>
          Use it
        </button>
      )}
    </p>
  );
}
