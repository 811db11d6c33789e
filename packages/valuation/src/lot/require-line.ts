import { requireBetween, requirePositive } from '../argument.ts';
import type { LineInput, PlatingEvidence } from '../types.ts';

/**
 * Refuses figures that no material could have; unlikely ones pass and become warnings.
 * @throws {RangeError} naming the field, for example `lines[1].massG`
 */
export function requireLine(line: LineInput, index: number): void {
  const at = (field: string) => `lines[${index}].${field}`;
  const notNegative = [
    'massG',
    'scaleResolutionG',
    'pieces',
    'contactsPerPiece',
    'padAreaMm2',
    'areaCm2PerPiece',
  ] as const;
  for (const field of notNegative) {
    const value = line[field];
    if (value !== null) requireBetween(at(field), value, 0);
  }
  if (line.pieceMassG !== null) requirePositive(at('pieceMassG'), line.pieceMassG);
  if (line.wear !== null) requireBetween(at('wear'), line.wear, 0, 1);
  if (line.assay) {
    requireBetween(at('assay.gradeGPerT'), line.assay.gradeGPerT, 0, 1e6);
    requireBetween(at('assay.relativeSd'), line.assay.relativeSd, 0, 1);
  }
  if (line.plating) requirePlating(line.plating, at);
}

function requirePlating(plating: PlatingEvidence, at: (field: string) => string): void {
  switch (plating.kind) {
    case 'standard':
      return requireBetween(at('plating.minimumUm'), plating.minimumUm, 0);
    case 'range':
      requireBetween(at('plating.leastUm'), plating.leastUm, 0);
      return requireBetween(at('plating.mostUm'), plating.mostUm, plating.leastUm);
    case 'xrf':
      return requireBetween(at('plating.thicknessUm'), plating.thicknessUm, 0);
  }
}

/** @throws {RangeError} when two lines of a lot carry the same id */
export function requireOwnIds(lines: readonly LineInput[]): void {
  const ids = new Set<string>();
  for (const { id } of lines) {
    if (ids.has(id)) throw new RangeError(`lines: the id "${id}" is used twice`);
    ids.add(id);
  }
}
