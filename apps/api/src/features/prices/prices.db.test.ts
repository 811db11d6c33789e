import { afterAll, beforeAll, expect, test } from 'vitest';
import { openMarket, type Market } from '../../../test/market.ts';
import { takePrices } from './take-prices.ts';

let market: Market;
beforeAll(async () => {
  market = await openMarket({
    env: {
      DEMO_MAIL_URL: 'http://localhost:4405',
      DEMO_SIGN_INS: '[{"role":"buyer","email":"a@b.example","password":"x"}]',
    },
  });
});
afterAll(() => market.close());

const hoursAgo = (hours: number): Date => new Date(Date.now() - hours * 3_600_000);
const quote = (at: Date, perGramMinor: string) => ({ at, perGramMinor, currency: 'USD', source: 'Test series' });

test('the market tells its currency, zone and fees, and no price before the first', async () => {
  const { body } = await market.visitor().call('GET /market');
  expect(body).toMatchObject({
    currency: 'USD',
    zone: 'Europe/Vienna',
    buyerFeeBp: 200,
    sellerFeeBp: 400,
    price: null,
    demo: { mailUrl: 'http://localhost:4405', signIns: [{ role: 'buyer', email: 'a@b.example' }] },
  });
  expect(JSON.stringify(body)).not.toContain('password');
});

test('taking prices twice keeps each once; the newest that is set is in force, and old ones are flagged', async () => {
  market.quotes.push(quote(hoursAgo(24 * 8), '13000.1234'), quote(hoursAgo(24 * 7), '13111.0000'));
  await takePrices(market.world);
  await takePrices(market.world);
  expect(await market.db.query('select count(*)::int as n from reference_prices')).toEqual([{ n: 2 }]);
  const old = await market.visitor().call('GET /market');
  expect(old.body.price).toMatchObject({ perGramMinor: 13111, source: 'Test series', stale: true });

  market.quotes.push(quote(hoursAgo(1), '13155.5000'));
  await takePrices(market.world);
  const { body } = await market.visitor().call('GET /market');
  expect(body.price).toMatchObject({ perGramMinor: 13155.5, stale: false });
});

test('prices in another currency are refused whole', async () => {
  market.quotes.push({ ...quote(hoursAgo(0.5), '1.0000'), currency: 'EUR' });
  await expect(takePrices(market.world)).rejects.toThrow('EUR');
  expect(await market.db.query(`select 1 from reference_prices where currency = 'EUR'`)).toEqual([]);
});

test('the catalogue in force is the one a frozen estimate names; others are not found', async () => {
  const visitor = market.visitor();
  const inForce = await visitor.call('GET /catalogue');
  expect(inForce.body.version).toBe('2026.1');
  expect(inForce.body.classes.length).toBeGreaterThan(20);
  expect(inForce.body.classes[0]).toMatchObject({ code: 'edge-contacts', components: expect.any(Array) });
  expect((await visitor.call('GET /catalogue/:version', { params: { version: '2026.1' } })).body).toEqual(inForce.body);
  const none = await visitor.call('GET /catalogue/:version', { params: { version: '1999.1' } });
  expect([none.status, none.problem.code]).toEqual([404, 'catalogue.not_found']);
});
