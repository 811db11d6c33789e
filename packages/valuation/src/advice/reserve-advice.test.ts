import { expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import { line } from '../lot/line.fixture.ts';
import { simulateLot } from '../lot/simulate-lot.ts';
import { summariseLot } from '../lot/summarise-lot.ts';
import { valueLot } from '../money/value-lot.ts';
import { lognormal } from '../quantity/quantity.ts';
import { quantileOf } from '../quantity/quantile.ts';
import type { LineInput } from '../types.ts';
import { measureNext } from './measure-next.ts';
import { reserveAdvice } from './reserve-advice.ts';
import { typicalTerms } from './typical-terms.ts';

const fees = { sellerFeeShare: 0.04, taxShare: 0, freightMinor: 0 };
const market = { pricePerGMinor: 10_300 };

const advise = (...lines: Partial<LineInput>[]) => {
  const input = { lines: lines.map((given, i) => line({ id: `${i}`, ...given })) };
  const draws = simulateLot(input, catalogue20261, { seed: 1 });
  return reserveAdvice({ draws, estimate: summariseLot(draws), market, fees });
};
const pins: Partial<LineInput> = { classCode: 'pins-full', massG: 4000 };

test('three kinds of buyer: a refiner pays most, a careful one least, and each leaves 96 %', () => {
  const { bids } = advise(pins);
  const [small, refiner, careful] = bids.map(({ bidMinor }) => bidMinor as number) as [number, number, number];
  expect(refiner).toBeGreaterThan(small);
  expect(careful).toBeLessThan(small);
  for (const { bidMinor, leaves } of bids) expect(leaves?.netMinor).toBe(bidMinor! - Math.round(bidMinor! * 0.04));
});

test('pins of unknown plating: measuring it is worth money to every buyer, most to the careful one', () => {
  const [best] = advise(pins).measurements;
  expect(best?.question).toBe('Measure the plating on line 1');
  expect(best!.middleGainMinor).toBeGreaterThan(0);
  expect(best!.gainMinor.careful).toBeGreaterThan(best!.gainMinor.refiner);
});

test('what a measurement is worth is the mean over all it may read, found here by making it forty times', () => {
  const { bids, measurements } = advise(pins);
  const careful = typicalTerms.find(({ key }) => key === 'careful')!.terms;
  // The class's own guess: lognormal around 0.4 µm, gsd 1.9.
  const readings = Array.from({ length: 40 }, (_, i) => quantileOf(lognormal(0.4, 1.9), (i + 0.5) / 40));
  const after = readings.map((thicknessUm) => {
    const measured = line({ ...pins, id: '0', plating: { kind: 'xrf', thicknessUm } });
    const draws = simulateLot({ lines: [measured] }, catalogue20261, { seed: 1, draws: 2003 });
    return valueLot(draws, careful, market).highestSafeBidMinor ?? 0;
  });
  const mean = after.reduce((sum, bid) => sum + bid, 0) / after.length;
  const gain = mean - bids.find(({ key }) => key === 'careful')!.bidMinor!;
  expect(measurements[0]!.gainMinor.careful / gain).toBeCloseTo(1, 1);
});

test('measurements come with the one worth most first, at most three, each question once', () => {
  const { measurements } = advise({ massG: 9000, massEvidence: 'stated', identityEvidence: 'stated' }, pins, {
    classCode: 'ceramic-processors',
    massG: 3000,
  });
  const gains = measurements.map(({ middleGainMinor }) => middleGainMinor);
  expect(gains).toEqual(gains.toSorted((a, b) => b - a));
  expect(gains.length).toBeLessThanOrEqual(3);
  expect(new Set(measurements.map(({ question }) => question)).size).toBe(gains.length);
});

test('a lot without worth has no bids and nothing to measure', () => {
  const { bids, measurements } = advise({ classCode: 'low-grade-boards', massG: 100 });
  expect(bids.every(({ bidMinor, leaves }) => bidMinor === null && leaves === null)).toBe(true);
  expect(measurements.every(({ middleGainMinor }) => middleGainMinor === 0)).toBe(true);
  expect(advise().measurements).toEqual([]);
});

test('what to measure next names each question once, with all it answers', () => {
  const driver = { lineId: 'a', classCode: 'x', share: 0.3, nowG: [1, 5] as [number, number] };
  const drivers = [
    { ...driver, parameter: 'p.one', question: 'Assay', afterG: [2, 3] as [number, number] },
    { ...driver, parameter: 'p.two', question: 'Weigh', afterG: [1, 4.9] as [number, number] },
    { ...driver, parameter: 'p.three', question: 'Assay', afterG: [2, 3] as [number, number] },
    { ...driver, parameter: 'p.four', question: 'Count', afterG: [1, 4.99] as [number, number] },
  ];
  expect(measureNext(drivers)).toEqual([
    expect.objectContaining({ question: 'Assay', parameters: ['p.one', 'p.three'], share: 0.6, narrowerG: 3 }),
    expect.objectContaining({ question: 'Weigh', parameters: ['p.two'] }),
  ]);
});
