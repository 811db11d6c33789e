import fc from 'fast-check';
import { expect, test } from 'vitest';
import { catalogue20261 } from '../catalogue/catalogue-2026-1.ts';
import { estimateLot } from '../lot/estimate-lot.ts';
import { line } from '../lot/line.fixture.ts';
import { firmOffer, type OfferedLot, type OfferMarket, type StandingOffer } from './firm-offer.ts';

const lines = [line({ classCode: 'phone-boards', massG: 5000 })];
const lot: OfferedLot = { lines, estimate: estimateLot({ lines }, catalogue20261, { seed: 1 }), freightMinor: 1500 };
const market: OfferMarket = { pricePerGMinor: 10_300, priceIsStale: false, buyerFeeShare: 0.02 };
const offer: StandingOffer = {
  classCode: 'phone-boards',
  rate: { kind: 'per-kg', perKgMinor: 1200 },
  leastMassG: 1000,
  mostMassG: 5000,
  identityAtLeast: 'photographed',
  massAtLeast: 'weighed',
  dayBudgetMinor: 50_000,
  budgetMinor: 200_000,
};
const share: StandingOffer['rate'] = { kind: 'share', shareBp: 5000 };
const plenty = { dayBudgetMinor: 99_999_999, budgetMinor: 99_999_999 };

test('per kilogram: five kilograms at 12.00, with fee and freight', () => {
  expect(firmOffer(offer, lot, market)).toEqual({ fits: true, priceMinor: 6000, feeMinor: 120, totalMinor: 7620 });
});

test('by share: half of what the lower quarter holds, rounded down', () => {
  const { p25 } = lot.estimate.goldG.quantiles;
  expect(firmOffer({ ...offer, ...plenty, rate: share }, lot, market)).toMatchObject({
    priceMinor: Math.floor(p25 * 0.5 * 10_300),
  });
});

test.each([
  ['other-class', { classCode: 'pins-full' }, {}, {}],
  ['mass-too-small', { leastMassG: 5001, mostMassG: 9000 }, {}, {}],
  ['mass-too-large', { mostMassG: 4999 }, {}, {}],
  ['identity-not-shown', {}, { lines: [{ ...lines[0]!, identityEvidence: 'stated' }] }, {}],
  ['mass-not-weighed', {}, { lines: [{ ...lines[0]!, massEvidence: 'stated' }] }, {}],
  ['mass-not-weighed', {}, { lines: [{ ...lines[0]!, massG: null }] }, {}],
  ['stale-price', { rate: share, ...plenty }, {}, { priceIsStale: true }],
  ['worth-nothing', { rate: { kind: 'per-kg', perKgMinor: 0 } }, {}, {}],
  ['over-day-budget', { dayBudgetMinor: 7619 }, {}, {}],
  ['over-budget', { budgetMinor: 7619 }, {}, {}],
  ['no-lines', {}, { lines: [] }, {}],
] as [string, Partial<StandingOffer>, Partial<OfferedLot>, Partial<OfferMarket>][])(
  'no offer: %s',
  (reason, ofOffer, ofLot, ofMarket) => {
    expect(firmOffer({ ...offer, ...ofOffer }, { ...lot, ...ofLot }, { ...market, ...ofMarket })).toEqual({
      fits: false,
      reasons: [reason],
    });
  },
);

test('a stale price does not matter per kilogram, a budget used to the last cent does not either', () => {
  expect(firmOffer(offer, lot, { ...market, priceIsStale: true }).fits).toBe(true);
  expect(firmOffer({ ...offer, dayBudgetMinor: 7620, budgetMinor: 7620 }, lot, market).fits).toBe(true);
});

test('no offer ever costs more than the budget has left', () => {
  const money = fc.integer({ min: 0, max: 100_000 });
  fc.assert(
    fc.property(money, money, fc.integer({ min: 0, max: 5000 }), (dayBudgetMinor, budgetMinor, perKgMinor) => {
      const made = firmOffer(
        { ...offer, dayBudgetMinor, budgetMinor, rate: { kind: 'per-kg', perKgMinor } },
        lot,
        market,
      );
      if (made.fits) expect(made.totalMinor).toBeLessThanOrEqual(Math.min(dayBudgetMinor, budgetMinor));
    }),
  );
});

test('figures out of range are refused by name', () => {
  expect(() => firmOffer({ ...offer, mostMassG: 1 }, lot, market)).toThrow('mostMassG');
  expect(() => firmOffer({ ...offer, rate: { kind: 'share', shareBp: 20_000 } }, lot, market)).toThrow('rate.shareBp');
  expect(() => firmOffer(offer, { ...lot, freightMinor: -1 }, market)).toThrow('freightMinor');
});
