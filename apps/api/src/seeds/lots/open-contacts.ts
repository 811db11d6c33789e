import type { OpenLot } from '../stories/open-lots.ts';
import {
  asking,
  bidsFrom,
  counted,
  inspected,
  line,
  memoryOnScale,
  sackOnScale,
  sentFor,
  statedKg,
  weighedKg,
} from '../lot-plan.ts';
import type { Calendar } from '../time.ts';

/** Contacts, memory, pins and connectors that are on the market now. */
export const openContacts = ({ fullHour, ahead }: Calendar): OpenLot[] => [
  {
    seller: 'dismantling',
    closes: fullHour(3),
    bids: [
      ['works', 520],
      ['recovery', 640],
      ['refining', 730],
      ['recovery', 690],
    ],
    plan: {
      title: 'Trimmed edge contacts, cut close',
      description:
        'Cut close to the contacts with a hand shear, no board left beyond 3 mm. Thickness read by XRF on twenty strips; the mean is given. Little wear.',
      lines: [
        line('edge-contacts', 'Edge contacts of cards and memory', inspected, weighedKg(3.2, 1), {
          plating: { kind: 'xrf', thicknessUm: 0.62 },
          wear: 0.03,
        }),
      ],
      photos: [
        { file: 'edge-contacts-heap', slot: 'whole', description: 'The whole lot with a rule in front' },
        { file: 'edge-contacts-close', slot: 'one-piece', description: 'Width and wear from near' },
      ],
      sale: bidsFrom(450, { days: 7, reserve: 600 }),
      delivery: sentFor(9),
    },
  },
  {
    seller: 'repairs',
    closes: ahead(1, 16),
    bids: [
      ['reclaim', 620],
      ['refining', 780],
      ['recovery', 870],
    ],
    plan: {
      title: 'Server memory, DDR3 registered, double-sided',
      description:
        'Pulled from rack servers of one make, dry and clean, labels on. All double-sided with full-length contacts. The data sheet of the make names 30 µin of hard gold.',
      lines: [
        line('memory-modules', 'DDR3 registered, double-sided', inspected, weighedKg(12.4, 10), counted(560), {
          plating: { kind: 'standard', minimumUm: 0.762 },
        }),
      ],
      photos: [
        { file: 'memory-rows', slot: 'whole', description: 'Thirty of the modules laid out' },
        { file: 'memory-close', slot: 'markings', description: 'One module, contacts and label' },
        memoryOnScale(12.4),
      ],
      sale: bidsFrom(400, { days: 7, reserve: 800 }),
      delivery: sentFor(18),
    },
  },
  {
    seller: 'repairs',
    closes: ahead(6, 20),
    bids: [
      ['trading', 420],
      ['recovery', 540],
    ],
    plan: {
      title: 'Desktop memory with a bag of trimmed contacts',
      description:
        'Desktop modules of mixed years, single-sided for the most part, and a bag of contacts we trimmed from spoiled ones.',
      lines: [
        line('memory-modules', 'Desktop modules, mixed years', weighedKg(5.6, 10), counted(330)),
        line('edge-contacts', 'Trimmed from spoiled modules', weighedKg(1.1, 1)),
      ],
      photos: [
        { file: 'memory-rows', slot: 'whole', description: 'A part of the modules' },
        { file: 'edge-contacts-close', slot: 'other', description: 'The trimmed contacts' },
      ],
      sale: bidsFrom(300, { days: 10, reserve: 450 }),
      delivery: sentFor(12),
    },
  },
  {
    seller: 'collectors',
    closes: ahead(4, 15),
    bids: [
      ['refining', 620],
      ['recovery', 740],
      ['reclaim', 820],
    ],
    plan: {
      title: 'Contact pins, plated all over',
      description:
        'Square pins pulled out of plug blocks, plated over their whole length. The drawing of the blocks asks for 0.3 to 0.5 µm.',
      lines: [
        line('pins-full', 'Square pins, 0.64 mm', weighedKg(1.85, 1), {
          plating: { kind: 'range', leastUm: 0.3, mostUm: 0.5 },
        }),
      ],
      photos: [{ file: 'contact-pins', slot: 'whole', description: 'The pins on a sheet of paper' }],
      sale: bidsFrom(400, { days: 8 }),
      delivery: sentFor(8),
    },
  },
  {
    seller: 'salvage',
    closes: ahead(5, 13),
    bids: [],
    plan: {
      title: 'Gold-plated connectors, whole',
      description:
        'Slots, blocks and shells, plastic on. Gold only at the mating end of the contacts, as far as we can see.',
      lines: [line('connectors', 'Slots and plug blocks', weighedKg(14.6, 100))],
      photos: [
        { file: 'connectors-whole', slot: 'whole', description: 'A spread of what is in the sack' },
        sackOnScale({ netKg: 14.6, tareKg: 0.4, resolutionG: 100 }, 'The sack on the floor scale'),
      ],
      sale: bidsFrom(100, { days: 9 }),
      delivery: sentFor(16),
    },
  },
  {
    seller: 'works',
    closes: ahead(10, 12),
    bids: [],
    plan: {
      title: 'Selectively plated pins, gold at the tip',
      description: 'Strips from a plug maker’s scrap, gold at the tip only. Mass as on the maker’s label.',
      lines: [line('pins-selective', 'Pin strips', statedKg(6.5))],
      photos: [{ file: 'contact-pins', slot: 'whole', description: 'Pins broken off their strips' }],
      sale: asking(540, { days: 13 }),
      delivery: sentFor(10),
    },
  },
];
