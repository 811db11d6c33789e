import type { LineDraft } from '@lydite/contracts';
import type { Catalogue, MaterialClass, MaterialGroup } from '@lydite/valuation';
import { formatMassG, formatNumber, formatSignificant, NBSP } from '@lydite/ui';
import { counted } from '../../lib/counted.ts';

export const groupNames: Record<MaterialGroup, string> = {
  edge: 'Edge contacts, modules and cards',
  boards: 'Boards',
  processors: 'Processors',
  chips: 'Chips and packages',
  pins: 'Pins and connectors',
};

export const lineName = ({ label }: Pick<LineDraft, 'label'>, index: number): string => label || `Line ${index + 1}`;

export const classOf = (catalogue: Catalogue, code: string | null): MaterialClass | null =>
  catalogue.classes.find((one) => one.code === code) ?? null;

/** Whether the gold of this kind sits on a surface whose plating can be told. */
export const isPlated = (kind: MaterialClass | null): boolean =>
  kind?.components.some((component) => component.kind === 'plating' || component.kind === 'finish') ?? false;

const countWords: Record<LineDraft['countEvidence'], string> = {
  stated: 'by eye',
  'counted-on-photo': 'counted on a photo',
  counted: 'counted',
};

/** How much of it there is, and how that is known: "1,940 pieces counted, 52.1 kg weighed". */
export function amountWords(line: Pick<LineDraft, 'pieces' | 'countEvidence' | 'massG' | 'massEvidence'>): string {
  const pieces = line.pieces === null ? null : `${counted(line.pieces, 'piece')} ${countWords[line.countEvidence]}`;
  const mass = line.massG === null ? null : `${formatMassG(line.massG)} ${line.massEvidence}`;
  return [pieces, mass].filter(Boolean).join(', ') || 'Amount not given yet';
}

const um = (thicknessUm: number) => `${formatSignificant(thicknessUm, 3)}${NBSP}µm`;

/** How the plating is known; null when the kind's usual plating stands. */
export function platingWords({ plating }: Pick<LineDraft, 'plating'>): string | null {
  switch (plating?.kind) {
    case 'standard':
      return `plating at least ${um(plating.minimumUm)} by its standard`;
    case 'range':
      return `plating ${formatNumber(plating.leastUm)} to ${um(plating.mostUm)}`;
    case 'xrf':
      return `plating ${um(plating.thicknessUm)} by XRF`;
    case undefined:
      return null;
  }
}
