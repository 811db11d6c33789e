import { defaultTerms, type BuyerTerms } from '../money/buyer-terms.ts';

export interface NamedTerms {
  key: 'small-operator' | 'refiner' | 'careful';
  name: string;
  terms: Readonly<BuyerTerms>;
}

/** Three kinds of buyer a seller may meet. Assumed, to be replaced by what buyers on the market really use. */
export const typicalTerms: readonly NamedTerms[] = [
  { key: 'small-operator', name: 'Small operator', terms: defaultTerms },
  {
    key: 'refiner',
    name: 'Refiner',
    terms: {
      ...defaultTerms,
      recoveryYield: 0.96,
      accountableShare: 0.99,
      refiningPerGMinor: 20,
      processingPerKgMinor: 120,
      batchCostMinor: 40_000,
      daysToCash: 30,
      annualCostOfMoney: 0.06,
      margin: 0.08,
      wantedChance: 0.65,
      tau: 0.08,
    },
  },
  {
    key: 'careful',
    name: 'Careful buyer',
    terms: { ...defaultTerms, recoveryYield: 0.88, margin: 0.15, wantedChance: 0.9, rivals: 4 },
  },
];
