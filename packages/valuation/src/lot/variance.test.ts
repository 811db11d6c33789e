import { expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import { quantileOf } from '../quantity/quantile.ts';
import { drawPlan } from './draw-plan.ts';
import { line } from './line.fixture.ts';
import { planLot } from './plan-lot.ts';
import { meanAndVariance } from './quantiles.ts';
import { varianceShares } from './variance.ts';

const mixed = planLot(
  {
    lines: [
      line({ id: 'a', massG: 50_000, massEvidence: 'stated', identityEvidence: 'stated' }),
      line({ id: 'b', massG: 20_000, pieces: 900, countEvidence: 'counted' }),
      line({ id: 'c', classCode: 'package-tops', massG: 2000, identityEvidence: 'photographed' }),
    ],
  },
  catalogue20261,
);

test('one figure alone has all the variance', () => {
  const given = line({ classCode: 'phone-boards' });
  const plan = planLot({ lines: [given] }, catalogue20261);
  for (const { gold } of plan.lines) for (const term of gold) term.factors.pop();
  const [only, ...others] = varianceShares(plan);
  expect(only?.factor.parameter).toBe('grade.gradeGPerT');
  expect(only?.share).toBeCloseTo(1, 12);
  expect(others).toEqual([]);
});

test('shares fall from the first on, are positive, and leave the rest to interaction', () => {
  const shares = varianceShares(mixed).map(({ share }) => share);
  expect(shares).toEqual(shares.toSorted((a, b) => b - a));
  const sum = shares.reduce((total, share) => total + share, 0);
  expect(sum).toBeGreaterThan(0.85);
  expect(sum).toBeLessThanOrEqual(1);
  expect(Math.min(...shares)).toBeGreaterThan(0);
});

test('the largest share is what fixing the figure takes from the variance of the draws', () => {
  const [largest] = varianceShares(mixed);
  const variances = (plan: typeof mixed) => meanAndVariance(drawPlan(plan, { seed: 3, draws: 100_003 }).goldG).variance;
  // Law of total variance: share = 1 − E[Var(gold | figure)] / Var(gold), averaged over values of the figure.
  const { quantity, key } = largest!.factor;
  expect(quantity.kind).toBe('lognormal');
  const values = [0.5, 1.5, 2.5, 3.5, 4.5, 5.5, 6.5, 7.5, 8.5, 9.5].map((i) => (i * 2) / 20);
  const within = values.map((probability) => variances(fixedAt(key, probability)));
  const remaining = within.reduce((sum, variance) => sum + variance, 0) / within.length;
  expect(1 - remaining / variances(mixed)).toBeCloseTo(largest!.share, 1);
});

function fixedAt(key: string, probability: number): typeof mixed {
  const lines = mixed.lines.map((plan) => ({
    ...plan,
    gold: plan.gold.map((term) => ({
      ...term,
      constant: term.factors.reduce(
        (product, each) =>
          each.key === key ? product * quantileOf(each.quantity, probability) ** each.power : product,
        term.constant,
      ),
      factors: term.factors.filter((each) => each.key !== key),
    })),
  }));
  return { ...mixed, lines };
}
