import { describe, expect, it } from 'vitest';
import { formatAbout, formatMoney } from './format-money.ts';
import { formatBreakEvenG, formatGoldG, formatGrade, formatMassG, formatRange, formatShare } from './format-mass.ts';
import { formatDateTime, formatDuration, formatRelative } from './format-time.ts';

describe('money', () => {
  it('drops zero cents and keeps others', () => {
    expect(formatMoney(620_000, 'USD')).toBe('$6,200');
    expect(formatMoney(620_050, 'USD')).toBe('$6,200.50');
    expect(formatMoney(620_000, 'USD', { cents: 'always' })).toBe('$6,200.00');
  });
  it('writes a true minus before the sign and a plus when asked', () => {
    expect(formatMoney(-44_000, 'USD')).toBe('\u2212$440');
    expect(formatMoney(135_000, 'USD', { signed: true })).toBe('+$1,350');
    expect(formatMoney(0, 'USD', { signed: true })).toBe('$0');
    expect(formatMoney(-20, 'USD', { cents: 'never' })).toBe('$0');
  });
  it('names a currency without a sign of its own', () => {
    expect(formatMoney(100, 'CHF')).toBe('CHF\u00a01');
  });
  it('rounds a worked-out figure to tens', () => {
    expect(formatAbout(135_421, 'USD', { signed: true })).toBe('+$1,350');
    expect(formatAbout(-43_600, 'USD')).toBe('\u2212$440');
  });
});

describe('mass', () => {
  it('shows two significant digits for estimates', () => {
    expect(formatGoldG(64.23)).toBe('64\u00a0g');
    expect(formatGoldG(0.4567)).toBe('0.46\u00a0g');
    expect(formatGoldG(5)).toBe('5\u00a0g');
    expect(formatGoldG(5.04)).toBe('5\u00a0g');
    expect(formatGoldG(1234)).toBe('1,200\u00a0g');
  });
  it('keeps one place more for a break-even', () => {
    expect(formatBreakEvenG(53.06)).toBe('53.1\u00a0g');
  });
  it('chooses the unit by size', () => {
    expect(formatMassG(206.25)).toBe('206.3\u00a0g');
    expect(formatMassG(86_400)).toBe('86.4\u00a0kg');
    expect(formatMassG(1598)).toBe('1.598\u00a0kg');
    expect(formatMassG(310_250)).toBe('310.25\u00a0kg');
    expect(formatMassG(412_000)).toBe('412\u00a0kg');
    expect(formatMassG(12_500_000)).toBe('12.5\u00a0t');
  });
  it('writes ranges with a dash or in words', () => {
    expect(formatRange([49.6, 82.7])).toBe('50\u201383\u00a0g');
    expect(formatRange([49.6, 82.7], 'g', 'words')).toBe('50 to 83\u00a0g');
    expect(formatRange([63.9, 64.1])).toBe('64\u00a0g');
  });
  it('writes grade and shares', () => {
    expect(formatGrade(741.4)).toBe('741\u00a0g/t');
    expect(formatShare(0.064)).toBe('6.4\u00a0%');
  });
});

describe('time', () => {
  it('names the zone and keeps its summer time', () => {
    expect(formatDateTime('2026-12-03T15:00:00Z', 'Europe/Berlin')).toBe('Thu 3 Dec, 16:00 CET');
    expect(formatDateTime('2026-07-02T14:00:00Z', 'Europe/Berlin')).toBe('Thu 2 Jul, 16:00 CEST');
    expect(formatDateTime('2026-12-03T15:00:00Z', 'Europe/Berlin', { weekday: false, zone: false })).toBe(
      '3 Dec, 16:00',
    );
  });
  it('tells a length in its two largest units', () => {
    expect(formatDuration(((2 * 24 + 4) * 60 + 20) * 60_000)).toBe('2 days 4 hours');
    expect(formatDuration(61 * 60_000)).toBe('1 hour 1 minute');
    expect(formatDuration(24 * 3_600_000 + 5 * 60_000)).toBe('1 day');
    expect(formatDuration(20_000)).toBe('less than a minute');
  });
  it('says in which direction', () => {
    const now = new Date('2026-12-01T12:00:00Z');
    expect(formatRelative('2026-12-01T15:12:00Z', now)).toBe('in 3 hours 12 minutes');
    expect(formatRelative('2026-12-01T11:57:00Z', now)).toBe('3 minutes ago');
  });
});
