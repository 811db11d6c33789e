import { Decimal } from 'decimal.js';
import { wholeBp } from '../money/assay-sale.ts';
import { toDecimal, type Written } from './decimal-argument.ts';

/** What was found, bid and agreed; figures as written down. Money in minor units, not necessarily whole. */
export interface AssaySettlement {
  /** Dry net mass as weighed in, grams. */
  netMassG: Written;
  /** The assay that stands, g/t. */
  gradeGPerT: Written;
  /** Payable share, hundredths of a point, 0 … 10 000. */
  shareBp: number;
  minimumDeductionG: Written;
  /** Reference price of the price day per fine gram. */
  pricePerGMinor: Written;
  treatmentPerKgMinor: Written;
  /** Per payable gram. */
  refiningPerGMinor: Written;
}

export type SettlementStepKey =
  | 'netMass'
  | 'grade'
  | 'fine'
  | 'deduction'
  | 'share'
  | 'payable'
  | 'price'
  | 'gross'
  | 'treatment'
  | 'refining'
  | 'value';

/** One line of the statement, exact: what it adds to or takes from what stands above is left to the words around it. */
export interface SettlementStep {
  key: SettlementStepKey;
  /** Decimal digits, never in scientific notation. */
  value: string;
  unit: 'g' | 'g/t' | 'bp' | 'minor' | 'minor/g';
}

export interface SettledValue {
  /** Whole minor units, rounded once, half to even. */
  valueMinor: number;
  steps: SettlementStep[];
}

/** More digits than any product of entered figures has, so that nothing is rounded but the value, once. */
const Exact = Decimal.clone({ precision: 60 });

/**
 * Value of a lot settled on assay: payable = (net mass · grade − minimum deduction) · share, never below 0; value = payable ·
 * price − treatment − refining, never below 0. Decimal arithmetic throughout; each step is kept.
 * @throws {RangeError} naming the figure that is out of its range
 */
export function settleOnAssay(given: AssaySettlement): SettledValue {
  const read = (name: Exclude<keyof AssaySettlement, 'shareBp'>, most?: number) =>
    new Exact(toDecimal(name, given[name], 0, most));
  const massG = read('netMassG');
  const gradeGPerT = read('gradeGPerT', 1e6);
  const deductionG = read('minimumDeductionG');
  const price = read('pricePerGMinor');
  const shareBp = new Exact(toDecimal('shareBp', given.shareBp, 0, wholeBp));

  const fineG = massG.times(gradeGPerT).div(1e6);
  const payableG = Exact.max(0, fineG.minus(deductionG)).times(shareBp).div(wholeBp);
  const gross = payableG.times(price);
  const treatment = massG.div(1000).times(read('treatmentPerKgMinor'));
  const refining = payableG.times(read('refiningPerGMinor'));
  const value = Exact.max(0, gross.minus(treatment).minus(refining));
  const step = (key: SettlementStepKey, unit: SettlementStep['unit'], amount: Decimal): SettlementStep => ({
    key,
    value: amount.toFixed(),
    unit,
  });
  return {
    valueMinor: value.toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN).toNumber(),
    steps: [
      step('netMass', 'g', massG),
      step('grade', 'g/t', gradeGPerT),
      step('fine', 'g', fineG),
      step('deduction', 'g', deductionG),
      step('share', 'bp', shareBp),
      step('payable', 'g', payableG),
      step('price', 'minor/g', price),
      step('gross', 'minor', gross),
      step('treatment', 'minor', treatment),
      step('refining', 'minor', refining),
      step('value', 'minor', value),
    ],
  };
}
