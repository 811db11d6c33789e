import { readFile } from 'node:fs/promises';
import type { Page } from '@playwright/test';
import { readPdf } from '../../../apps/api/test/read-pdf.ts';
import { photoFile } from '../lots.ts';
import { expect, type Member } from '../market.ts';

/** Presses a link that leads to a PDF and reads what came. */
async function download(page: Page, press: () => Promise<void>) {
  const [file] = await Promise.all([page.waitForEvent('download'), press()]);
  return readPdf(await readFile(await file.path()));
}

export async function dispatch({ page }: Member, { dealCode, lotCode }: { dealCode: string; lotCode: string }) {
  await page.goto(`/sell/deals/${dealCode}`);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Send the lot');
  const slip = await download(page, () => page.getByRole('link', { name: 'Packing slip' }).click());
  expect(slip.text).toContain(dealCode);
  expect(slip.text).toContain(lotCode);
  await page.getByRole('link', { name: 'Enter the dispatch' }).click();
  await page.getByLabel('Carrier').fill('Wendlesea Parcels');
  await page.getByLabel('Tracking code').fill('WP-4471-22');
  await page.getByRole('button', { name: 'Mark as dispatched' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('On its way to the buyer');
}

/** Records the receipt and what the scale showed: 40 g short of 3.3 kg, within the tolerance of twice the scale's step. */
export async function weighIn({ page }: Member, dealCode: string): Promise<void> {
  await page.goto(`/deals/${dealCode}`);
  await expect(page.getByText('WP-4471-22', { exact: true })).toBeVisible();
  await page.getByRole('button', { name: 'Record the receipt' }).click();
  await page.getByRole('link', { name: 'Enter the weigh-in' }).click();
  await page.getByLabel('Gross', { exact: true }).fill('3.56 kg');
  await page.getByLabel('Tare', { exact: true }).fill('300 g');
  await page.getByLabel('The scale reads to', { exact: true }).fill('20 g');
  await expect(page.getByText('40 g short, within the tolerance of 40 g.')).toBeVisible();
  await page.getByLabel('Choose photos').setInputFiles(photoFile('weigh-ticket'));
  await expect(page.getByText('Photo 1, sent')).toBeVisible({ timeout: 20_000 });
  await page.getByRole('button', { name: 'Enter the weigh-in' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Weighed in. Accept the delivery');
  await expect(page.getByRole('img', { name: 'Photo of the weigh-in' })).toBeVisible();
}

export async function accept({ page }: Member): Promise<void> {
  await page.getByRole('link', { name: 'Check and accept' }).click();
  await page.getByRole('button', { name: 'Accept the delivery' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Accepted. The seller countersigns next');
}

export async function countersign({ page }: Member, dealCode: string): Promise<void> {
  await page.goto(`/sell/deals/${dealCode}`);
  await page.getByRole('link', { name: 'Check and countersign' }).click();
  await page.getByRole('button', { name: 'Countersign' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(/^Settled, \$/);
}

/** The amounts of a statement's page by their labels, and the text of the same statement as PDF. */
export async function readStatement({ page }: Member, address: string) {
  await page.goto(address);
  await expect(page.getByRole('heading', { name: 'To the seller' })).toBeVisible();
  const rows = await page
    .getByRole('table')
    .locator('tr')
    .evaluateAll((found) =>
      found.map((row) => ({
        label: row.querySelector('th')?.firstChild?.textContent?.trim() ?? '',
        amount: row.querySelector('td')?.textContent?.trim() ?? '',
      })),
    );
  const pdf = await download(page, () => page.getByRole('link', { name: 'Statement as PDF' }).click());
  return { rows, record: (await page.getByText(/^Record /).textContent())!.replace('Record ', ''), pdf };
}
