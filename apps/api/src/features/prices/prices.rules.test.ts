import { describe, expect, test } from 'vitest';
import { isStale } from './prices.rules.ts';

const stale = (at: string, now: string): boolean => isStale(new Date(at), new Date(now));

describe('a price is stale', () => {
  test('once it is more than 36 hours old, not at 36 hours', () => {
    expect(stale('2026-03-03T10:30:00Z', '2026-03-04T22:30:00Z')).toBe(false);
    expect(stale('2026-03-03T10:30:00Z', '2026-03-04T22:30:00.001Z')).toBe(true);
  });
  test('not counting the weekend: Friday afternoon’s price holds until Monday night', () => {
    const friday = '2026-03-06T15:00:00Z';
    expect(stale(friday, '2026-03-09T10:30:00Z')).toBe(false);
    expect(stale(friday, '2026-03-10T03:00:00Z')).toBe(false);
    expect(stale(friday, '2026-03-10T03:00:01Z')).toBe(true);
  });
  test('by another rule when told so', () => {
    const at = new Date('2026-03-07T00:00:00Z');
    expect(isStale(at, new Date('2026-03-07T02:00:00Z'), { afterHours: 1, idleWeekdays: [] })).toBe(true);
  });
  test('never when it was set only now', () =>
    expect(stale('2026-03-06T15:00:00Z', '2026-03-06T15:00:00Z')).toBe(false));
});
