import { expect, type Member } from '../market.ts';

/** Finds a lot by its words in the list and opens it. */
export async function findLot({ page }: Member, { lotCode, title }: { lotCode: string; title: string }): Promise<void> {
  await page.goto('/');
  await page.getByRole('searchbox', { name: 'Search lots' }).fill(lotCode);
  await expect(page.locator('tbody').getByRole('row')).toHaveCount(1);
  await page.getByRole('row').filter({ hasText: lotCode }).getByRole('link', { name: title }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(title);
}

/** Sets an own recovery yield from a lot's page and comes back to it; the reading follows. */
export async function setTerms({ page }: Member, recoveryYield: string): Promise<void> {
  const reading = page.locator('.bench');
  const before = await reading.textContent();
  await page.getByRole('link', { name: 'Change' }).click();
  await page.getByLabel('Recovery yield').fill(recoveryYield);
  await page.getByRole('button', { name: 'Keep these terms' }).click();
  await expect(page.getByText('Every lot is valued by these terms from now on.')).toBeVisible();
  await page.getByRole('link', { name: /^Back to lot/ }).click();
  await expect(reading).toBeVisible();
  expect(await reading.textContent()).not.toBe(before);
}

/** Takes a lot at its asking price, after the page that says what it costs. Returns the deal's code. */
export async function takeLot({ page }: Member, price: string): Promise<string> {
  await page.getByRole('link', { name: `Take it at ${price}` }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Check before you take it');
  const button = page.getByRole('button', { name: `Take it at ${price}` });
  await button.click();
  await expect(page.getByText('Tick that you know the rules of this lot')).toBeVisible();
  await page.getByLabel('I know the rules of this lot').check();
  await button.click();
  await expect(page).toHaveURL(/\/deals\/D-\d+$/);
  return /D-\d+$/.exec(page.url())![0];
}

/** Pays on the processor's page: with a card that is declined, then with one whose bank asks the payer. */
export async function payIntoHold({ page }: Member, hold: string): Promise<void> {
  await page.getByRole('link', { name: 'Check and pay' }).click();
  await page.getByRole('button', { name: `Pay ${hold} into the hold` }).click();
  const pay = page.getByRole('button', { name: `Pay ${hold}`, exact: true });
  await page.getByRole('radio', { name: /^Card declined/ }).check();
  await pay.click();
  await expect(page.getByRole('alert')).toContainText('Your card was declined.');
  await page.getByRole('radio', { name: /^The bank asks the payer to approve/ }).check();
  await pay.click();
  await page.getByRole('button', { name: 'Approve' }).click();
  await expect(page).toHaveURL(/\/deals\/D-\d+\?.*paid=1/);
  await expect(page.getByText(`${hold} is in the hold.`)).toBeVisible({ timeout: 30_000 });
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Paid. The seller sends the lot next');
}
