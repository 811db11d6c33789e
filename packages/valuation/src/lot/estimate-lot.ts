import type { Catalogue } from '../catalogue/catalogue.types.ts';
import type { Estimate, LotInput } from '../types.ts';
import { simulateLot, type SimulationOptions } from './simulate-lot.ts';
import { summariseLot } from './summarise-lot.ts';

/**
 * The distribution of the gold contained in a lot. A lot without lines, or with lines of unknown amount, counts what is known
 * and says the rest in its warnings.
 * @throws {RangeError} naming the option, the class or the figure that is out of range
 */
export function estimateLot(input: LotInput, catalogue: Catalogue, options: SimulationOptions): Estimate {
  return summariseLot(simulateLot(input, catalogue, options));
}
