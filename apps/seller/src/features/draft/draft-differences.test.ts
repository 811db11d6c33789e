import { expect, it } from 'vitest';
import { aDraft, aLine } from '../../lib/draft.fixture.ts';
import { differencesOf, isSameDraft } from './draft-differences.ts';

it('takes drafts for the same whatever the order of their keys', () => {
  const draft = aDraft();
  const turned = Object.fromEntries(Object.entries(draft).toReversed()) as typeof draft;
  expect(isSameDraft(draft, turned)).toBe(true);
  expect(isSameDraft(draft, aDraft({ title: 'Other' }))).toBe(false);
});

it('says what differs in the seller’s words', () => {
  const other = aDraft({
    title: 'Server memory, 50 kg',
    lines: [
      aLine({ massText: '50', massG: 50_000 }),
      aLine({ id: '00000000-0000-4000-8000-000000000002', label: 'DDR4' }),
    ],
    sale: { ...aDraft().sale, startMinor: 120_000 },
  });
  expect(differencesOf(aDraft(), other, 'USD')).toEqual([
    { name: 'Title', mine: 'Server memory, 52 kg', other: 'Server memory, 50 kg' },
    { name: 'Mass, DDR3 registered', mine: '52.1', other: '50' },
    { name: 'Line “DDR4”', mine: 'not there', other: 'kept' },
    { name: 'Start price', mine: '$1,500', other: '$1,200' },
  ]);
});
