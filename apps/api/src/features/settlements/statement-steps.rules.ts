import type { SettlementView } from '@lydite/contracts';
import { rateWords, type Words } from '../../platform/words.ts';
import type { OutrightDeal, OutrightFigures } from './settle-outright.rules.ts';

type StatementStep = SettlementView['sellerSteps'][number];

interface StatementInput {
  deal: OutrightDeal;
  figures: OutrightFigures;
  /** Why the price is adjusted; empty without an adjustment. */
  reason: string;
  words: Pick<Words, 'money'>;
}

const row = (label: string, detail: string, amountMinor: number): StatementStep => ({
  label,
  detail,
  amountMinor,
  total: false,
});
const total = (label: string, detail: string, amountMinor: number): StatementStep => ({
  label,
  detail,
  amountMinor,
  total: true,
});

/** Both sides' arithmetic, row by row, so that each can be checked by hand. Rows that are nought by the terms are left out. */
export function statementSteps({ deal, figures, reason, words }: StatementInput): {
  sellerSteps: StatementStep[];
  buyerSteps: StatementStep[];
} {
  const { money } = words;
  const { valueMinor, buyerFeeMinor, sellerFeeMinor, buyerTaxMinor, sellerTaxMinor } = figures;
  const fee = (bp: number, amountMinor: number): string =>
    `${rateWords(bp)} of ${money(valueMinor)} is ${money(amountMinor)}`;
  const tax = (bp: number, onMinor: number): string => `${rateWords(bp)} of the fee of ${money(onMinor)}`;

  const value =
    deal.adjustmentMinor > 0
      ? [
          row('Price', 'As awarded', deal.priceMinor),
          row('Adjustment', reason, -deal.adjustmentMinor),
          total('Value', 'Price less adjustment', valueMinor),
        ]
      : [total('Value', 'The price, as awarded', valueMinor)];
  const freight = deal.freightMinor > 0 ? [row('Freight', 'Paid with the price', deal.freightMinor)] : [];

  return {
    sellerSteps: [
      ...value,
      ...freight,
      row('Seller’s fee', fee(deal.sellerFeeBp, sellerFeeMinor), -sellerFeeMinor),
      ...(deal.sellerTaxBp > 0 ? [row('Tax on the fee', tax(deal.sellerTaxBp, sellerFeeMinor), -sellerTaxMinor)] : []),
      total('To the seller', 'Sent to the seller’s account', figures.sellerGetsMinor),
    ],
    buyerSteps: [
      row('Paid into hold', 'By the buyer, after the award', deal.paidInMinor),
      row('Value', 'Of the lot, to the seller', -valueMinor),
      ...freight.map((one) => ({ ...one, amountMinor: -one.amountMinor })),
      row('Buyer’s fee', fee(deal.buyerFeeBp, buyerFeeMinor), -buyerFeeMinor),
      ...(deal.buyerTaxBp > 0 ? [row('Tax on the fee', tax(deal.buyerTaxBp, buyerFeeMinor), -buyerTaxMinor)] : []),
      total('Back to the buyer', 'Left in the hold', figures.refundMinor),
    ],
  };
}
