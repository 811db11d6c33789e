import { catalogueQuery, useMarket, useTitle } from '@lydite/client';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useDraft } from '../../features/draft/draft-context.tsx';
import { toLotInput } from '../../features/draft/lot-input.ts';
import { DeliveryFields } from '../../features/sale/components/DeliveryFields.tsx';
import { LeftTable } from '../../features/sale/components/LeftTable.tsx';
import { SaleFields } from '../../features/sale/components/SaleFields.tsx';
import { leftRows, usualSafeBidMinor } from '../../features/sale/what-is-left.ts';
import { useHashFocus } from '../../lib/use-hash-focus.ts';

/** At what price and in which way the lot is sold and delivered, and what that leaves. */
export function Component() {
  useTitle('Price and delivery');
  const { draft, edit } = useDraft();
  const market = useMarket();
  const { data: catalogue } = useSuspenseQuery(catalogueQuery());
  useHashFocus();
  const usualMinor = useMemo(
    () => usualSafeBidMinor(toLotInput({ lines: draft.lines }, catalogue), catalogue, market),
    [draft.lines, catalogue, market],
  );
  return (
    <>
      <h1>Price and delivery</h1>
      <p className="lead">The lot is sold as it stands. Other metals in it go to the buyer and are in the price.</p>
      <div className="mt-6">
        <SaleFields
          sale={draft.sale}
          currency={market.currency}
          onChange={(change) => edit((current) => ({ ...current, sale: { ...current.sale, ...change } }))}
        />
        <h2 className="ruled-head mt-10 mb-4">Delivery</h2>
        <DeliveryFields
          delivery={draft.delivery}
          currency={market.currency}
          onChange={(change) => edit((current) => ({ ...current, delivery: { ...current.delivery, ...change } }))}
        />
      </div>
      <LeftTable
        rows={leftRows(draft, market, usualMinor)}
        currency={market.currency}
        sellerFeeShare={market.sellerFeeBp / 10_000}
        usualMinor={usualMinor}
      />
    </>
  );
}
