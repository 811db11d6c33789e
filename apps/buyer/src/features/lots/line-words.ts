import type { PublicLine } from '@lydite/contracts';
import { formatMassG, formatNumber, formatShare } from '@lydite/ui';

const identityWords: Record<PublicLine['identityEvidence'], string> = {
  stated: 'Kind as stated',
  photographed: 'Kind seen on the photos',
  inspected: 'Kind inspected',
};

const countWords: Record<PublicLine['countEvidence'], string> = {
  stated: 'count stated',
  'counted-on-photo': 'counted on a photo',
  counted: 'counted',
};

const um = (thicknessUm: number): string => `${formatNumber(thicknessUm, { maximumSignificantDigits: 3 })}\u00a0µm`;

function platingWords(plating: PublicLine['plating']): string | null {
  if (!plating) return null;
  switch (plating.kind) {
    case 'standard':
      return `Plating to a standard, at least ${um(plating.minimumUm)}`;
    case 'range':
      return `Plating stated, ${formatNumber(plating.leastUm)} to ${um(plating.mostUm)}`;
    case 'xrf':
      return `Plating by XRF, ${um(plating.thicknessUm)}`;
  }
}

function massWords({ massG, massEvidence, scaleResolutionG }: PublicLine): string | null {
  if (massG === null) return null;
  if (massEvidence === 'stated') return 'mass stated';
  return scaleResolutionG === null ? 'weighed' : `weighed to ${formatMassG(scaleResolutionG)}`;
}

/** How the figures of a line are known, as short phrases; what nobody said is not mentioned. */
export function evidenceWords(line: PublicLine): string[] {
  const { className, label, assay } = line;
  const amounts = [line.pieces === null ? null : countWords[line.countEvidence], massWords(line)].filter(Boolean);
  const known = [identityWords[line.identityEvidence], ...amounts].join(', ');
  return [
    label && label !== className ? className : null,
    known,
    platingWords(line.plating),
    assay && `Assayed, ${formatNumber(assay.gradeGPerT)}\u00a0g/t ± ${formatShare(assay.relativeSd * 2)}`,
  ].filter((words): words is string => Boolean(words));
}

/** "weighed" only when every line was. */
export const massEvidenceOf = (lines: readonly PublicLine[]): string =>
  lines.every(({ massEvidence }) => massEvidence === 'weighed') ? 'weighed' : 'as stated';
