import type { LineDraft, LotDraft, MissingItem } from '@lydite/contracts';

/** What a seller starts from: nothing said yet, the usual sale terms chosen. */
export const emptyDraft = (place: string): LotDraft => ({
  title: '',
  description: '',
  lines: [],
  sale: { form: 'open-bids', startMinor: null, reserveMinor: null, askingMinor: null, days: 7 },
  delivery: { way: 'seller-sends', freightMinor: null, place, hours: '' },
  declarations: {
    rightToSell: false,
    batteries: null,
    batteriesNote: '',
    mercuryOrBeryllium: null,
    hazardNote: '',
    country: '',
  },
});

/** A new draft from an earlier one. Lines get ids of their own, and what was declared for one lot is declared anew for the next. */
export const copiedDraft = (draft: LotDraft, newId: () => string): LotDraft => ({
  ...draft,
  lines: draft.lines.map((line) => ({ ...line, id: newId() })),
  declarations: { ...emptyDraft('').declarations, country: draft.declarations.country },
});

export const lineName = (line: Pick<LineDraft, 'label'>, index: number): string => line.label || `Line ${index + 1}`;

export interface DraftFacts {
  draft: LotDraft;
  photoCount: number;
  /** Codes of the catalogue in force. */
  classCodes: ReadonlySet<string>;
}

/** What stands between a draft and the market, in the order of the task list. Unlikely figures are no obstacle: they warn, elsewhere. */
export const missingOf = (facts: DraftFacts): MissingItem[] => [
  ...missingPhotos(facts),
  ...missingContents(facts),
  ...missingMasses(facts.draft),
  ...missingSale(facts.draft),
  ...missingDelivery(facts.draft),
  ...missingDeclarations(facts.draft),
];

type Part = MissingItem['part'];
const when = (isMissing: boolean, part: Part, path: string, message: string): MissingItem[] =>
  isMissing ? [{ part, path, message }] : [];

const missingPhotos = ({ photoCount }: DraftFacts): MissingItem[] =>
  when(photoCount === 0, 'photos', 'photos', 'Add at least one photo. The first is the cover.');

function missingContents({ draft: { title, lines }, classCodes }: DraftFacts): MissingItem[] {
  return [
    ...when(title.length < 5, 'contents', 'title', 'Give the lot a title that says what it is.'),
    ...when(lines.length === 0, 'contents', 'lines', 'Describe what is in the lot: one line for each kind.'),
    ...lines.flatMap((line, index) => {
      const name = lineName(line, index);
      const { classCode, plating } = line;
      const isUnknown = classCode !== null && !classCodes.has(classCode);
      const isUpsideDown = plating?.kind === 'range' && plating.leastUm > plating.mostUm;
      return [
        ...when(classCode === null, 'contents', `lines.${index}.classCode`, `Choose the kind of ${name}.`),
        ...when(
          isUnknown,
          'contents',
          `lines.${index}.classCode`,
          `Choose the kind of ${name} anew: the list of kinds has changed.`,
        ),
        ...when(
          isUpsideDown,
          'contents',
          `lines.${index}.plating`,
          `The least plating of ${name} is more than its most.`,
        ),
      ];
    }),
  ];
}

/** The smallest mass the market keeps. */
const leastMassG = 0.001;

const missingMasses = ({ lines }: LotDraft): MissingItem[] => [
  ...when(lines.length === 0, 'weight', 'lines', 'Enter the net mass of each line.'),
  ...lines.flatMap((line, index) => [
    ...when(line.massG === null, 'weight', `lines.${index}.massG`, `Enter the net mass of ${lineName(line, index)}.`),
    ...when(
      line.massG !== null && line.massG < leastMassG,
      'weight',
      `lines.${index}.massG`,
      `The net mass of ${lineName(line, index)} is less than a milligram. Check the unit.`,
    ),
  ]),
];

/** The payment processor takes nothing smaller, and so the market sells nothing cheaper: 0.50. */
const leastPriceMinor = 50;

function missingSale({ sale: { form, startMinor, reserveMinor, askingMinor } }: LotDraft): MissingItem[] {
  const isTooLow = (minor: number | null): boolean => minor !== null && minor < leastPriceMinor;
  const raise = 'Payments begin at 0.50: raise this price.';
  if (form === 'asking-price')
    return [
      ...when(askingMinor === null, 'sale', 'sale.askingMinor', 'Set the asking price.'),
      ...when(isTooLow(askingMinor), 'sale', 'sale.askingMinor', raise),
    ];
  const isReserveLow = startMinor !== null && reserveMinor !== null && reserveMinor < startMinor;
  return [
    ...when(startMinor === null, 'sale', 'sale.startMinor', 'Set the price at which bidding starts.'),
    ...when(isTooLow(startMinor), 'sale', 'sale.startMinor', raise),
    ...when(
      isReserveLow,
      'sale',
      'sale.reserveMinor',
      'Your lowest price is below the start price. Raise it, or leave it out.',
    ),
  ];
}

function missingDelivery({ delivery: { way, freightMinor, place, hours } }: LotDraft): MissingItem[] {
  const sends = way === 'seller-sends';
  return [
    ...when(place === '', 'sale', 'delivery.place', 'Say where the lot is.'),
    ...when(sends && freightMinor === null, 'sale', 'delivery.freightMinor', 'State the freight the buyer pays, or 0.'),
    ...when(!sends && hours === '', 'sale', 'delivery.hours', 'Say at what hours the lot can be collected.'),
  ];
}

function missingDeclarations({ declarations }: LotDraft): MissingItem[] {
  const { rightToSell, batteries, batteriesNote, mercuryOrBeryllium, hazardNote, country } = declarations;
  const at = (field: string): string => `declarations.${field}`;
  return [
    ...when(!rightToSell, 'declarations', at('rightToSell'), 'Declare that you have the right to sell this lot.'),
    ...when(
      batteries === null,
      'declarations',
      at('batteries'),
      'Declare whether batteries are removed, or how they are packed.',
    ),
    ...when(
      batteries === 'packed' && batteriesNote === '',
      'declarations',
      at('batteriesNote'),
      'Say how the batteries are packed.',
    ),
    ...when(
      mercuryOrBeryllium === null,
      'declarations',
      at('mercuryOrBeryllium'),
      'Declare whether the lot holds mercury relays or beryllium ceramics.',
    ),
    ...when(
      mercuryOrBeryllium === 'present' && hazardNote === '',
      'declarations',
      at('hazardNote'),
      'Say which line holds mercury or beryllium.',
    ),
    ...when(country === '', 'declarations', at('country'), 'Choose the country the lot is in.'),
  ];
}
