import type { LineDraft, LotDraft } from '@lydite/contracts';
import type { Estimate, MaterialClass } from '@lydite/valuation';
import type { Lot } from './lot.entity.ts';

export type ListedLine = LineDraft & { classCode: string };

/**
 * The lines of a complete draft as they are listed: with an id of the market's own, since two drafts may carry the same one,
 * and with their class's name where the seller gave none.
 */
export const listedLines = (
  lines: readonly LineDraft[],
  { classes, newId }: { classes: readonly MaterialClass[]; newId: () => string },
): ListedLine[] =>
  lines.map((line) => {
    const classCode = line.classCode!;
    return {
      ...line,
      classCode,
      id: newId(),
      label: line.label || classes.find(({ code }) => code === classCode)!.name,
    };
  });

type ListedFields = Pick<
  Lot,
  | 'title'
  | 'description'
  | 'form'
  | 'basis'
  | 'place'
  | 'country'
  | 'deliveryWay'
  | 'deliveryHours'
  | 'freightMinor'
  | 'startMinor'
  | 'reserveMinor'
  | 'askingMinor'
  | 'massG'
  | 'massEvidence'
  | 'pieces'
  | 'classCodes'
>;

/** What a complete draft fixes for good. Amounts of the sale form that was not chosen, and freight of a collection, are dropped. */
export function listedFields({ title, description, lines, sale, delivery, declarations }: LotDraft): ListedFields {
  const takesBids = sale.form === 'open-bids';
  const isCounted = lines.every(({ pieces }) => pieces !== null);
  return {
    title,
    description,
    form: sale.form,
    basis: 'outright',
    place: delivery.place,
    country: declarations.country,
    deliveryWay: delivery.way,
    deliveryHours: delivery.hours,
    freightMinor: delivery.way === 'seller-sends' ? delivery.freightMinor : 0,
    startMinor: takesBids ? sale.startMinor : null,
    reserveMinor: takesBids ? sale.reserveMinor : null,
    askingMinor: takesBids ? null : sale.askingMinor,
    massG: lines.reduce((sum, { massG }) => sum + massG!, 0),
    massEvidence: lines.every(({ massEvidence }) => massEvidence === 'weighed') ? 'weighed' : 'stated',
    pieces: isCounted ? lines.reduce((sum, { pieces }) => sum + pieces!, 0) : null,
    classCodes: [...new Set(lines.map(({ classCode }) => classCode!))],
  };
}

/** What the desk should look at in an open lot; null when nothing stands out. */
export function reviewNote({ declarations }: LotDraft, { warnings }: Pick<Estimate, 'warnings'>): string | null {
  const notes = warnings.filter(({ code }) => code === 'mass-per-piece').map(({ message }) => message);
  if (declarations.mercuryOrBeryllium === 'present') notes.push(`Declared hazard: ${declarations.hazardNote}`);
  if (declarations.batteries === 'packed') notes.push(`Batteries packed: ${declarations.batteriesNote}`);
  return notes.length > 0 ? notes.join(' ') : null;
}
