import sharp from 'sharp';
import type { LotView } from '@lydite/contracts';
import { mailsTo } from '../support/mails.ts';
import { expect, test, type Member } from '../support/market.ts';
import { findLot, payIntoHold, setTerms, takeLot } from '../support/scenes/buy.ts';
import { accept, countersign, dispatch, readStatement, weighIn } from '../support/scenes/deliver.ts';
import { join, recordPapers, setUpPayouts, signIn } from '../support/scenes/join.ts';
import { sellAtAskingPrice } from '../support/scenes/sell.ts';
import { addresses, demoSignIn } from '../support/stack.ts';

// Price 320.00, freight 18.00; the buyer's fee is 2 % of the price, the seller's 4 %.
const asking = '320';
const hold = '$344.40';
const toSeller = '$325.20';

test('a lot goes from its first photo to the money on the seller’s account', { tag: '@wide' }, async ({ market }) => {
  test.setTimeout(240_000);
  const title = `Memory modules, 160 pieces, ${Date.now() % 100_000}`;

  const seller = await join(await market.visitor(), { name: 'Harrowmere Sorting', place: 'Harrowmere', app: '/sell' });
  const buyer = await join(await market.visitor(), { name: 'Vennaby Melt', place: 'Vennaby', app: '' });
  await test.step('an operator records the papers of both', async () => {
    const { page, ...person } = await market.visitor();
    const { email, password } = demoSignIn('operator');
    await page.goto('/desk/');
    await signIn(page, { email, password });
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Deals');
    const operator = { page, ...person, email, password, name: 'operator' };
    await recordPapers(operator, seller);
    await recordPapers(operator, buyer);
  });
  await test.step('the seller sets up payouts', () => setUpPayouts(seller));
  const lotCode = await test.step('the seller lists a lot', () => sellAtAskingPrice(seller, { title, asking }));
  await test.step('nobody can read from a photo where it was taken', () => expectPlacesRemoved(buyer, lotCode));

  await test.step('the buyer finds it and sets terms', async () => {
    await findLot(buyer, { lotCode, title });
    await expect(buyer.page.getByText(/^\d+ of 50 equally likely results/)).toBeVisible();
    await setTerms(buyer, '92');
  });
  const dealCode = await test.step('the buyer takes it', () => takeLot(buyer, '$320'));
  await test.step('the buyer pays into the hold', () => payIntoHold(buyer, hold));
  await test.step('the seller dispatches', () => dispatch(seller, { dealCode, lotCode }));
  await test.step('the buyer weighs in and accepts', async () => {
    await weighIn(buyer, dealCode);
    await accept(buyer);
  });
  await test.step('the seller countersigns, and it settles', () => countersign(seller, dealCode));
  await expect(seller.page.getByRole('heading', { level: 1 })).toHaveText(/^Settled, \$325/);

  await test.step('statements agree on both sides and on paper', () => expectStatements(seller, buyer, dealCode));
  await test.step('the processor has sent the money on', () => expectPaidOut(seller));
  await test.step('each was told of what concerned them', () => expectMails({ seller, buyer, lotCode, dealCode }));
});

test('the same on phones, where the seller’s share waits for an account', { tag: '@phone' }, async ({ market }) => {
  test.setTimeout(180_000);
  const title = `Memory modules, 160 pieces, ${Date.now() % 100_000}`;
  const seller = await market.member({ roles: ['seller'] });
  const buyer = await market.member({ roles: ['buyer'] });
  const lotCode = await sellAtAskingPrice(seller, { title, asking });
  await findLot(buyer, { lotCode, title });
  const dealCode = await takeLot(buyer, '$320');
  await payIntoHold(buyer, hold);
  await dispatch(seller, { dealCode, lotCode });
  await weighIn(buyer, dealCode);
  await accept(buyer);
  await countersign(seller, dealCode);
  await expect(seller.page.getByText(/^Your share waits/)).toBeVisible();
  await seller.page.goto('/sell/payouts');
  await expect(seller.page.getByText(`${toSeller} of settled lots waits`)).toBeVisible();
});

async function expectPlacesRemoved({ call, context }: Member, lotCode: string) {
  const { photos } = await call<LotView>(`GET /lots/${lotCode}`);
  expect(photos).toHaveLength(2);
  for (const { id } of photos) {
    const answer = await context.request.get(`/api/photos/${id}/zoom`);
    expect(answer.headers()['content-type']).toBe('image/webp');
    const { exif, xmp, width, height } = await sharp(await answer.body()).metadata();
    expect({ exif, xmp }).toEqual({ exif: undefined, xmp: undefined });
    expect(Math.min(width, height)).toBeGreaterThan(400);
  }
}

async function expectStatements(seller: Member, buyer: Member, dealCode: string) {
  const own = await readStatement(seller, `/sell/deals/${dealCode}/statement`);
  const others = await readStatement(buyer, `/deals/${dealCode}/statement`);
  expect(own.rows).toEqual(others.rows);
  expect(own.record).toBe(others.record);
  expect(own.rows.map(({ amount }) => amount)).toContain(toSeller);
  for (const { pdf, rows, record } of [own, others]) {
    expect(pdf.text).toContain(record);
    for (const { label, amount } of rows) {
      expect(pdf.text).toContain(label);
      expect(pdf.text).toContain(amount);
    }
  }
}

async function expectPaidOut({ page, name }: Member) {
  const row = (table: string, text: string) =>
    page.getByRole('region', { name: table }).getByRole('row').filter({ hasText: name }).filter({ hasText: text });
  await expect(async () => {
    await page.goto(addresses.payments);
    await expect(row('Transfers', toSeller)).toContainText('sent', { timeout: 1_000 });
    await expect(row('Payouts to banks', toSeller)).toContainText('paid', { timeout: 1_000 });
  }).toPass({ timeout: 60_000 });
  await page.goto('/sell/payouts');
  await expect(page.getByRole('row').filter({ hasText: 'Paid to your bank' })).toContainText(toSeller, {
    timeout: 30_000,
  });
}

interface Told {
  seller: Member;
  buyer: Member;
  lotCode: string;
  dealCode: string;
}

async function expectMails({ seller, buyer, lotCode, dealCode }: Told) {
  const subjects = async ({ email }: Member) => (await mailsTo(email)).map(({ subject }) => subject).join('\n');
  await expect.poll(() => subjects(seller), { timeout: 30_000 }).toMatch(/is paid out to your bank/);
  const [toSellerMails, toBuyerMails] = await Promise.all([subjects(seller), subjects(buyer)]);
  for (const words of [
    'Confirm your e-mail address',
    `${lotCode}, .* is awarded at \\$320`,
    `${dealCode} is paid into hold: hand ${lotCode} over`,
    `${dealCode} is weighed in`,
    `${dealCode} is settled`,
    `\\${toSeller} is paid out to your bank`,
  ])
    expect(toSellerMails).toMatch(new RegExp(words));
  for (const words of [
    'Confirm your e-mail address',
    `${lotCode}, .* is yours: pay \\${hold} into hold`,
    `${dealCode}: your \\${hold} is held`,
    `${dealCode}: ${lotCode} is on its way`,
    `${dealCode} is settled`,
  ])
    expect(toBuyerMails).toMatch(new RegExp(words));
}
