import { expect, it } from 'vitest';
import { aDraft, aLine } from '../../lib/draft.fixture.ts';
import { stepAfter, stepNotes, type StepFacts } from './steps.ts';

const notes = (change: Partial<StepFacts> = {}) =>
  stepNotes({
    draft: aDraft(),
    missing: [],
    photoCount: 4,
    waitingCount: 0,
    checkCount: 0,
    currency: 'USD',
    ...change,
  });

it('tells the state of each page in words', () => {
  expect(notes()).toEqual({
    photos: '4 photos',
    contents: '1 line',
    weight: '52.1\u00a0kg, weighed',
    sale: 'From $1,500, 7 days',
    check: 'Ready to list',
  });
});

it('says what is not started, what waits and what is to be checked', () => {
  const empty = aDraft({ title: '', lines: [], sale: { ...aDraft().sale, startMinor: null } });
  expect(Object.values(notes({ draft: empty, photoCount: 0 })).slice(0, 4)).toEqual(Array(4).fill('Not started'));
  expect(notes({ waitingCount: 2 }).photos).toBe('4 photos, 2 to send');
  expect(notes({ checkCount: 1 }).contents).toBe('1 line, 1 to check');
  expect(notes({ draft: aDraft({ lines: [aLine(), aLine({ massG: null })] }) }).weight).toBe('1 of 2 lines');
  const missing = [{ part: 'sale' as const, path: 'delivery.place', message: 'Say where the lot is.' }];
  expect(notes({ missing })).toMatchObject({ sale: 'From $1,500, 1 to fill in', check: '1 thing missing' });
});

it('leads from page to page and ends at the check', () => {
  expect(stepAfter('photos')).toEqual({ id: 'contents', label: 'Continue to contents' });
  expect(stepAfter('check')).toBeNull();
});
