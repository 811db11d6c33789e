import { lognormal, normal, quantileOf, triangular, uniform, type Quantity } from '@lydite/valuation';
import jstat from 'jstat';
import { quantileSorted, sampleStandardDeviation } from 'simple-statistics';
import { createQuantileFinder } from '../../../packages/valuation/src/lot/quantile-finder.ts';
import { meanAndVariance } from '../../../packages/valuation/src/lot/quantiles.ts';
import { varianceShares } from '../../../packages/valuation/src/lot/variance.ts';
import type { LinePlan } from '../../../packages/valuation/src/lot/lot-plan.types.ts';
import { momentOf } from '../../../packages/valuation/src/quantity/moment.ts';
import { normalProbability, normalQuantile } from '../../../packages/valuation/src/quantity/normal-distribution.ts';
import { drawSum, interval } from './draw-sum.ts';
import type { PublishedValue } from './published-value.ts';

const { jStat } = jstat;
const sdOf = (quantity: Quantity) => Math.sqrt(momentOf(quantity, 2) - momentOf(quantity, 1) ** 2);

const handbook = 'Abramowitz & Stegun, Handbook of Mathematical Functions, table 26.5 (from memory)';
const jcgm = 'JCGM 101:2008';
const million = 1_000_000;

/** Quantities are not negative, so a sum around 0 is drawn shifted; the half-width does not mind. */
const halfWidth = (quantities: Quantity[]) => {
  const [low, high] = interval(drawSum(quantities, 1, million));
  return (high - low) / 2;
};
const sdOfSum = (quantities: Quantity[]) => Math.sqrt(meanAndVariance(drawSum(quantities, 1, million)).variance);
/** Mean far enough above 0, standard deviation u. */
const rectangle = (u: number) => uniform(0, 2 * Math.sqrt(3) * u);
const bell = (u: number) => normal(100 * u, u);
const times = (count: number, quantity: Quantity) => Array.from({ length: count }, () => quantity);

const ownLognormal = 'closed form of the lognormal distribution, recomputed';
const library = (what: string, value: number, ours: () => number, digits = 1e-9): PublishedValue => ({
  what,
  published: `${value}`,
  unit: '',
  source: 'jStat 1.9.6',
  ours,
  within: Math.abs(value) * digits,
});
const logs = [Math.log(250), Math.log(2)] as const;
const sample = [3.1, 1.4, 4.9, 2.2, 8.8, 6.5, 7.7];

/** Var(E[xy | x]) / Var(xy) for two rectangles from 0 to 1. */
function shareOfOneFactor(): number {
  const factors = ['x', 'y'].map((key) => ({ key, parameter: key, quantity: uniform(0, 1), power: 1 }));
  const line = { gold: [{ id: 'xy', name: 'xy', constant: 1, factors }], mass: null } as unknown as LinePlan;
  return varianceShares({ lines: [line] })[0]?.share ?? Number.NaN;
}

export const statisticsValues: PublishedValue[] = [
  {
    what: 'four rectangles, u',
    published: '2.00',
    unit: '',
    source: `${jcgm}, 9.2.3`,
    ours: () => sdOfSum(times(4, rectangle(1))),
  },
  {
    what: 'four rectangles, 95 %',
    published: '3.88',
    unit: '',
    source: `${jcgm}, 9.2.3`,
    ours: () => halfWidth(times(4, rectangle(1))),
  },
  {
    what: 'four normals, u',
    published: '2.00',
    unit: '',
    source: `${jcgm}, 9.2.2 (from memory)`,
    ours: () => sdOfSum(times(4, bell(1))),
  },
  {
    what: 'four normals, 95 %',
    published: '3.92',
    unit: '',
    source: `${jcgm}, 9.2.2 (from memory)`,
    ours: () => halfWidth(times(4, bell(1))),
  },
  {
    what: 'one large rectangle and three, u',
    published: '10.1',
    unit: '',
    source: `${jcgm}, 9.2.4 (from memory)`,
    ours: () => sdOfSum([rectangle(10), ...times(3, rectangle(1))]),
  },
  {
    what: 'one large rectangle and three, 95 %',
    published: '17.0',
    unit: '',
    source: `${jcgm}, 9.2.4 (from memory)`,
    ours: () => halfWidth([rectangle(10), ...times(3, rectangle(1))]),
  },
  {
    what: 'end gauge, combined u',
    published: '32',
    unit: 'nm',
    source: 'JCGM 100:2008, H.1.4 (from memory): inputs 25, 9.7, 2.9 and 16.6 nm',
    ours: () => sdOfSum([25, 9.7, 2.9, 16.6].map(bell)),
  },
  {
    what: 'rectangle of half-width 1, u',
    published: '0.577',
    unit: '',
    source: 'JCGM 100:2008, 4.3.7: a/√3',
    ours: () => sdOf(uniform(0, 2)),
  },
  {
    what: 'triangle of half-width 1, u',
    published: '0.408',
    unit: '',
    source: 'JCGM 100:2008, 4.3.9: a/√6',
    ours: () => sdOf(triangular(0, 1, 2)),
  },
  {
    what: 'lognormal 250, gsd 2: mean',
    published: '317.884',
    unit: '',
    source: ownLognormal,
    ours: () => momentOf(lognormal(250, 2), 1),
  },
  {
    what: 'lognormal 250, gsd 2: sd',
    published: '249.657',
    unit: '',
    source: ownLognormal,
    ours: () => sdOf(lognormal(250, 2)),
  },
  {
    what: 'lognormal 250, gsd 2: 2.5 %',
    published: '64.26',
    unit: '',
    source: ownLognormal,
    ours: () => quantileOf(lognormal(250, 2), 0.025),
  },
  {
    what: 'lognormal 250, gsd 2: 97.5 %',
    published: '972.63',
    unit: '',
    source: ownLognormal,
    ours: () => quantileOf(lognormal(250, 2), 0.975),
  },
  ...(
    [
      [0.9, '1.28155'],
      [0.95, '1.64485'],
      [0.99, '2.32635'],
      [0.999, '3.09023'],
    ] as const
  ).map(([probability, published]): PublishedValue => ({
    what: `normal quantile ${probability}`,
    published,
    unit: '',
    source: handbook,
    ours: () => normalQuantile(probability),
  })),
  {
    what: 'normal probability of 1.96',
    published: '0.97500',
    unit: '',
    source: 'any table of the normal distribution',
    ours: () => normalProbability(1.96),
  },
  {
    what: 'repeatability limit over its sd',
    published: '2.8',
    unit: '',
    source: 'ISO 5725-6, r = 2.8 s (from memory)',
    ours: () => normalQuantile(0.975) * Math.SQRT2,
  },
  {
    what: 'share of one factor of two, 3/7',
    published: '0.428571',
    unit: '',
    source: 'Sobol’ 1993, recomputed for xy on the unit square',
    ours: shareOfOneFactor,
  },
  {
    what: 'type 7 quantile 0.9 of 3, 1, 4, 2',
    published: '3.7',
    unit: '',
    source: 'Hyndman & Fan 1996, definition 7',
    ours: () => createQuantileFinder(4)(Float64Array.of(3, 1, 4, 2), [0.9])[0] as number,
    within: 1e-12,
  },
  library('normal quantile 0.01', jStat.normal.inv(0.01, 0, 1), () => normalQuantile(0.01)),
  library('normal probability of −1.3', jStat.normal.cdf(-1.3, 0, 1), () => normalProbability(-1.3)),
  library('lognormal 250, gsd 2: 90 %', jStat.lognormal.inv(0.9, ...logs), () => quantileOf(lognormal(250, 2), 0.9)),
  library('lognormal 250, gsd 2: mean', jStat.lognormal.mean(...logs), () => momentOf(lognormal(250, 2), 1)),
  library('lognormal 250, gsd 2: sd', Math.sqrt(jStat.lognormal.variance(...logs)), () => sdOf(lognormal(250, 2))),
  library('triangle 0, 1, 4: 30 %', jStat.triangular.inv(0.3, 0, 4, 1), () => quantileOf(triangular(0, 1, 4), 0.3)),
  library('triangle 0, 1, 4: 95 %', jStat.triangular.inv(0.95, 0, 4, 1), () => quantileOf(triangular(0, 1, 4), 0.95)),
  library(
    'type 7 quantile 0.37 of seven',
    jStat.quantiles(sample, [0.37], 1, 1)[0] as number,
    () => createQuantileFinder(7)(Float64Array.from(sample), [0.37])[0] as number,
  ),
  {
    ...library(
      'median of seven',
      quantileSorted(
        [...sample].sort((a, b) => a - b),
        0.5,
      ),
      () => createQuantileFinder(7)(Float64Array.from(sample), [0.5])[0] as number,
    ),
    source: 'simple-statistics 7.12.1',
  },
  {
    ...library('sd of seven', sampleStandardDeviation(sample), () =>
      Math.sqrt(meanAndVariance(Float64Array.from(sample)).variance),
    ),
    source: 'simple-statistics 7.12.1',
  },
];
