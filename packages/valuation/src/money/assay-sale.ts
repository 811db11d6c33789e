import { requireBetween } from '../argument.ts';

/** What the market's term set and the lot say about a sale on assay, beside the payable share that is bid. */
export interface AssaySale {
  /** Fine gold that is not paid for, grams of the whole lot. */
  minimumDeductionG: number;
  /** Money in minor units, not necessarily whole. */
  treatmentPerKgMinor: number;
  refiningPerGMinor: number;
  /** Freight charged with the purchase. */
  freightMinor: number;
}

/** The market's first term set: bids carry everything but the minimum deduction. */
export const defaultAssaySale: Readonly<AssaySale> = {
  minimumDeductionG: 0.1,
  treatmentPerKgMinor: 0,
  refiningPerGMinor: 0,
  freightMinor: 0,
};

/** @throws {RangeError} naming the figure that is out of its range, for example `sale.freightMinor` */
export function requireAssaySale(sale: AssaySale): void {
  for (const [name, value] of Object.entries(sale)) requireBetween(`sale.${name}`, value, 0);
}

/** Hundredths of a point in the whole: 10 000 is a payable share of 100 %. */
export const wholeBp = 10_000;

/** Money that a whole share of the gold found comes to, before treatment: (found − deduction) · (price − refining), never below 0. */
export function wholeShareMinor(sale: AssaySale, pricePerGMinor: number, goldG: number): number {
  return Math.max(0, (goldG - sale.minimumDeductionG) * Math.max(0, pricePerGMinor - sale.refiningPerGMinor));
}

/** What a payable share costs, without fee and freight: share · whole − treatment, never below 0. */
export function purchaseMinor(share: number, wholeMinor: number, treatmentMinor: number): number {
  return Math.max(0, share * wholeMinor - treatmentMinor);
}
