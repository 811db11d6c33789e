import { writeFile } from 'node:fs/promises';
import type { MyLotView } from '@lydite/contracts';
import { fortyMegabytes, hugePng, svgDrawing } from '../../apps/api/test/photo-files.ts';
import { beginDraft, draftOf, photoFile } from '../support/lots.ts';
import { expect, test } from '../support/market.ts';
import { chooseInto, expectSent, savedLine } from '../support/scenes/sell.ts';

test('what was typed is there after a reload, and on the server a moment later', async ({ market }) => {
  const { page, call } = await market.member({ roles: ['seller'] });
  const { code } = await beginDraft(call);
  const draft = async () => (await call<MyLotView>(`GET /my/lots/${code}`)).draft;

  await page.goto(`/sell/lots/${code}/contents`);
  await page.getByLabel('Title').fill('Edge contacts, cut');
  await page.getByLabel('Description').fill('From network cards.');
  // The device has it long before the server is asked to.
  await page.waitForTimeout(700);
  await page.reload();
  await expect(page.getByLabel('Title')).toHaveValue('Edge contacts, cut');
  await expect(page.getByLabel('Description')).toHaveValue('From network cards.');
  await expect.poll(draft).toMatchObject({ title: 'Edge contacts, cut', description: 'From network cards.' });
  await expect(savedLine(page)).toBeVisible();
});

test('without a connection typing goes on, and is saved when it is back', async ({ market }) => {
  const { page, context, call } = await market.member({ roles: ['seller'] });
  const { code } = await beginDraft(call);
  await page.goto(`/sell/lots/${code}/contents`);
  await expect(page.getByLabel('Title')).toBeVisible();
  await context.setOffline(true);
  await page.getByLabel('Title').fill('Typed in a cellar');
  await page.getByLabel('Title').blur();
  await expect(page.getByText('Your changes are kept on this device and sent by themselves.')).toBeVisible();
  await context.setOffline(false);
  await expect
    .poll(async () => (await call<MyLotView>(`GET /my/lots/${code}`)).draft.title, { timeout: 20_000 })
    .toBe('Typed in a cellar');
  await expect(page.getByText('Not saved yet.')).toHaveCount(0);
});

test('two tabs never overwrite each other: the seller chooses', async ({ market }) => {
  const { page, context, call } = await market.member({ roles: ['seller'] });
  const { code } = await beginDraft(call, draftOf({ title: 'As it began' }));
  const other = await context.newPage();
  const address = `/sell/lots/${code}/contents`;
  await Promise.all([page.goto(address), other.goto(address)]);
  await expect(other.getByLabel('Title')).toHaveValue('As it began');
  await page.getByLabel('Title').fill('From the first tab');
  await page.getByLabel('Title').blur();
  await expect.poll(async () => (await call<MyLotView>(`GET /my/lots/${code}`)).draft.title).toBe('From the first tab');

  await other.getByLabel('Title').fill('From the second tab');
  await other.getByLabel('Title').blur();
  const choice = other.getByRole('region', { name: 'This draft was saved elsewhere meanwhile' });
  await expect(choice).toBeVisible();
  await expect(choice.getByRole('row', { name: /^Title/ })).toContainText('From the first tab');
  await expect(choice.getByRole('row', { name: /^Title/ })).toContainText('From the second tab');
  expect((await call<MyLotView>(`GET /my/lots/${code}`)).draft.title).toBe('From the first tab');
  await choice.getByRole('button', { name: 'Keep mine' }).click();
  await expect(choice).toHaveCount(0);
  await expect
    .poll(async () => (await call<MyLotView>(`GET /my/lots/${code}`)).draft.title)
    .toBe('From the second tab');
  await expect(other.getByLabel('Title')).toHaveValue('From the second tab');
});

test('a file that is no photo is refused beside its name, and nothing else is lost', async ({ market }, info) => {
  test.setTimeout(120_000);
  const { page, call } = await market.member({ roles: ['seller'] });
  const { code } = await beginDraft(call, draftOf());
  await page.goto(`/sell/lots/${code}/photos`);
  const refused = [
    { name: 'drawing.svg', bytes: svgDrawing() },
    { name: 'notes.jpg', bytes: Buffer.from('This is text, not a photo.\n'.repeat(40)) },
    { name: 'huge.png', bytes: hugePng() },
    { name: 'heavy.jpg', bytes: fortyMegabytes() },
  ];
  await chooseInto(page, 'The whole lot, from above').setInputFiles(photoFile('memory-rows'));
  await expectSent(page, 1);
  for (const file of refused) {
    // Chosen from the disk, as forty megabytes would take long on their way through the browser's controls.
    const path = info.outputPath(file.name);
    await writeFile(path, file.bytes);
    await chooseInto(page, 'More photos').setInputFiles(path);
    const row = page
      .getByRole('listitem')
      .filter({ hasText: file.name })
      .filter({ has: page.getByRole('heading') });
    await expect(row).toContainText('Error: ', { timeout: 30_000 });
    await expect(row).toContainText('Not sent; it is still here.');
    await expect(row.getByRole('button', { name: /^Try again/ })).toBeVisible();
  }
  await chooseInto(page, 'One piece, contacts filling the frame').setInputFiles(photoFile('memory-close'));
  await expectSent(page, 2);
  for (const { name } of refused) await page.getByRole('button', { name: new RegExp(`^Let it go.*${name}$`) }).click();
  await expect(page.getByText('Not sent; it is still here.')).toHaveCount(0);
  const { photos, draft } = await call<MyLotView>(`GET /my/lots/${code}`);
  expect(photos).toHaveLength(2);
  expect(draft.lines).toHaveLength(1);
});
