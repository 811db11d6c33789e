import type { OpenLot } from '../stories/open-lots.ts';
import { about, asking, bidsFrom, counted, countedOnPhoto, inspected, line, sentFor, weighedKg } from '../lot-plan.ts';
import type { Calendar } from '../time.ts';

/** Processors and chip packages that are on the market now. */
export const openChips = ({ ahead }: Calendar): OpenLot[] => [
  {
    seller: 'collectors',
    closes: ahead(7, 19),
    bids: [
      ['trading', 560],
      ['refining', 610],
      ['recovery', 660],
      ['refining', 720],
    ],
    plan: {
      title: 'Ceramic processors, gold lids, pinned',
      description:
        'A collector’s doubles: ceramic packages with 273 pins, most with gold lids, some with a broken corner. Ceramic of this kind may hold beryllium oxide: do not break, grind or heat it.',
      lines: [
        line('ceramic-processors', 'Ceramic, 273 pins', inspected, weighedKg(3.14, 1), counted(112), {
          contactsPerPiece: 273,
        }),
      ],
      photos: [{ file: 'ceramic-processors', slot: 'whole', description: 'Lids and pins in turn' }],
      sale: bidsFrom(450, { days: 12, reserve: 640 }),
      delivery: sentFor(14),
      declarations: {
        mercuryOrBeryllium: 'present',
        hazardNote: 'All pieces are ceramic packages that may hold beryllium oxide. Unbroken, in trays.',
      },
    },
  },
  {
    seller: 'repairs',
    closes: ahead(2, 18),
    bids: [
      ['reclaim', 220],
      ['recovery', 265],
      ['works', 240],
    ],
    plan: {
      title: 'Fibre processors, pinned, no coolers',
      description: 'Pinned processors on resin, coolers off, paste wiped. Bent pins on some, none missing.',
      lines: [line('fibre-processors-pinned', 'Pinned processors on resin', weighedKg(7.9, 10), counted(330))],
      photos: [{ file: 'fibre-processors-pinned', slot: 'whole', description: 'Tops and pins' }],
      sale: bidsFrom(180, { days: 6 }),
      delivery: sentFor(12),
    },
  },
  {
    seller: 'disposal',
    closes: ahead(9, 11),
    bids: [],
    plan: {
      title: 'Land-pad processors, several generations',
      description: 'Processors with pads instead of pins, lids on, paste wiped. Sorted by nothing but size.',
      lines: [line('fibre-processors-land', 'Land-pad processors', weighedKg(11.2, 10), countedOnPhoto(430))],
      photos: [{ file: 'fibre-processors-land', slot: 'whole', description: 'Lids and pads' }],
      sale: asking(85, { days: 14 }),
      delivery: sentFor(14),
    },
  },
  {
    seller: 'clearance',
    closes: ahead(3, 19),
    bids: [
      ['works', 560],
      ['refining', 720],
      ['recovery', 760],
    ],
    plan: {
      title: 'Ball-grid packages, wire-bonded, pulled whole',
      description:
        'Lifted off graphics and network boards, whole, balls mostly on. Flip-chip packages were sorted out as well as we could.',
      lines: [line('wire-bonded-packages', 'Ball-grid packages, whole', weighedKg(2.4, 1), about(750))],
      photos: [{ file: 'ball-grid-packages', slot: 'whole', description: 'A handful, some showing their balls' }],
      sale: bidsFrom(400, { days: 8 }),
      delivery: sentFor(9),
    },
  },
  {
    seller: 'dismantling',
    closes: ahead(11, 16),
    bids: [],
    plan: {
      title: 'Stripped package tops, assayed',
      description:
        'Moulded tops of ball-grid packages with their wires. A sample from the mixed lot was assayed by an assay laboratory; its report goes with the lot.',
      lines: [
        line('package-tops', 'Package tops, mixed and sampled', inspected, weighedKg(1.15, 1), {
          assay: { gradeGPerT: 7400, relativeSd: 0.08 },
        }),
      ],
      photos: [{ file: 'package-tops-dish', slot: 'whole', description: 'Part of the lot in a dish' }],
      sale: asking(770, { days: 14 }),
      delivery: sentFor(8),
    },
  },
  {
    seller: 'repairs',
    closes: ahead(4, 21),
    bids: [
      ['reclaim', 220],
      ['recovery', 330],
      ['trading', 300],
    ],
    plan: {
      title: 'Leaded plastic chips, old and new mixed',
      description:
        'Cut and pulled from boards over the years. Older ones have gold wires, newer ones mostly copper; we did not sort them.',
      lines: [line('plastic-chips', 'Leaded chips, mixed years', weighedKg(5.2, 10))],
      photos: [{ file: 'plastic-chips', slot: 'whole', description: 'A tray of the lot' }],
      sale: bidsFrom(150, { days: 9 }),
      delivery: sentFor(10),
    },
  },
];
