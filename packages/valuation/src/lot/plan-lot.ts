import type { Catalogue } from '../catalogue/catalogue.types.ts';
import { findClass } from '../catalogue/find-class.ts';
import type { LineInput, LotInput } from '../types.ts';
import { assayQuantity, identityQuantity } from './evidence.ts';
import type { LinePlan, LotPlan } from './lot-plan.types.ts';
import { planAmounts } from './plan-amounts.ts';
import { planGold } from './plan-gold.ts';
import { factor, toTerm } from './plan-term.ts';
import { requireLine, requireOwnIds } from './require-line.ts';
import { warningsOf } from './warnings.ts';

/**
 * Writes a lot as a sum of products: per line and component, constant · Π figures, each with its spread. Evidence has
 * replaced the class's figure it measures.
 * @throws {RangeError} naming a class that is not in the catalogue, or a figure out of its range
 */
export function planLot(input: LotInput, catalogue: Catalogue): LotPlan {
  requireOwnIds(input.lines);
  const lines = input.lines.map((line, index) => planLine(line, index, catalogue));
  return { lines, warnings: lines.flatMap(warningsOf) };
}

/** @throws {RangeError} naming a class that is not in the catalogue, or a figure out of its range */
export function planLine(line: LineInput, index: number, catalogue: Catalogue): LinePlan {
  requireLine(line, index);
  const materialClass = findClass(catalogue, line.classCode);
  const amounts = planAmounts(line, materialClass);
  const mass = amounts.mass && toTerm('mass', 'net mass', 1, amounts.mass);
  const shared = { input: line, label: `line ${index + 1}`, materialClass, mass };
  if (line.assay) {
    const grade = factor({ lineId: line.id }, 'assay.gradeGPerT', assayQuantity(line.assay));
    return { ...shared, gold: amounts.mass ? [toTerm('assay', 'as assayed', 1e-6, [...amounts.mass, grade])] : [] };
  }
  const identity = factor({ lineId: line.id }, 'identity', identityQuantity(line));
  const gold = materialClass.components.flatMap((component) => {
    const term = planGold(component, line, materialClass.code, amounts);
    return term ? [{ ...term, factors: [...term.factors, identity] }] : [];
  });
  return { ...shared, gold };
}
