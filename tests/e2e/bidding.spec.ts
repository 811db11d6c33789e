import type { LotView } from '@lydite/contracts';
import type { Page } from '@playwright/test';
import { letLotClose } from '../support/database.ts';
import { listLot } from '../support/lots.ts';
import { linkOf, mailTo } from '../support/mails.ts';
import { expect, test, type Member } from '../support/market.ts';

/** What the page says of a bid in five places: they must never differ. */
async function readBid(page: Page) {
  const slider = page.getByRole('slider', { name: 'Your bid' });
  const text = async (selector: string) =>
    ((await page.locator(selector).first().textContent()) ?? '').replaceAll(/[\s\u00a0]+/g, ' ');
  const [sentence, bench] = [await text('.say'), await text('.bench')];
  return {
    amount: Number(await slider.getAttribute('aria-valuenow')),
    ahead: Number(/^(\d+) of 50/.exec(sentence)?.[1]),
    spoken: Number(/ahead in (\d+) of 50/.exec((await slider.getAttribute('aria-valuetext')) ?? '')?.[1]),
    bench: Number(/You come out ahead in ?(\d+) of 50/.exec(bench)?.[1]),
    filled: await page.locator('.streak-beads circle:not([fill="none"])').count(),
    breakEven: /more than the ([\d.,]+ \w+)/.exec(sentence)?.[1],
  };
}

async function expectAgreement(page: Page) {
  const read = await readBid(page);
  expect(read.filled).toBe(read.ahead);
  expect(read.spoken).toBe(read.ahead);
  expect(read.bench).toBe(read.ahead);
  return read;
}

const most = (page: Page) => page.getByLabel('Most you would pay', { exact: true });

/** Weighs an amount, checks it on its own page and makes it binding, by pointer. */
async function bid({ page }: Member, lotCode: string, amount: string) {
  await page.goto(`/lots/${lotCode}`);
  await most(page).fill(amount);
  await page.getByRole('button', { name: 'Check this bid' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Check this bid');
  await page.getByLabel('I know the rules of this lot').check();
  await page.getByRole('button', { name: 'Make it binding' }).click();
}

/** The same by keys alone: Tab until the control has the focus, then Space or Enter. */
async function tabTo(page: Page, wanted: ReturnType<Page['locator']>) {
  for (let presses = 0; presses < 80; presses += 1) {
    if (await wanted.evaluate((node) => node === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab never reached ${wanted.toString()}`);
}

async function bidByKeys({ page }: Member, lotCode: string, amount: string) {
  await page.goto(`/lots/${lotCode}`);
  await expect(most(page)).toBeVisible();
  await tabTo(page, most(page));
  await page.keyboard.press('ControlOrMeta+a');
  await page.keyboard.type(amount);
  await tabTo(page, page.getByRole('button', { name: 'Check this bid' }));
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Check this bid');
  await tabTo(page, page.getByLabel('I know the rules of this lot'));
  await page.keyboard.press('Space');
  await tabTo(page, page.getByRole('button', { name: 'Make it binding' }));
  await page.keyboard.press('Enter');
}

const outcome = (page: Page) => page.getByRole('heading', { level: 1 });

test('the notch moves by typing, buttons and keys, and every reading of it agrees', async ({ market }) => {
  const seller = await market.member({ roles: ['seller'] });
  const lotCode = await listLot(seller.call);
  const { page } = await market.member({ roles: ['buyer'] });
  await page.goto(`/lots/${lotCode}`);
  const slider = page.getByRole('slider', { name: 'Your bid' });
  await expect(slider).toBeVisible();
  const start = await expectAgreement(page);
  expect(start.amount).toBe(400);

  await most(page).fill('700');
  await expect(slider).toHaveAttribute('aria-valuenow', '700');
  const typed = await expectAgreement(page);
  expect(typed.breakEven).not.toBe(start.breakEven);

  await page.getByRole('button', { name: '10 more' }).click();
  await expect(most(page)).toHaveValue('710');
  expect((await expectAgreement(page)).amount).toBe(710);
  await page.getByRole('button', { name: '10 less' }).click();
  expect((await expectAgreement(page)).amount).toBe(700);

  await slider.press('ArrowRight');
  await expect(most(page)).toHaveValue('710');
  await slider.press('PageUp');
  await expect(most(page)).toHaveValue('810');
  const moved = await expectAgreement(page);
  expect(moved.ahead).toBeLessThanOrEqual(start.ahead);
  await slider.press('End');
  expect((await expectAgreement(page)).ahead).toBe(0);
  await slider.press('Home');
  expect(await expectAgreement(page)).toEqual(start);

  await page.getByRole('button', { name: 'Table', exact: true }).click();
  const table = page.getByRole('region', { name: 'Estimate as a table' });
  const results = await table
    .getByRole('row')
    .evaluateAll((rows) => rows.slice(1).map((row) => row.lastElementChild?.textContent ?? ''));
  expect(results).toHaveLength(7);
  const percentiles = [5, 10, 25, 50, 75, 90, 95];
  const belowShare = 100 - 2 * start.ahead;
  expect(results.filter((text) => text.startsWith('−'))).toHaveLength(
    percentiles.filter((percentile) => percentile < belowShare).length,
  );
  await expect(table.getByText(`You break even at ${start.breakEven}.`)).toBeVisible();

  await most(page).fill('725');
  await expect(page).toHaveURL(/most=725/);
  await page.reload();
  await expect(most(page)).toHaveValue('725');
});

test(
  'two buyers bid against each other; the close awards the lot at the second ceiling',
  { tag: '@wide' },
  async ({ market }) => {
    test.setTimeout(180_000);
    const seller = await market.member({ roles: ['seller'] });
    const lotCode = await listLot(seller.call);
    const first = await market.member({ roles: ['buyer'], name: 'Vennaby Bench' });
    const second = await market.member({ roles: ['buyer'], name: 'Sallowby Bench' });

    await bid(first, lotCode, '600');
    await expect(outcome(first.page)).toHaveText('Highest');
    await expect(first.page.locator('.say')).toContainText('Your bid leads at $400.');

    await bidByKeys(second, lotCode, '550');
    await expect(outcome(second.page)).toHaveText('Outbid');
    await expect(second.page.locator('.say')).toContainText('the highest bid is $555');
    await second.page.keyboard.press('Tab');
    await second.page.keyboard.press('Enter');
    await expect(most(second.page)).toHaveValue('560');

    await bidByKeys(second, lotCode, '900');
    await expect(outcome(second.page)).toHaveText('Highest');
    const mail = await mailTo(first.email, `Outbid on ${lotCode}`);
    expect(linkOf(mail)).toMatch(new RegExp(`/lots/${lotCode}$`));
    // The address in the mail may hold any digits; its words must tell no amount.
    expect(mail.text.replace(linkOf(mail), '')).not.toMatch(/\d/);

    await first.page.goto('/bids');
    await expect(first.page.getByRole('heading', { name: /^Outbid 1/ })).toBeVisible();

    // An own raise leaves the price where it is.
    await bid(second, lotCode, '1,000');
    await expect(second.page.locator('.say')).toContainText('Your bid leads at $605.');
    const { bids, priceMinor } = await first.call<LotView>(`GET /lots/${lotCode}`);
    expect(priceMinor).toBe(60_500);
    expect(JSON.stringify(bids)).not.toContain('100000');

    await letLotClose(lotCode);
    await first.page.goto(`/lots/${lotCode}`);
    await expect(first.page.getByText(/^Closed /).first()).toBeVisible();
    await mailTo(second.email, new RegExp(`${lotCode}.* is yours: pay`), { timeoutMs: 90_000 });
    await mailTo(seller.email, new RegExp(`${lotCode}.* is awarded at \\$605`));
    await second.page.goto(`/lots/${lotCode}`);
    await expect(second.page.getByText('You have this lot at $605.')).toBeVisible();
    await second.page.getByRole('link', { name: /^Open deal/ }).click();
    await expect(outcome(second.page)).toHaveText(/^Pay \$6\d\d.* into the hold/);
    await first.page.goto(`/lots/${lotCode}`);
    await expect(first.page.getByText('It went to another buyer')).toBeVisible();
    await expect(first.page.getByRole('link', { name: /^Open deal/ })).toHaveCount(0);
  },
);
