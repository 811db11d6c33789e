import type { Page } from '@playwright/test';
import { phonePhoto } from '../../../apps/api/test/photo-files.ts';
import { photoFile } from '../lots.ts';
import { expect, type Member } from '../market.ts';

/** Goes on to the next of the five pages; the words are those of its button. */
export async function goOnTo(page: Page, what: string): Promise<void> {
  await page
    .getByRole('link', { name: `Continue to ${what}` })
    .filter({ visible: true })
    .click();
}

export const savedLine = (page: Page) =>
  page.getByText(/^Saved \d\d:\d\d [A-Z]{3,4}, here and on this device/).filter({ visible: true });

export const chooseInto = (page: Page, shot: string) => page.getByLabel(`Choose photos: ${shot}`);

/** So many photos lie at the market: only then a photo can be removed from there. */
export const expectSent = (page: Page, count: number) =>
  expect(page.getByRole('button', { name: /^Remove photo/ })).toHaveCount(count, { timeout: 20_000 });

/** Two photos: one of a camera that wrote its place into it, and one of the lot. */
async function photograph(page: Page): Promise<void> {
  await chooseInto(page, 'The whole lot, from above').setInputFiles(photoFile('memory-rows'));
  await expectSent(page, 1);
  const buffer = await phonePhoto();
  await chooseInto(page, 'One piece, contacts filling the frame').setInputFiles({
    name: 'piece.jpg',
    mimeType: 'image/jpeg',
    buffer,
  });
  await expectSent(page, 2);
  await page
    .getByRole('textbox', { name: /^What it shows/ })
    .first()
    .fill('160 modules in rows, ruler of 30 cm');
}

/** One line of memory modules, counted and weighed. */
async function describe(page: Page, title: string): Promise<void> {
  await page.getByLabel('Title').fill(title);
  await page.getByRole('button', { name: 'Add the first line' }).click();
  await page.getByLabel('Kind', { exact: true }).selectOption('memory-modules');
  await page.getByLabel('Pieces', { exact: true }).fill('160');
  await page.getByLabel('Mass, net', { exact: true }).fill('3.3 kg');
  await page.getByRole('radio', { name: /^Counted/ }).check();
  await page.getByRole('radio', { name: /^Weighed/ }).check();
}

async function price(page: Page, asking: string): Promise<void> {
  await page.getByRole('radio', { name: /^Asking price/ }).check();
  await page.getByRole('textbox', { name: 'Asking price' }).fill(asking);
  await page.getByRole('textbox', { name: 'Where the lot is' }).fill('Harrowmere');
  await page.getByRole('textbox', { name: 'Freight' }).fill('18');
}

async function declare(page: Page): Promise<void> {
  await page.getByRole('radio', { name: /^All removed/ }).check();
  await page.getByRole('radio', { name: /^None in the lot/ }).check();
  await page.getByLabel('Country the lot is in').selectOption('AT');
  await page.getByLabel(/^I have the right to sell this lot/).check();
}

interface Offered {
  title: string;
  /** As typed: "320". */
  asking: string;
}

/** A new lot through its five pages, listed at an asking price; a reload in the middle loses nothing. Returns its code. */
export async function sellAtAskingPrice({ page }: Member, { title, asking }: Offered): Promise<string> {
  const head = page.getByRole('heading', { level: 1 });
  await page.goto('/sell/');
  await page.getByRole('button', { name: 'New lot' }).click();
  await expect(head).toHaveText('Photograph the lot');
  const lotCode = /L-\d+/.exec(page.url())![0];
  await photograph(page);

  await goOnTo(page, 'contents');
  await expect(head).toHaveText('What is in the lot?');
  await describe(page, title);
  const view = page
    .getByText(/Eight results in ten lie between|8 results in 10/)
    .filter({ visible: true })
    .first();
  await expect(view).toBeVisible();
  await page.getByLabel('Title').focus();
  await expect(savedLine(page)).toBeVisible();
  await page.reload();
  await expect(page.getByLabel('Title')).toHaveValue(title);
  await expect(page.getByRole('heading', { level: 2 }).first()).toBeVisible();
  await expect(view).toBeVisible();

  await goOnTo(page, 'weight');
  await expect(head).toHaveText('What does it weigh?');
  await expect(page.getByRole('checkbox', { name: /^Weighed/ })).toBeChecked();
  await goOnTo(page, 'price and delivery');
  await expect(head).toHaveText('Price and delivery');
  await price(page, asking);

  await goOnTo(page, 'check and list');
  await expect(head).toHaveText('Check and list');
  await declare(page);
  await expect(page.getByRole('heading', { name: 'Nothing is missing' })).toBeVisible();
  await expect(page.getByText('The estimate is frozen at this moment')).toBeVisible();
  await page.getByRole('button', { name: 'List it' }).click();
  await expect(head).toHaveText(title);
  await expect(page).toHaveURL(new RegExp(`/sell/lots/${lotCode}$`));
  return lotCode;
}
