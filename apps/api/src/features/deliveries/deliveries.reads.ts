import type { EntityManager } from 'typeorm';
import { massAdjustment, netOf, toleranceOf } from './weigh-in.rules.ts';
import { WeighIn } from './weigh-in.entity.ts';

export { netOf };

export interface WeighInFacts extends WeighIn {
  declaredG: number;
  /** Found less declared: negative for a shortage. */
  differenceG: number;
  toleranceG: number;
  /** What a claim on the mass would take off the price. */
  claimableMinor: number;
  /** False when nobody weighed in time and the declared mass stands. */
  weighed: boolean;
}

/** The weigh-in of a deal beside what was declared; null before it. */
export async function weighInOf(
  tx: EntityManager,
  { dealId, declaredG, priceMinor }: { dealId: string; declaredG: number; priceMinor: number },
): Promise<WeighInFacts | null> {
  const found = await tx.findOneBy(WeighIn, { dealId });
  if (!found) return null;
  const toleranceG = toleranceOf(declaredG, found.scaleResolutionG);
  return {
    ...found,
    declaredG,
    differenceG: netOf({ grossG: found.netG, tareG: declaredG }),
    toleranceG,
    claimableMinor: massAdjustment({ declaredG, foundG: found.netG, toleranceG, priceMinor }),
    weighed: found.enteredBy !== null,
  };
}
