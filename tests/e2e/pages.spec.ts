import { buyerPages, deskPages, marketPages, sellerPages, visitorPages } from '../support/every-page.ts';
import { lookOver } from '../support/look-over.ts';
import { expect, test } from '../support/market.ts';

test.setTimeout(240_000);

test('pages of a visitor are sound', async ({ market }) => {
  const { page, call } = await market.visitor();
  for (const address of [...(await marketPages(call)), ...visitorPages]) await lookOver(page, address);
});

test('pages of a buyer are sound', async ({ market }) => {
  const { page, call } = await market.demo('buyer');
  const pages = await buyerPages(call);
  expect(pages.filter((address) => address.includes('/deals/')).length).toBeGreaterThan(4);
  for (const address of pages) await lookOver(page, address);
});

test('pages of a seller are sound', async ({ market }) => {
  const { page, call } = await market.demo('seller');
  const pages = await sellerPages(call);
  expect(pages).toContainEqual(expect.stringMatching(/\/contents$/));
  expect(pages.filter((address) => address.includes('/deals/')).length).toBeGreaterThan(4);
  for (const address of pages) await lookOver(page, address);
});

test('pages of the desk are sound', async ({ market }) => {
  const operator = await market.demo('operator');
  for (const address of await deskPages(operator.call)) await lookOver(operator.page, address);
  const assayer = await market.demo('assayer');
  await lookOver(assayer.page, '/desk');
});

test('pages of a new member, with nothing in them yet, are sound', async ({ market }) => {
  const { page } = await market.member({ roles: ['seller', 'buyer'] });
  for (const address of ['/bids', '/deals', '/notices', '/sell/lots', '/sell/deals', '/sell/payouts'])
    await lookOver(page, address);
});
