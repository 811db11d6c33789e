import type { OpenLot } from '../stories/open-lots.ts';
import {
  about,
  asking,
  bidsFrom,
  collected,
  counted,
  countedOnPhoto,
  line,
  sackOnScale,
  sentFor,
  statedKg,
  weighedKg,
} from '../lot-plan.ts';
import type { Calendar } from '../time.ts';

/** Boards and cards that are on the market now. */
export const openBoards = ({ fullHour, ahead }: Calendar): OpenLot[] => [
  {
    seller: 'clearance',
    closes: ahead(3, 17),
    bids: [
      ['works', 170],
      ['reclaim', 210],
    ],
    plan: {
      title: 'Expansion cards, mixed, brackets off',
      description:
        'Sound, network and graphics cards from office machines, brackets and coolers taken off. Roughly a third have short contacts. The mass of both sacks is as the haulier wrote it down.',
      lines: [line('expansion-cards', 'Expansion cards, mixed', statedKg(28), about(210))],
      photos: [
        { file: 'expansion-cards', slot: 'whole', description: 'Part of the lot spread on the mat' },
        sackOnScale({ netKg: 14.3, tareKg: 0.4, resolutionG: 100 }, 'One of two sacks on the floor scale'),
      ],
      sale: bidsFrom(150, { days: 7 }),
      delivery: sentFor(24),
    },
  },
  {
    seller: 'disposal',
    closes: fullHour(6),
    bids: [
      ['refining', 850],
      ['recovery', 1080],
      ['trading', 1250],
    ],
    plan: {
      title: 'Two-socket server boards, sockets in place',
      description:
        'From one hosting hall, all of two makes. Processors, memory and coolers are out, sockets and shields are on. Batteries are out. Stacked on one pallet.',
      lines: [line('server-boards', 'Two-socket server boards', weighedKg(64.5, 100), counted(34))],
      photos: [{ file: 'server-boards', slot: 'whole', description: 'Two boards as they lie on the pallet' }],
      sale: bidsFrom(700, { days: 10, reserve: 1000 }),
      delivery: sentFor(62),
    },
  },
  {
    seller: 'disposal',
    closes: ahead(2, 11),
    bids: [
      ['reclaim', 720],
      ['refining', 860],
      ['recovery', 960],
    ],
    plan: {
      title: 'Switch and router boards, shields on',
      description:
        'Boards out of rack switches and routers, 24 and 48 ports, shields and jacks on, no supplies among them. Heat sinks removed where they were clipped.',
      lines: [line('network-boards', 'Switch and router boards', weighedKg(85, 100), countedOnPhoto(96))],
      photos: [{ file: 'network-boards', slot: 'whole', description: 'The upper layer of the crate' }],
      sale: bidsFrom(600, { days: 8 }),
      delivery: sentFor(70),
    },
  },
  {
    seller: 'collectors',
    closes: ahead(7, 15),
    bids: [],
    plan: {
      title: 'Telecom line cards, gold from edge to edge',
      description:
        'Line cards from an exchange that was taken down in the nineties. Some are plated over the whole face, most only at the edge; we have not sorted them. Relays were taken off.',
      lines: [line('telecom-boards', 'Line cards, several makes', statedKg(41))],
      photos: [{ file: 'telecom-card', slot: 'one-piece', description: 'One of the better cards' }],
      sale: bidsFrom(500, { days: 14 }),
      delivery: sentFor(45),
      declarations: { mercuryOrBeryllium: 'none' },
    },
  },
  {
    seller: 'repairs',
    closes: ahead(3, 12),
    bids: [
      ['works', 190],
      ['recovery', 265],
      ['trading', 290],
      ['reclaim', 320],
      ['trading', 350],
    ],
    plan: {
      title: 'Phone boards without cells, mixed years',
      description:
        'Boards of keypad and touch phones, cells and shields removed. Years and makes are mixed, so the gold may vary a lot; look at the photo.',
      lines: [line('phone-boards', 'Phone boards, keypad and touch', weighedKg(9.6, 10), about(450))],
      photos: [
        { file: 'phone-boards', slot: 'whole', description: 'A loose layer of the lot' },
        sackOnScale({ netKg: 9.6, tareKg: 0.21, resolutionG: 10 }, 'The sack on the scale'),
      ],
      sale: bidsFrom(150, { days: 7, reserve: 420 }),
      delivery: sentFor(14),
    },
  },
  {
    seller: 'dismantling',
    closes: ahead(8, 18),
    bids: [],
    plan: {
      title: 'Hard-drive boards, 3.5 inch',
      description: 'Unscrewed by hand, nothing broken off. Counted into bags of fifty.',
      lines: [line('drive-boards', 'Hard-drive boards', weighedKg(6.3, 10), counted(450))],
      photos: [{ file: 'hard-drive-boards', slot: 'whole', description: 'One bag emptied on the bench' }],
      sale: asking(125, { days: 12 }),
      delivery: sentFor(12),
    },
  },
  {
    seller: 'salvage',
    closes: ahead(6, 14),
    bids: [],
    plan: {
      title: 'Boards from optical drives and players',
      description: 'Loaders and lasers are off. Cables were cut close to the board.',
      lines: [line('player-boards', 'Optical-drive and player boards', weighedKg(18, 100), about(430))],
      photos: [{ file: 'player-boards', slot: 'whole', description: 'A part of the crate' }],
      sale: bidsFrom(90, { days: 10 }),
      delivery: sentFor(19),
    },
  },
  {
    seller: 'dismantling',
    closes: ahead(4, 10),
    bids: [['recovery', 310]],
    plan: {
      title: 'Game console boards, three generations',
      description:
        'Coolers and housings removed, processors on the boards. About a third have water marks at the edge.',
      lines: [line('console-boards', 'Game console boards', weighedKg(31, 100), counted(77))],
      photos: [{ file: 'console-boards', slot: 'whole', description: 'Four boards of two generations' }],
      sale: bidsFrom(250, { days: 9 }),
      delivery: sentFor(28),
    },
  },
  {
    seller: 'clearance',
    closes: ahead(5, 16),
    bids: [
      ['reclaim', 820],
      ['works', 940],
      ['refining', 1250],
    ],
    plan: {
      title: 'Unsorted boards, two crates',
      description:
        'What came out of a school and two offices: player and supply boards with better ones among them. Unsorted, and sold as such. Mass as the haulier wrote it down.',
      lines: [line('mixed-boards', 'Boards, unsorted', statedKg(310))],
      photos: [
        { file: 'mixed-boards-crate', slot: 'whole', description: 'Looking down into the first crate' },
        {
          ...sackOnScale({ netKg: 22.6, tareKg: 0.4, resolutionG: 100 }, 'The last sack, part of the mass'),
          slot: 'other',
        },
      ],
      sale: bidsFrom(600, { days: 12 }),
      delivery: collected('Monday to Friday, 8:00 to 15:30, ramp and fork-lift'),
    },
  },
  {
    seller: 'dismantling',
    closes: ahead(9, 17),
    bids: [],
    plan: {
      title: 'Office machine lot: main boards, cards, drive boards',
      description:
        'Everything from 60 office machines, sorted into three sacks. Heat sinks and batteries are off the main boards.',
      lines: [
        line('desktop-boards', 'Main boards, sockets in place', weighedKg(46, 100), counted(60)),
        line('expansion-cards', 'Cards, brackets off', weighedKg(9.5, 100), counted(71)),
        line('drive-boards', 'Hard-drive boards', weighedKg(0.86, 10), counted(60)),
      ],
      photos: [
        { file: 'desktop-main-boards', slot: 'whole', description: 'Three of the main boards' },
        { file: 'expansion-cards', slot: 'other', description: 'The cards' },
        sackOnScale({ netKg: 9.5, tareKg: 0.4, resolutionG: 100 }, 'The sack with the cards'),
        { file: 'hard-drive-boards', slot: 'other', description: 'Drive boards, as in the third sack' },
      ],
      sale: asking(760, { days: 13 }),
      delivery: sentFor(48),
    },
  },
];
