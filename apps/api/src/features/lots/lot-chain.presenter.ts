import type { ChainStep } from '@lydite/contracts';
import type { Words } from '../../platform/words.ts';
import type { Lot } from './lot.entity.ts';

type ChainLot = Pick<Lot, 'state' | 'form' | 'listedAt' | 'closesAt' | 'closedAt'>;

interface ChainFacts {
  lot: ChainLot;
  now: Date;
  words: Words;
  /** What followed the award, for the two sides of the deal; null for everybody else, who sees what is to come in general. */
  dealSteps: ChainStep[] | null;
}

/** The chain of custody of a lot, from its listing on. */
export function lotChain({ lot, now, words, dealSteps }: ChainFacts): ChainStep[] {
  const steps: ChainStep[] = [
    { key: 'listed', title: 'Listed', note: '', state: 'done', at: lot.listedAt!.toISOString(), by: 'the seller' },
    saleStep({ lot, now, words }),
  ];
  if (lot.state === 'unsold' || lot.state === 'withdrawn') return steps;
  return [...steps, ...(dealSteps ?? toCome)];
}

function saleStep({ lot, now, words }: Omit<ChainFacts, 'dealSteps'>): ChainStep {
  const title = lot.form === 'asking-price' ? 'At an asking price' : 'Bidding';
  const step = { key: 'sale', title, by: null };
  if (lot.state === 'open' && now < lot.closesAt!)
    return { ...step, state: 'now', note: `Closes ${words.moment(lot.closesAt!)}`, at: null };
  const waiting: Partial<Record<Lot['state'], string>> = {
    open: 'Closed, the result is being worked out',
    frozen: 'Frozen by the desk',
    offered: 'Offered to the next bidder',
  };
  const note = waiting[lot.state];
  if (note) return { ...step, state: 'now', note, at: null };
  const ends: Partial<Record<Lot['state'], string>> = { unsold: 'Ended unsold', withdrawn: 'Withdrawn by the seller' };
  return {
    ...step,
    state: 'done',
    note: ends[lot.state] ?? 'Awarded',
    at: (lot.closedAt ?? lot.closesAt!).toISOString(),
  };
}

const todo = { state: 'todo', at: null, by: null } as const;
const toCome: ChainStep[] = [
  { ...todo, key: 'hold', title: 'Payment into hold', note: 'Within 2 days of the award' },
  { ...todo, key: 'dispatch', title: 'Dispatch or collection', note: 'Within 5 days of the payment' },
  { ...todo, key: 'weigh_in', title: 'Weigh-in on arrival', note: 'Both sides see the ticket' },
  { ...todo, key: 'settlement', title: 'Settlement', note: 'Hold released' },
];
