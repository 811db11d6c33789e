import type { LineDraft, LotDraft } from '@lydite/contracts';
import { describe, expect, test } from 'vitest';
import { completeDraft, lineOf } from '../../../test/lot-drafts.ts';
import { copiedDraft, emptyDraft, missingOf } from './draft.rules.ts';

const classCodes = new Set(['memory-modules', 'network-boards']);
const pathsOf = (draft: LotDraft, photoCount = 1): string[] =>
  missingOf({ draft, photoCount, classCodes }).map(({ path }) => path);
const withLine = (line: Partial<LineDraft>): LotDraft => ({ ...completeDraft(), lines: [lineOf(line)] });
const withSale = (sale: Partial<LotDraft['sale']>): LotDraft => {
  const draft = completeDraft();
  return { ...draft, sale: { ...draft.sale, ...sale } };
};

describe('what is missing', () => {
  test('nothing of a complete draft', () => expect(pathsOf(completeDraft())).toEqual([]));

  test('of an empty draft: every part of the task list, in its order', () => {
    const parts = missingOf({ draft: emptyDraft('Harrowmere'), photoCount: 0, classCodes }).map(({ part }) => part);
    expect([...new Set(parts)]).toEqual(['photos', 'contents', 'weight', 'sale', 'declarations']);
  });

  test.each<[string, Partial<LineDraft>, string[]]>([
    ['a line without a class', { classCode: null }, ['lines.0.classCode']],
    ['a class the catalogue in force has not', { classCode: 'gone' }, ['lines.0.classCode']],
    ['a line without a mass, even with pieces', { massG: null, pieces: 20 }, ['lines.0.massG']],
    ['a mass below the milligram', { massG: 0.0004 }, ['lines.0.massG']],
    ['a range upside down', { plating: { kind: 'range', leastUm: 2, mostUm: 1 } }, ['lines.0.plating']],
  ])('%s', (_, line, paths) => expect(pathsOf(withLine(line))).toEqual(paths));

  test('a start price for open bids, a price for an asking price', () => {
    expect(pathsOf(withSale({ startMinor: null }))).toEqual(['sale.startMinor']);
    expect(pathsOf(withSale({ form: 'asking-price', startMinor: null }))).toEqual(['sale.askingMinor']);
    expect(pathsOf(withSale({ startMinor: 5000, reserveMinor: 4999 }))).toEqual(['sale.reserveMinor']);
    expect(pathsOf(withSale({ startMinor: 5000, reserveMinor: 5000 }))).toEqual([]);
    expect(pathsOf(withSale({ startMinor: 49 }))).toEqual(['sale.startMinor']);
    expect(pathsOf(withSale({ startMinor: 50 }))).toEqual([]);
    expect(pathsOf(withSale({ form: 'asking-price', startMinor: null, askingMinor: 49 }))).toEqual([
      'sale.askingMinor',
    ]);
  });

  test('freight when the seller sends (0 is an amount), hours when the buyer collects', () => {
    const draft = completeDraft();
    const delivered = (delivery: Partial<LotDraft['delivery']>) =>
      pathsOf({ ...draft, delivery: { ...draft.delivery, ...delivery } });
    expect(delivered({ freightMinor: null })).toEqual(['delivery.freightMinor']);
    expect(delivered({ freightMinor: 0 })).toEqual([]);
    expect(delivered({ way: 'collection', freightMinor: null, hours: '' })).toEqual(['delivery.hours']);
  });

  test('each declaration, and the words that go with a yes', () => {
    const draft = completeDraft();
    const declared = (declarations: Partial<LotDraft['declarations']>) =>
      pathsOf({ ...draft, declarations: { ...draft.declarations, ...declarations } });
    expect(declared({ rightToSell: false, country: '' })).toEqual(['declarations.rightToSell', 'declarations.country']);
    expect(declared({ batteries: 'packed' })).toEqual(['declarations.batteriesNote']);
    expect(declared({ mercuryOrBeryllium: 'present' })).toEqual(['declarations.hazardNote']);
    expect(declared({ mercuryOrBeryllium: 'present', hazardNote: 'Line 1: relays' })).toEqual([]);
  });
});

test('a copy has line ids of its own and declares nothing yet', () => {
  const draft = completeDraft();
  const copy = copiedDraft(draft, () => 'new');
  expect(copy.lines.map(({ id }) => id)).toEqual(draft.lines.map(() => 'new'));
  expect(copy.declarations).toMatchObject({ rightToSell: false, batteries: null, country: draft.declarations.country });
  expect(copy.sale).toEqual(draft.sale);
});
