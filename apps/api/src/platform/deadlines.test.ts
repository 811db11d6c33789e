import { describe, expect, test } from 'vitest';
import { calendarDeadline } from './deadlines.ts';

const zone = 'Europe/Vienna';
const due = (from: string, days: number, holidays: string[] = []): string =>
  calendarDeadline({ from: new Date(from), days, zone, holidays: new Set(holidays) }).toISOString();

describe('a calendar deadline', () => {
  test('ends at 18:00 in the market’s zone, whatever the hour it began', () => {
    expect(due('2026-12-01T00:30:00Z', 2)).toBe('2026-12-03T17:00:00.000Z');
    expect(due('2026-12-01T22:59:00Z', 2)).toBe('2026-12-03T17:00:00.000Z');
  });
  test('counts days in the market’s zone: past midnight there it is the next day', () => {
    expect(due('2026-12-01T23:30:00Z', 1)).toBe('2026-12-03T17:00:00.000Z');
  });
  test('is moved off a weekend, and off holidays behind it', () => {
    expect(due('2026-12-03T10:00:00Z', 2)).toBe('2026-12-07T17:00:00.000Z');
    expect(due('2026-12-03T10:00:00Z', 2, ['2026-12-07', '2026-12-08'])).toBe('2026-12-09T17:00:00.000Z');
  });
  test('keeps 18:00 over the change of the clocks', () => {
    expect(due('2027-03-26T10:00:00Z', 5)).toBe('2027-03-31T16:00:00.000Z');
  });
});
