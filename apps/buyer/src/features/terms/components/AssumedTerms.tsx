import { useMarket, useWords } from '@lydite/client';
import { FactList, formatShare } from '@lydite/ui';
import { defaultTerms } from '@lydite/valuation';

/** What every bid is reckoned with besides the own terms, so that each figure can be followed by hand. */
export function AssumedTerms() {
  const { buyerFeeBp } = useMarket();
  const { money } = useWords();
  const { priceHaircut, refiningPerGMinor, daysToCash, annualCostOfMoney } = defaultTerms;
  return (
    <section>
      <h2>Counted besides</h2>
      <p className="small mute mt-1">
        The market’s own charges, and what we take for every buyer until you can set it.
      </p>
      <div className="ruled-head mt-3">
        <FactList
          facts={[
            { name: 'Market’s fee', value: `${formatShare(buyerFeeBp / 10_000, 2)} of the price` },
            { name: 'Freight', value: 'as the lot states it' },
            { name: 'Refiner pays', value: `${formatShare(priceHaircut)} under the reference price` },
            { name: 'Refining', value: `${money(refiningPerGMinor)} for each gram paid` },
            { name: 'Cash after', value: `${daysToCash} days, at ${formatShare(annualCostOfMoney)} a year` },
          ]}
        />
      </div>
    </section>
  );
}
