import type { FieldError } from '@lydite/contracts';
import { Decimal } from 'decimal.js';
import { AppError } from '../../platform/app-error.ts';
import { massWords } from '../../platform/words.ts';

/** A weigh-in further off than this is a slip of the pen, not a delivery. */
const mostTimesDeclared = 3;
/** What the market keeps of a mass, and of a scale's resolution. */
const decimalsOfGram = { grossG: 3, tareG: 3, scaleResolutionG: 4 } as const;

interface Weighing {
  grossG: number;
  tareG: number;
}

/** Net mass in grams, exact to the milligram. */
export const netOf = ({ grossG, tareG }: Weighing): number => new Decimal(grossG).minus(tareG).toNumber();

/**
 * Refuses a weigh-in that can't be true.
 * @throws AppError weigh_in.implausible naming each field and what to look at
 */
export function assertPlausible(
  { grossG, tareG, scaleResolutionG }: Weighing & { scaleResolutionG: number },
  declaredG: number,
): void {
  const given = { grossG, tareG, scaleResolutionG };
  const fields: FieldError[] = Object.entries(decimalsOfGram)
    .filter(([path, most]) => new Decimal(given[path as keyof typeof given]).decimalPlaces() > most)
    .map(([path, most]) => ({
      path,
      message: `Give it to the ${most === 3 ? 'milligram' : 'tenth of a milligram'} at most.`,
    }));
  const netG = netOf({ grossG, tareG });
  if (netG <= 0)
    fields.push({ path: 'tareG', message: 'The tare must be less than the gross mass. Are the two swapped?' });
  else if (netG > mostTimesDeclared * declaredG)
    fields.push({
      path: 'grossG',
      message: `The net mass of ${massWords(netG)} is more than ${mostTimesDeclared} times the declared ${massWords(declaredG)}. Check the unit.`,
    });
  if (fields.length > 0)
    throw new AppError('weigh_in.implausible', fields.map(({ message }) => message).join(' '), { fields });
}

/** Weighing tolerance in grams (rules.md, Delivery): the greater of 0.5 % of the declared mass and twice the scale's resolution. */
export const toleranceOf = (declaredG: number, scaleResolutionG: number): number =>
  Decimal.max(new Decimal(declaredG).times('0.005'), new Decimal(scaleResolutionG).times(2)).toNumber();

interface Delivered {
  declaredG: number;
  foundG: number;
  toleranceG: number;
  priceMinor: number;
}

/**
 * What a shortage of mass takes off an outright price, in minor units, rounded half even: nothing within the tolerance, beyond it
 * price × (declared − found) / declared. The lines are weighed together and share the loss, and their shares of the estimate
 * add up to one. An excess is not paid.
 */
export function massAdjustment({ declaredG, foundG, toleranceG, priceMinor }: Delivered): number {
  const shortG = new Decimal(declaredG).minus(foundG);
  if (shortG.lte(toleranceG)) return 0;
  return shortG
    .div(declaredG)
    .times(priceMinor)
    .toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN)
    .clamp(0, priceMinor)
    .toNumber();
}
