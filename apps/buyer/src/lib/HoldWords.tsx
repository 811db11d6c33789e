import { useMarket, useWords } from '@lydite/client';
import { formatShare } from '@lydite/ui';
import { holdFor } from './hold.ts';

/** What goes into the hold and when, as the sum it is made of. */
export function HoldWords({ priceMinor, freightMinor }: { priceMinor: number; freightMinor: number }) {
  const { buyerFeeBp } = useMarket();
  const { money } = useWords();
  const { feeMinor, totalMinor } = holdFor(priceMinor, { freightMinor, buyerFeeBp });
  return (
    <>
      <b className="num">{money(totalMinor)}</b>: price {money(priceMinor)}
      {freightMinor > 0 && `, freight ${money(freightMinor)}`}, fee {money(feeMinor)} (
      {formatShare(buyerFeeBp / 10_000, 2)}
      ), and tax on the fee where your place asks for it
    </>
  );
}
