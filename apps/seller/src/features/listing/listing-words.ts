import type { LotDraft } from '@lydite/contracts';
import { countryName, type Fact } from '@lydite/ui';
import { counted } from '../../lib/counted.ts';

const open = 'Not said yet';

/** How the lot is sold and delivered, as buyers will read it; the lowest price is the seller's alone. */
export function listingFacts(
  { sale, delivery, declarations }: LotDraft,
  money: (amountMinor: number) => string,
): Fact[] {
  const amount = (amountMinor: number | null) => (amountMinor === null ? open : money(amountMinor));
  const price =
    sale.form === 'asking-price'
      ? { name: 'Asking price', value: amount(sale.askingMinor) }
      : { name: 'Open bids from', value: amount(sale.startMinor) };
  const reserve =
    sale.form === 'open-bids' && sale.reserveMinor !== null
      ? [{ name: 'Lowest price', value: `${money(sale.reserveMinor)}; buyers read only whether it is reached` }]
      : [];
  return [
    price,
    ...reserve,
    { name: 'On the market for', value: counted(sale.days, 'day') },
    {
      name: 'Delivery',
      value:
        delivery.way === 'seller-sends'
          ? `You send it; freight ${delivery.freightMinor === null ? 'not said yet' : money(delivery.freightMinor)}`
          : `Collection${delivery.hours ? `: ${delivery.hours}` : ''}`,
    },
    { name: 'Place', value: [delivery.place, countryName(declarations.country)].filter(Boolean).join(', ') || open },
  ];
}
