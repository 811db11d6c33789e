import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { latestPrice, referencePrices, type ReferencePrice } from './series.ts';
import { startPrices } from './server.ts';
import type { Running } from '../listen.ts';

const span = (from: string, to: string) => referencePrices(new Date(from), new Date(to));

describe('the series', () => {
  test('has two prices on a weekday, at 10:30 and 15:00 in London, in winter and in summer', () => {
    const winter = span('2026-01-14T00:00:00Z', '2026-01-14T23:59:59Z');
    expect(winter.map(({ at }) => at)).toEqual(['2026-01-14T10:30:00.000Z', '2026-01-14T15:00:00.000Z']);
    const summer = span('2026-07-15T00:00:00Z', '2026-07-15T23:59:59Z');
    expect(summer.map(({ at }) => at)).toEqual(['2026-07-15T09:30:00.000Z', '2026-07-15T14:00:00.000Z']);
  });

  test('has none at the weekend; then the one of Friday afternoon is the latest', () => {
    expect(span('2026-07-18T00:00:00Z', '2026-07-19T23:59:59Z')).toEqual([]);
    expect(latestPrice(new Date('2026-07-20T08:00:00Z')).at).toBe('2026-07-17T14:00:00.000Z');
  });

  test('stays between 128 and 134 dollars a gram over years, moves, and is the same every time', () => {
    const years = span('2024-01-01T00:00:00Z', '2028-01-01T00:00:00Z');
    const prices = years.map(({ perGram }) => perGram);
    expect(Math.min(...prices)).toBeGreaterThanOrEqual(128);
    expect(Math.max(...prices)).toBeLessThanOrEqual(134);
    expect(Math.max(...prices) - Math.min(...prices)).toBeGreaterThan(3);
    expect(prices.every((price) => Number.isInteger(Math.round(price * 1e6) / 1e4))).toBe(true);
    expect(span('2024-01-01T00:00:00Z', '2028-01-01T00:00:00Z')).toEqual(years);
    const jumps = prices.slice(1).map((price, index) => Math.abs(price - prices[index]!));
    expect(Math.max(...jumps)).toBeLessThan(1.5);
  });
});

describe('the service', () => {
  let prices: Running;
  beforeAll(async () => void (prices = await startPrices({ port: 0, now: () => new Date('2026-07-15T12:00:00Z') })));
  afterAll(() => prices.close());
  const get = async (path: string) => {
    const answer = await fetch(`http://127.0.0.1:${prices.port}${path}`);
    return { status: answer.status, body: (await answer.json()) as { prices: ReferencePrice[] } & ReferencePrice };
  };

  test('tells the year up to now, and nothing of the future', async () => {
    const { body } = await get('/v1/gold');
    expect(body.prices.length).toBeGreaterThan(500);
    expect(body.prices.at(-1)).toEqual({
      at: '2026-07-15T09:30:00.000Z',
      perGram: expect.any(Number),
      currency: 'USD',
      source: 'Demo series',
    });
    expect((await get('/v1/gold?from=2026-07-15&to=2026-12-31')).body.prices).toHaveLength(1);
    expect((await get('/v1/gold?from=2026-07-15T10:00:00Z')).body.prices).toEqual([]);
    expect((await get('/v1/gold?from=1999-01-01&to=2025-08-01')).body.prices[0]?.at).toMatch(/^2025-07-1/);
    expect((await get('/v1/gold/latest')).body).toEqual(body.prices.at(-1));
  });

  test('refuses what is not a time', async () => {
    expect((await get('/v1/gold?from=yesterday')).status).toBe(400);
    expect((await get('/v2')).status).toBe(404);
  });
});
