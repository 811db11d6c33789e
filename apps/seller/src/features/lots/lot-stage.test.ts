import type { MyLotRow } from '@lydite/contracts';
import { dealState, lotState } from '@lydite/contracts';
import { expect, it } from 'vitest';
import { markState } from './components/StageMark.tsx';
import { byDuty, isInView, stages, standingOf, views } from './lot-stage.ts';

const row = (change: Partial<MyLotRow> = {}): MyLotRow => ({
  code: 'L-1',
  title: '',
  state: 'open',
  coverPhotoId: null,
  massG: null,
  goldG: null,
  estimate: null,
  priceMinor: null,
  bidders: 0,
  closesAt: null,
  dealCode: null,
  dealState: null,
  duty: '',
  dutyBy: null,
  updatedAt: '2026-12-01T10:00:00.000Z',
  ...change,
});
const marks = (change: Partial<MyLotRow>) => {
  const standing = standingOf(row(change));
  return stages.map((stage) => markState(standing, stage)).join(' ');
};

it('sets the marks along the chain', () => {
  expect(marks({ state: 'draft' })).toBe('now todo todo todo todo');
  expect(marks({ state: 'open' })).toBe('done now todo todo todo');
  expect(marks({ state: 'awarded', dealState: 'held' })).toBe('done done now todo todo');
  expect(marks({ state: 'awarded', dealState: 'settled' })).toBe('done done done done done');
  expect(marks({ state: 'unsold' })).toBe('done none none none none');
});

it('has words for every state of a lot and of a deal', () => {
  for (const state of lotState.options) expect(standingOf(row({ state })).words).not.toBe('');
  for (const deal of dealState.options)
    expect(standingOf(row({ state: 'awarded', dealState: deal })).words).not.toBe('Awarded');
});

it('puts every lot into exactly one of drafts, open, sold and ended', () => {
  const kinds = views.filter((view) => view !== 'all' && view !== 'duties');
  const lots = [
    ...lotState.options.map((state) => row({ state })),
    ...dealState.options.map((deal) => row({ state: 'awarded', dealState: deal })),
  ];
  for (const lot of lots) expect(kinds.filter((view) => isInView(lot, view))).toHaveLength(1);
});

it('sorts by what is due first, then by what was touched last', () => {
  const lots = [
    row({ code: 'L-1', updatedAt: '2026-12-01T08:00:00.000Z' }),
    row({ code: 'L-2', updatedAt: '2026-12-01T09:00:00.000Z' }),
    row({ code: 'L-3', duty: 'Finish and list it' }),
    row({ code: 'L-4', duty: 'Send it', dutyBy: '2026-12-04T17:00:00.000Z' }),
    row({ code: 'L-5', duty: 'Check the weigh-in', dutyBy: '2026-12-02T17:00:00.000Z' }),
  ];
  expect(lots.toSorted(byDuty).map(({ code }) => code)).toEqual(['L-5', 'L-4', 'L-3', 'L-2', 'L-1']);
});
