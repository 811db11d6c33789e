import { testPassword } from '../support/enrol.ts';
import { linkOf, mailTo } from '../support/mails.ts';
import { expect, test } from '../support/market.ts';
import { signIn, signOut } from '../support/scenes/join.ts';
import { listLot } from '../support/lots.ts';

test('a visitor reads lots, and signing in leads back to where the way was barred', async ({ market }) => {
  const seller = await market.member({ roles: ['seller'] });
  const lotCode = await listLot(seller.call);
  const { email } = await market.member({ roles: ['buyer'] });
  const { page } = await market.visitor();
  await page.goto('/');
  await page.getByRole('searchbox', { name: 'Search lots' }).fill(lotCode);
  await expect(page.locator('tbody').getByRole('row')).toHaveCount(1);
  await page.getByRole('row').filter({ hasText: lotCode }).getByRole('link').click();
  await expect(page.getByRole('main').locator('.say').first()).toHaveText(/^Eight results in ten lie between/);
  await expect(page.getByLabel('Most you would pay')).toHaveCount(0);

  await page.goto('/terms');
  await expect(page).toHaveURL(/\/sign-in\?next=%2Fterms/);
  await signIn(page, { email, password: testPassword });
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('My terms');
});

test('a wrong password says no more than that, and a new one comes by mail', async ({ market }) => {
  const member = await market.member({ roles: ['buyer'] });
  const { page } = await market.visitor();
  await page.goto('/sign-in');
  const refusal = page.getByRole('main').getByRole('alert');
  await signIn(page, { email: member.email, password: 'not the password' });
  await expect(refusal).toBeVisible();
  const words = await refusal.textContent();
  await signIn(page, { email: 'nobody@wendlesea.example', password: 'not the password' });
  await expect(page.getByRole('button', { name: 'Sign in' })).toBeVisible();
  await expect(refusal).toHaveText(words!);
  await expect(page.getByLabel('E-mail', { exact: true })).toHaveValue('nobody@wendlesea.example');

  await page.getByRole('link', { name: 'Forgot the password?' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Forgot the password?');
  await page.getByLabel('E-mail', { exact: true }).fill(member.email);
  await page.getByRole('button', { name: 'Send the link' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Look into your mail');
  const link = linkOf(await mailTo(member.email, 'Set a new password'));
  await page.goto(link);
  await page.getByLabel('New password', { exact: true }).fill('short');
  await page.getByRole('button', { name: 'Set the password' }).click();
  await expect(page.getByRole('heading', { name: 'There is a problem' })).toBeVisible();
  await expect(page).toHaveTitle(/^Error: /);
  await page.getByLabel('New password', { exact: true }).fill('tin lead antimony');
  await page.getByRole('button', { name: 'Set the password' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Your new password is set');

  // All sessions have ended, the link works once, and only the new password opens.
  await member.page.goto('/account');
  await expect(member.page.getByRole('heading', { level: 1 })).toHaveText('Sign in');
  await page.goto(link);
  await page.getByLabel('New password', { exact: true }).fill('tin lead antimony');
  await page.getByRole('button', { name: 'Set the password' }).click();
  await expect(page.getByRole('main').getByRole('alert')).toBeVisible();
  await page.goto('/sign-in');
  await signIn(page, { email: member.email, password: member.password });
  await expect(refusal).toBeVisible();
  await signIn(page, { email: member.email, password: 'tin lead antimony' });
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Lots open for bids');
});

test('own sessions are listed and can be ended; signing out leaves nothing behind', async ({ market }) => {
  const member = await market.member({ roles: ['seller', 'buyer'] });
  const other = await market.visitor();
  await other.page.goto('/sign-in');
  await signIn(other.page, member);
  await expect(other.page.getByRole('heading', { level: 1 })).toHaveText('Lots open for bids');

  await member.page.goto('/account');
  const sessions = member.page.getByRole('region', { name: 'Where you are signed in' }).getByRole('listitem');
  await expect(sessions).toHaveCount(2);
  await member.page.getByRole('button', { name: /^End the session on/ }).click();
  await expect(sessions).toHaveCount(1);
  await expect(sessions).toContainText('This device, now');
  await other.page.goto('/bids');
  await expect(other.page.getByRole('heading', { level: 1 })).toHaveText('Sign in');

  await signOut(member.page);
  expect((await member.context.cookies()).map(({ name, value }) => value && name)).toEqual([]);
  await member.page.goBack();
  await expect(member.page.getByText(member.email)).toHaveCount(0);
  await member.page.goto('/sell/');
  await expect(member.page.getByRole('heading', { level: 1 })).toHaveText('Sign in');
});

test('each client says which role its pages need', async ({ market }) => {
  const { page } = await market.member({ roles: ['buyer'] });
  await page.goto('/sell/');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('This page is for selling');
  await page.goto('/desk/members');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('This page is for the desk');
  await page.goto('/sell/lots/L-0/nothing');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('There is nothing at this address');

  await page.goto('/account');
  await page.getByLabel('Sell lots').check();
  await page.getByRole('button', { name: 'Save the profile' }).click();
  await expect(page.getByText('Saved', { exact: true })).toBeVisible();
  await page.goto('/sell/');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('My lots');
});
