import type { LineDraft } from '@lydite/contracts';
import { platingStandards } from '@lydite/valuation';

type Plating = NonNullable<LineDraft['plating']>;

/** The plating as it is filled in: a way of knowing it, and figures that may still be missing. */
export interface PlatingEntry {
  known: Plating['kind'] | 'not-known';
  standardId: string;
  leastUm: number | null;
  mostUm: number | null;
  thicknessUm: number | null;
}

export const mostThicknessUm = 100;

/** The entry a saved plating came from; a standard is found again by the least thickness it demands. */
export const toEntry = (plating: LineDraft['plating']): PlatingEntry => ({
  known: plating?.kind ?? 'not-known',
  standardId:
    plating?.kind === 'standard'
      ? (platingStandards.find(({ minimumUm }) => minimumUm === plating.minimumUm)?.id ?? '')
      : '',
  leastUm: plating?.kind === 'range' ? plating.leastUm : null,
  mostUm: plating?.kind === 'range' ? plating.mostUm : null,
  thicknessUm: plating?.kind === 'xrf' ? plating.thicknessUm : null,
});

/** What the entry says of the plating; null while it says nothing whole. */
export function fromEntry({ known, standardId, leastUm, mostUm, thicknessUm }: PlatingEntry): LineDraft['plating'] {
  switch (known) {
    case 'standard': {
      const standard = platingStandards.find(({ id }) => id === standardId);
      return standard ? { kind: 'standard', minimumUm: standard.minimumUm } : null;
    }
    case 'range':
      return leastUm === null || mostUm === null || leastUm > mostUm ? null : { kind: 'range', leastUm, mostUm };
    case 'xrf':
      return thicknessUm === null ? null : { kind: 'xrf', thicknessUm };
    case 'not-known':
      return null;
  }
}
