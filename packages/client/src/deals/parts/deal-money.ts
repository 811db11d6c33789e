import type { DealView } from '@lydite/contracts';
import type { MoneyRow } from './MoneyTable.tsx';

type Facts = Pick<
  DealView,
  'side' | 'priceMinor' | 'freightMinor' | 'buyerFeeMinor' | 'sellerFeeMinor' | 'holdMinor' | 'claim'
>;

const unlessZero = (label: string, amountMinor: number, detail?: string): MoneyRow[] =>
  amountMinor === 0 ? [] : [{ label, amountMinor, ...(detail ? { detail } : {}) }];

/** What the buyer pays into the hold; tax on the fee is what the parts leave over. */
export function holdRows(deal: Facts): MoneyRow[] {
  const { priceMinor, freightMinor, buyerFeeMinor, holdMinor } = deal;
  return [
    { label: 'Price', amountMinor: priceMinor },
    ...unlessZero('Freight', freightMinor),
    { label: 'Buyer’s fee', amountMinor: buyerFeeMinor },
    ...unlessZero('Tax on the fee', holdMinor - priceMinor - freightMinor - buyerFeeMinor),
    { label: 'Into the hold', amountMinor: holdMinor, total: true },
  ];
}

/** What the seller is to get while nothing is taken off. */
export function sellerRows(deal: Facts): MoneyRow[] {
  const { priceMinor, freightMinor, sellerFeeMinor } = deal;
  return [
    { label: 'Price', amountMinor: priceMinor },
    ...unlessZero('Freight', freightMinor),
    { label: 'Seller’s fee', amountMinor: -sellerFeeMinor },
    {
      label: 'To you',
      detail: 'If nothing is taken off the price; before tax on the fee',
      amountMinor: priceMinor + freightMinor - sellerFeeMinor,
      total: true,
    },
  ];
}

export const moneyRows = (deal: Facts): MoneyRow[] => (deal.side === 'buyer' ? holdRows(deal) : sellerRows(deal));
