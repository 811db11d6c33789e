import {
  about,
  bidsFrom,
  collected,
  counted,
  line,
  memoryOnScale,
  sackOnScale,
  sentFor,
  statedKg,
  weighedKg,
  type LotPlan,
} from '../lot-plan.ts';

/** Lots that ended without a sale, and drafts. */
export const unsold = {
  supplyBoards: {
    title: 'Supply and monitor boards',
    description: 'Brown boards with their coils and heat sinks. Sold for the copper as much as for the gold.',
    lines: [line('low-grade-boards', 'Supply and monitor boards', weighedKg(220, 500))],
    photos: [
      { file: 'power-boards', slot: 'whole', description: 'Some of the boards' },
      sackOnScale({ netKg: 27.5, tareKg: 0.5, resolutionG: 500 }, 'One of eight sacks'),
    ],
    sale: bidsFrom(150, { days: 7, reserve: 400 }),
    delivery: collected('By appointment, weekdays'),
  },
  simModules: {
    title: 'Card modules, cut out',
    description: 'Contact plates of SIM and bank cards, cut out with a punch, a rim of card left.',
    lines: [line('card-modules', 'Card modules', statedKg(0.92), about(14_000))],
    photos: [{ file: 'card-modules', slot: 'whole', description: 'Poured on a dark mat' }],
    sale: bidsFrom(200, { days: 10 }),
    delivery: sentFor(7),
  },
  halfDone: {
    title: 'Notebook boards, mixed makes',
    description: '',
    lines: [line('notebook-boards', 'Notebook boards')],
    photos: [{ file: 'notebook-boards', slot: 'whole', description: '' }],
    sale: { form: 'open-bids', startMinor: null, reserveMinor: null, askingMinor: null, days: 7 },
    delivery: { way: 'seller-sends', freightMinor: null, hours: '' },
    declarations: { rightToSell: false, batteries: null, mercuryOrBeryllium: null, country: '' },
  },
  nearlyDone: {
    title: 'Desktop memory, single-sided',
    description: 'Desktop modules, single-sided, sorted by contacts: all full length.',
    lines: [line('memory-modules', 'Desktop modules, single-sided', weighedKg(7.3, 10), counted(430))],
    photos: [{ file: 'memory-rows', slot: 'whole', description: 'Part of the modules laid out' }, memoryOnScale(7.3)],
    sale: bidsFrom(250, { days: 7, reserve: 400 }),
    delivery: sentFor(14),
    declarations: { rightToSell: false, batteries: null, mercuryOrBeryllium: null },
  },
} satisfies Record<string, LotPlan>;
