import { Decimal } from 'decimal.js';
import { wholeBp } from '../money/assay-sale.ts';
import { toDecimal, type Written } from './decimal-argument.ts';

/** What was bid and agreed, beside the gold; figures as written down. Money in minor units, not necessarily whole. */
export interface AssayTerms {
  /** Payable share, hundredths of a point, 0 … 10 000. */
  shareBp: number;
  minimumDeductionG: Written;
  /** Reference price of the price day per fine gram. */
  pricePerGMinor: Written;
  treatmentPerKgMinor: Written;
  /** Per payable gram. */
  refiningPerGMinor: Written;
}

export interface AssaySettlement extends AssayTerms {
  /** Dry net mass as weighed in, grams. */
  netMassG: Written;
  /** The assay that stands, g/t. */
  gradeGPerT: Written;
}

/** For a value without an assay: the hold at the frozen p75, or a deal in which no assay came in. */
export interface FineGoldSettlement extends AssayTerms {
  netMassG: Written;
  /** Fine gold, grams, from the frozen estimate. */
  fineG: Written;
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
  const massG = new Exact(toDecimal('netMassG', given.netMassG, 0));
  const gradeGPerT = new Exact(toDecimal('gradeGPerT', given.gradeGPerT, 0, 1e6));
  const { valueMinor, steps } = valueOf(massG, massG.times(gradeGPerT).div(1e6), given);
  return { valueMinor, steps: [step('netMass', 'g', massG), step('grade', 'g/t', gradeGPerT), ...steps] };
}

/**
 * The same where the fine gold is taken from an estimate and not from an assay.
 * @throws {RangeError} naming the figure that is out of its range
 */
export function settleFineGold(given: FineGoldSettlement): SettledValue {
  const massG = new Exact(toDecimal('netMassG', given.netMassG, 0));
  const { valueMinor, steps } = valueOf(massG, new Exact(toDecimal('fineG', given.fineG, 0)), given);
  return { valueMinor, steps: [step('netMass', 'g', massG), ...steps] };
}

function valueOf(massG: Decimal, fineG: Decimal, terms: AssayTerms): SettledValue {
  const read = (name: Exclude<keyof AssayTerms, 'shareBp'>) => new Exact(toDecimal(name, terms[name], 0));
  const shareBp = new Exact(toDecimal('shareBp', terms.shareBp, 0, wholeBp));
  const [deductionG, price] = [read('minimumDeductionG'), read('pricePerGMinor')];
  const payableG = Exact.max(0, fineG.minus(deductionG)).times(shareBp).div(wholeBp);
  const gross = payableG.times(price);
  const treatment = massG.div(1000).times(read('treatmentPerKgMinor'));
  const refining = payableG.times(read('refiningPerGMinor'));
  const value = Exact.max(0, gross.minus(treatment).minus(refining));
  return {
    valueMinor: value.toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN).toNumber(),
    steps: [
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

const step = (key: SettlementStepKey, unit: SettlementStep['unit'], amount: Decimal): SettlementStep => ({
  key,
  value: amount.toFixed(),
  unit,
});
