import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convertText, parseMeasure } from './parse-measure.ts';
import { parseMoneyMinor, parseNumber } from './parse-number.ts';
import { findUnit } from './units.ts';

const value = (text: string, locale?: string) => parseNumber(text, locale)?.value ?? null;

describe('figures', () => {
  it.each([
    ['160', 160],
    ['1 234,5', 1234.5],
    ['1\u00a0234,5', 1234.5],
    ['1,234.5', 1234.5],
    ["1'234.5", 1234.5],
    ['1.234.567', 1_234_567],
    ['1,234,567.25', 1_234_567.25],
    ['12,4', 12.4],
    ['12.4', 12.4],
    ['0,234', 0.234],
    ['0.125', 0.125],
    ['.5', 0.5],
    ['\u22123', -3],
  ])('reads %s', (text, wanted) => expect(value(text)).toBe(wanted));

  it.each(['', 'ten', '1.2.3', '1,23,4', '12..4', '1e5', '--3', '1,234.567,8'])('refuses %s', (text) => {
    expect(value(text)).toBeNull();
  });

  it('lets the locale settle what could be either', () => {
    expect(parseNumber('1,234', 'en-GB')).toEqual({ value: 1234, isAmbiguous: true });
    expect(parseNumber('1,234', 'de-DE')).toEqual({ value: 1.234, isAmbiguous: true });
    expect(parseNumber('1.234', 'en-GB')).toEqual({ value: 1.234, isAmbiguous: true });
    expect(parseNumber('1.234', 'de-DE')).toEqual({ value: 1234, isAmbiguous: true });
  });

  it('reads back whatever the browser writes', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e7, noNaN: true }),
        fc.constantFrom('en-GB', 'de-DE', 'fr-FR', 'de-CH'),
        (number, locale) => {
          const shown = new Intl.NumberFormat(locale, { maximumFractionDigits: 4 }).format(number);
          expect(value(shown, locale)).toBeCloseTo(number, 3);
        },
      ),
    );
  });
});

describe('money', () => {
  it('reads integer minor units, sign or code accepted', () => {
    expect(parseMoneyMinor('6,200')).toBe(620_000);
    expect(parseMoneyMinor('$6,200.50')).toBe(620_050);
    expect(parseMoneyMinor('6200 USD')).toBe(620_000);
    expect(parseMoneyMinor('0.07')).toBe(7);
  });
  it('refuses what can’t be an amount', () => {
    for (const text of ['', '-5', '1.005', '1000000', 'lots']) expect(parseMoneyMinor(text)).toBeNull();
  });
  it('never loses a cent', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 99_999_999 }), (minor) => {
        const text = `${Math.floor(minor / 100)}.${String(minor % 100).padStart(2, '0')}`;
        expect(parseMoneyMinor(text)).toBe(minor);
      }),
    );
  });
});

describe('measures', () => {
  const mass = { kind: 'mass', unit: 'kg' } as const;

  it('uses the selected unit, a typed one wins', () => {
    expect(parseMeasure('12.4', mass)).toMatchObject({ value: 12_400, unit: 'kg', echo: '27.3\u00a0lb' });
    expect(parseMeasure('12.4 kg', { ...mass, unit: 'lb' })).toMatchObject({ value: 12_400, unit: 'kg' });
    expect(parseMeasure('850g', mass)).toMatchObject({ value: 850, unit: 'g' });
  });
  it('adds up pounds and ounces', () => {
    expect(parseMeasure('27 lb 5 oz', mass)?.value).toBeCloseTo(27 * 453.59237 + 5 * 28.349523125, 9);
    expect(parseMeasure('27 lb 5 oz', mass)?.unit).toBe('lb');
  });
  it('keeps troy and common ounces apart', () => {
    expect(parseMeasure('1 oz', mass)?.value).toBeCloseTo(28.349523125, 9);
    expect(parseMeasure('1 ozt', mass)?.value).toBe(31.1034768);
  });
  it('spells an ambiguous figure out', () => {
    expect(parseMeasure('1,234', mass)?.echo).toBe('1,234\u00a0kg, one thousand two hundred');
    expect(parseMeasure('1.234', mass)?.echo).toBe('1.234\u00a0kg, one point two');
  });
  it('reads plating in microinches exactly', () => {
    expect(parseMeasure('30 µin', { kind: 'plating', unit: 'um' })?.value).toBeCloseTo(0.762, 12);
  });
  it('refuses other quantities, negatives and parts out of order', () => {
    for (const text of ['12 µm', '-3', 'heavy', '', '5 oz 27 lb', '3 kg 4 kg', '12 kg heavy']) {
      expect(parseMeasure(text, mass), text).toBeNull();
    }
  });
  it('converts there and back', () => {
    const lb = findUnit('mass', 'lb');
    const kg = findUnit('mass', 'kg');
    if (!lb || !kg) throw new Error('units missing');
    expect(convertText(12 * lb.perUnit, kg)).toBe('5.443');
  });
});
