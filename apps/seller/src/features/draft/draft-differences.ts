import type { LineDraft, LotDraft } from '@lydite/contracts';
import { formatMoney } from '@lydite/ui';

export interface Difference {
  /** What differs, in words: "Mass of DDR4 registered". */
  name: string;
  mine: string;
  other: string;
}

const none = '–';

/** Names of what a seller fills in, by its place in the draft. Figures that only follow from others have none. */
const lineNames: Partial<Record<keyof LineDraft, string>> = {
  label: 'Name',
  classCode: 'Kind',
  identityEvidence: 'How the kind is known',
  massText: 'Mass',
  massUnit: 'Unit of the mass',
  massEvidence: 'How the mass is known',
  scaleResolutionG: 'Steps of the scale, g',
  pieces: 'Pieces',
  countEvidence: 'How the pieces are known',
  plating: 'Plating',
  contactsPerPiece: 'Contacts of one piece',
  padAreaMm2: 'Area of one contact, mm²',
  areaCm2PerPiece: 'Plated area of one piece, cm²',
  pieceMassG: 'Mass of one piece, g',
  wear: 'Share worn off',
  assay: 'Assay',
};
const headNames: Record<string, string> = { title: 'Title', description: 'Description' };
const saleNames: Record<string, string> = {
  'sale.form': 'Form of sale',
  'sale.startMinor': 'Start price',
  'sale.reserveMinor': 'Lowest price',
  'sale.askingMinor': 'Asking price',
  'sale.days': 'Days on the market',
  'delivery.way': 'Delivery',
  'delivery.freightMinor': 'Freight',
  'delivery.place': 'Place',
  'delivery.hours': 'Hours of collection',
  'declarations.rightToSell': 'Right to sell',
  'declarations.batteries': 'Batteries',
  'declarations.batteriesNote': 'How batteries are packed',
  'declarations.mercuryOrBeryllium': 'Mercury or beryllium',
  'declarations.hazardNote': 'Where mercury or beryllium is',
  'declarations.country': 'Country',
};

const plainWords: Record<string, string> = {
  'open-bids': 'open bids',
  'asking-price': 'asking price',
  'seller-sends': 'seller sends',
  'counted-on-photo': 'counted on a photo',
};

/** Whether two drafts say the same; order of keys does not matter, order of lines does. */
export const isSameDraft = (one: LotDraft, other: LotDraft): boolean => written(one) === written(other);

const written = (value: unknown): string =>
  JSON.stringify(value, (_key, part: unknown) =>
    part && typeof part === 'object' && !Array.isArray(part)
      ? Object.fromEntries(Object.entries(part).toSorted(([a], [b]) => (a < b ? -1 : 1)))
      : part,
  );

/** What differs between two versions of a draft, in the order of the form; lines are matched by id. */
export function differencesOf(mine: LotDraft, other: LotDraft, currency: string): Difference[] {
  const words = (path: string, value: unknown): string => {
    if (value === null || value === undefined || value === '') return none;
    if (path.endsWith('Minor')) return formatMoney(value as number, currency);
    if (typeof value === 'boolean') return value ? 'yes' : 'no';
    if (typeof value === 'object') return Object.values(value).join(' ');
    const text = typeof value === 'string' ? value : JSON.stringify(value);
    return plainWords[text] ?? text;
  };
  const differing = (name: string, path: string, pair: [unknown, unknown]): Difference[] =>
    written(pair[0]) === written(pair[1]) ? [] : [{ name, mine: words(path, pair[0]), other: words(path, pair[1]) }];
  const at = (draft: LotDraft, path: string): unknown =>
    path.split('.').reduce<unknown>((value, key) => (value as Record<string, unknown>)[key], draft);

  const fields = (names: Record<string, string>) =>
    Object.entries(names).flatMap(([path, name]) => differing(name, path, [at(mine, path), at(other, path)]));
  const ids = [...new Set([...mine.lines, ...other.lines].map(({ id }) => id))];
  const lines = ids.flatMap((id) => {
    const [here, there] = [mine, other].map((draft) => draft.lines.find((line) => line.id === id));
    const index =
      [mine, other].map((draft) => draft.lines.findIndex((line) => line.id === id)).find((i) => i >= 0) ?? 0;
    const lineName = here?.label || there?.label || `line ${index + 1}`;
    if (!here || !there)
      return [{ name: `Line “${lineName}”`, mine: here ? 'kept' : 'not there', other: there ? 'kept' : 'not there' }];
    return Object.entries(lineNames).flatMap(([key, name]) =>
      differing(`${name}, ${lineName}`, key, [here[key as keyof LineDraft], there[key as keyof LineDraft]]),
    );
  });
  return [...fields(headNames), ...lines, ...fields(saleNames)];
}
