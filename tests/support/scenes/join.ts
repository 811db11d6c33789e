import type { Page } from '@playwright/test';
import { freshEmail, testPassword } from '../enrol.ts';
import { linkOf, mailTo } from '../mails.ts';
import { expect, type Member, type Visitor } from '../market.ts';

/** Signs in on the page, as somebody who was sent there or went by themselves. */
export async function signIn(page: Page, { email, password }: { email: string; password: string }): Promise<void> {
  await page.getByLabel('E-mail', { exact: true }).fill(email);
  await page.getByRole('main').getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

export async function signOut(page: Page): Promise<void> {
  await page.locator('summary').first().click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Sign in');
}

/** Registers by hand, follows the link of the mail, and signs in. */
export async function join(
  { page, ...visitor }: Visitor,
  { name, place, app }: { name: string; place: string; app: '' | '/sell' },
): Promise<Member> {
  const email = freshEmail(app === '' ? 'buyer' : 'seller');
  await page.goto(`${app}/register`);
  await page.getByLabel('Firm, or your own name').fill(name);
  await page.getByLabel('Town').fill(place);
  await page.getByLabel('E-mail', { exact: true }).fill(email);
  await page.getByRole('main').getByLabel('Password', { exact: true }).fill(testPassword);
  await page.getByRole('button', { name: 'Register' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Confirm your address');

  await page.goto(linkOf(await mailTo(email, 'Confirm your e-mail address')));
  await page.getByRole('button', { name: 'Confirm' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Your address is confirmed');
  await page.getByRole('main').getByRole('link', { name: 'Sign in' }).click();
  await signIn(page, { email, password: testPassword });
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(app === '' ? 'Lots open for bids' : 'My lots');
  return { page, ...visitor, email, password: testPassword, name };
}

/** An operator records at the desk which papers of a member were seen. */
export async function recordPapers(operator: Member, { email, name }: Member): Promise<void> {
  const { page } = operator;
  await page.goto('/desk/members');
  await page.getByRole('searchbox').fill(email);
  await page.getByRole('button', { name: 'Search' }).click();
  await page
    .getByRole('row')
    .filter({ hasText: email })
    .getByRole('link', { name: `Enter papers of ${name}` })
    .click();
  await page
    .getByLabel('Papers you have seen')
    .fill('Trade register extract and waste carrier licence, both of this year');
  await page.getByRole('button', { name: 'Enter the papers' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Members');
}

/** The seller names a bank on the processor's own page. */
export async function setUpPayouts({ page, name }: Member): Promise<void> {
  await page.goto('/sell/payouts');
  await page.getByRole('button', { name: 'Set up payouts' }).click();
  await expect(page.getByText('The market never sees these details.')).toBeVisible();
  await page.getByLabel('Name of the person or firm that is paid').fill(name);
  await page.getByRole('button', { name: 'Finish' }).click();
  await expect(page.getByRole('listitem').filter({ hasText: 'Account with the payment processor' })).toContainText(
    'Ready',
    { timeout: 30_000 },
  );
}
