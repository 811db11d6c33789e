import { Decimal } from 'decimal.js';
import { requireBetween, requirePositive } from '../argument.ts';
import { massDifference } from '../money/mass-difference.ts';
import { requireMinor } from '../money/share-of.ts';

/** Share of the lot's estimated gold that a ground is about, 0 … 1; 1 for what concerns the whole lot. */
interface OfEstimate {
  estimateShare: number;
}

/** What a buyer says is not as stated, with what was stated and what was found. */
export type ClaimGround =
  | ({ kind: 'mass'; declaredG: number; foundG: number; resolutionG: number } & OfEstimate)
  | ({ kind: 'count'; stated: number; found: number } & OfEstimate)
  /** `estimateShare` is that of the plating alone. */
  | ({ kind: 'plating'; statedUm: number; foundUm: number } & OfEstimate)
  /** Middles of the line's gold as the stated class and as the one found. */
  | ({ kind: 'class'; statedG: number; foundG: number } & OfEstimate)
  | { kind: 'least-content'; statedG: number; foundG: number }
  | { kind: 'not-arrived' }
  | { kind: 'hazard'; costMinor: number };

export interface GroundValue {
  kind: ClaimGround['kind'];
  /** Share of what the ground is about that is lost, 0 … 1. */
  loss: number;
  /** What the ground alone takes off the price, whole minor units; a hazard's cost is shown here but left to the desk. */
  changeMinor: number;
}

export interface ClaimValue {
  grounds: GroundValue[];
  /** What all grounds but hazards take off the price together: rounded once, half to even, never more than the price. */
  adjustmentMinor: number;
  /** Cost of hazards, for the desk to decide. */
  hazardMinor: number;
}

/**
 * What a claim on an outright lot would change in money: price · Σ share of the estimate · loss.
 * @throws {RangeError} naming the amount or figure that is out of its range
 */
export function claimValue(priceMinor: number, grounds: readonly ClaimGround[]): ClaimValue {
  requireMinor('priceMinor', priceMinor);
  const parts = grounds.map((ground) => ({ ground, ...lossOf(ground) }));
  const offPrice = (lost: Decimal) =>
    Decimal.min(priceMinor, lost.times(priceMinor).toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN)).toNumber();
  const hazards = grounds.flatMap((ground) => (ground.kind === 'hazard' ? [ground.costMinor] : []));
  for (const cost of hazards) requireMinor('costMinor', cost);
  return {
    grounds: parts.map(({ ground, loss, share }) => ({
      kind: ground.kind,
      loss: loss.toNumber(),
      changeMinor: ground.kind === 'hazard' ? ground.costMinor : offPrice(loss.times(share)),
    })),
    adjustmentMinor: offPrice(parts.reduce((sum, { loss, share }) => sum.plus(loss.times(share)), new Decimal(0))),
    hazardMinor: hazards.reduce((sum, cost) => sum + cost, 0),
  };
}

function lossOf(ground: ClaimGround): { loss: Decimal; share: number } {
  const share = 'estimateShare' in ground ? ground.estimateShare : 1;
  requireBetween('estimateShare', share, 0, 1);
  switch (ground.kind) {
    case 'mass': {
      const { withinTolerance } = massDifference(ground.declaredG, ground.foundG, ground);
      return { loss: withinTolerance ? new Decimal(0) : shortOf('declaredG', ground.declaredG, ground.foundG), share };
    }
    case 'count':
      return { loss: shortOf('stated', ground.stated, ground.found), share };
    case 'plating':
      return { loss: shortOf('statedUm', ground.statedUm, ground.foundUm), share };
    case 'class':
    case 'least-content':
      return { loss: shortOf('statedG', ground.statedG, ground.foundG), share };
    case 'not-arrived':
      return { loss: new Decimal(1), share };
    case 'hazard':
      return { loss: new Decimal(0), share };
  }
}

/** (stated − found) / stated; an excess is not paid. */
function shortOf(name: string, stated: number, found: number): Decimal {
  requirePositive(name, stated);
  requireBetween('found', found, 0);
  return Decimal.max(0, new Decimal(stated).minus(found).div(stated));
}
