import { catalogue20261 } from '@lydite/valuation';
import { describe, expect, it } from 'vitest';
import { market, openLot, terms } from '../../../test/market.ts';
import { toBuyerTerms } from './buyer-terms.ts';
import { drawAgain, lotWorth, type LotWorth } from './lot-worth.ts';
import { rowMarks } from './row-marks.ts';

const lot = openLot();
const draws = drawAgain(lot, catalogue20261);
const charges = { buyerFeeBp: market.buyerFeeBp, freightMinor: lot.delivery.freightMinor };
const worthWith = (changes: Partial<typeof terms> = {}): LotWorth | null =>
  lotWorth({
    draws,
    beadsG: lot.estimate.beadsG,
    massG: lot.massG,
    terms: toBuyerTerms({ ...terms, ...changes }, charges),
    pricePerGMinor: lot.price.perGramMinor,
    currency: 'USD',
  });
const worth = worthWith()!;

describe('a lot drawn again', () => {
  it('gives the frozen estimate’s own numbers', () => {
    const middle = draws.goldG.toSorted();
    const p50 = (middle[4999]! + middle[5000]!) / 2;
    expect(p50).toBeCloseTo(lot.estimate.goldG.quantiles.p50, 9);
  });

  it('refuses a line without a kind', () => {
    const lines = [{ ...lot.lines[0]!, classCode: null }];
    expect(() => drawAgain({ ...lot, lines }, catalogue20261)).toThrow(RangeError);
  });
});

describe('what a bid means', () => {
  it('breaks even where the money axis says', () => {
    const { bid } = worth.read(300_000);
    expect(worth.money.atZeroMinor + worth.money.perGMinor * bid.breakEvenG).toBeCloseTo(300_000, 3);
  });

  it('leaves more the less is paid, and less ahead the more', () => {
    const [low, high] = [worth.read(200_000), worth.read(500_000)];
    expect(low.middleMinor).toBeGreaterThan(high.middleMinor);
    expect(low.ahead).toBeGreaterThan(high.ahead);
    expect(low.worseMinor).toBeLessThan(low.middleMinor);
    expect(low.betterMinor).toBeGreaterThan(low.middleMinor);
  });

  it('costs the fee on top of each dollar of the bid', () => {
    const [one, other] = [worth.read(200_000), worth.read(300_000)];
    expect(one.middleMinor - other.middleMinor).toBe(102_000);
  });

  it('comes out ahead at the highest safe bid as often as was wanted', () => {
    const { ahead, of } = worth.read(worth.safeBidMinor!);
    expect(ahead / of).toBeGreaterThanOrEqual(terms.wantedChance - 0.5 / of);
  });

  it('allows less to who wants to be surer, and when winning is allowed for', () => {
    expect(worthWith({ wantedChance: 0.95 })!.safeBidMinor).toBeLessThan(worth.safeBidMinor!);
    expect(worthWith({ curseOn: false })!.safeBidMinor).toBeGreaterThan(worth.safeBidMinor!);
  });

  it('adds up the costs that come with the lot', () => {
    // 86.4 kg at 2.50, the batch and the freight.
    expect(worth.costsMinor).toBe(21_600 + 12_000 + 6_000);
  });

  it('is nothing where the process brings nothing out', () => {
    expect(worthWith({ recoveryYield: 0 })).toBeNull();
  });
});

describe('marks of a row', () => {
  const marks = rowMarks({ terms, buyerFeeBp: 200, pricePerGMinor: lot.price.perGramMinor });
  const row = { estimate: { ...lot.estimate, goldG: lot.estimate.goldG.quantiles }, priceMinor: 240_000 };

  it('shows the own and the leading bid where the buyer was outbid', () => {
    const { breakEvenG, leadBreakEvenG } = marks({ ...row, you: { standing: 'outbid', ceilingMinor: 200_000 } });
    expect(leadBreakEvenG).toBeGreaterThan(breakEvenG!);
    // The row leaves the freight out, which is 60 of thousands.
    expect(breakEvenG).toBeCloseTo(worth.breakEvenG(200_000) - 6000 / worth.money.perGMinor / 1.02, 0);
  });

  it('shows no other bid where the buyer leads, and nothing where there is no bid', () => {
    expect(marks({ ...row, you: { standing: 'highest', ceilingMinor: 250_000 } }).leadBreakEvenG).toBeNull();
    expect(marks({ ...row, you: null })).toEqual({ breakEvenG: null, leadBreakEvenG: null });
    expect(rowMarks(null)({ ...row, you: { standing: 'highest', ceilingMinor: 1 } }).breakEvenG).toBeNull();
  });
});
