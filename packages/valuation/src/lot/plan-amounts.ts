import type { MaterialClass } from '../catalogue/catalogue.types.ts';
import { exact } from '../quantity/quantity.ts';
import type { LineInput } from '../types.ts';
import { countQuantity, massQuantity } from './evidence.ts';
import type { Factor } from './lot-plan.types.ts';
import { classFactor, factor } from './plan-term.ts';

export interface Amounts {
  /** Factors whose product is the line's mass in grams, or null when it cannot be told. */
  mass: Factor[] | null;
  /** Factors whose product is the number of pieces, or null when it cannot be told. */
  pieces: Factor[] | null;
}

/** How much there is. What is given is used as given; what is not follows from the mass of one piece, where the class has one. */
export function planAmounts(line: LineInput, materialClass: MaterialClass): Amounts {
  const own = { lineId: line.id };
  const mass = line.massG === null ? null : [factor(own, 'massG', massQuantity(line.massG, line))];
  const pieces = line.pieces === null ? null : [factor(own, 'pieces', countQuantity(line.pieces, line))];
  const perPiece = (power: 1 | -1) => pieceMassFactors(line, materialClass, power);
  const [times, over] = [perPiece(1), perPiece(-1)];
  return {
    mass: mass ?? (pieces && times && [...pieces, ...times]),
    pieces: pieces ?? (mass && over && [...mass, ...over]),
  };
}

function pieceMassFactors(line: LineInput, { code, pieceMassG }: MaterialClass, power: 1 | -1): Factor[] | null {
  if (line.pieceMassG !== null) return [factor({ lineId: line.id }, 'pieceMassG', exact(line.pieceMassG), power)];
  return pieceMassG && [classFactor(code, 'pieceMassG', pieceMassG, power)];
}
