import { randomUUID } from 'node:crypto';
import { readdir, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, expect, test, vi } from 'vitest';
import { completeDraft } from '../../../test/lot-drafts.ts';
import { addDraft, addListedLot, addPrice, addSeller } from '../../../test/listed-lots.ts';
import { addMember } from '../../../test/factories.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';
import { fortyMegabytes, hugePng, phonePhoto, photoForm, plainPhoto, svgDrawing } from '../../../test/photo-files.ts';
import { clientHeader } from '../../platform/guards.ts';
import { storePhoto } from './photos.commands.ts';

let market: Market;
let seller: Caller;
beforeAll(async () => {
  market = await openMarket();
  await addPrice(market);
  seller = await addSeller(market);
});
afterAll(() => market.close());

/** The tag of the block of coordinates in EXIF, as a little-endian number. */
const gpsPointer = Buffer.from([0x25, 0x88]);

const add = (lotCode: string, bytes: Buffer, options: { name?: string; slot?: string } = {}) =>
  seller.call('POST /my/lots/:lotCode/photos', { params: { lotCode }, form: photoForm(bytes, options) });
const read = (caller: Caller, photoId: string, size: 'list' | 'page' | 'zoom' = 'page') =>
  caller.call('GET /photos/:photoId/:size', { params: { photoId, size } });

test('a photo is turned upright, made in three sizes, and keeps nothing of its place and camera', async () => {
  const { lotCode } = await addDraft(seller);
  const sent = await phonePhoto();
  const { exif } = await sharp(sent).metadata();
  expect([exif?.includes('Phone maker'), exif?.includes(gpsPointer)]).toEqual([true, true]);
  const { status, body } = await add(lotCode, sent, { slot: 'on-scale' });
  expect(status).toBe(201);
  expect(body).toMatchObject({
    slot: 'on-scale',
    width: 1200,
    height: 2400,
    colour: expect.stringMatching(/^#[0-9a-f]{6}$/),
  });
  for (const [size, height] of [
    ['list', 160],
    ['page', 1200],
    ['zoom', 2400],
  ] as const) {
    const answer = await read(seller, body.id, size);
    expect(answer.headers.get('content-type')).toBe('image/webp');
    expect(answer.headers.get('cache-control')).toBe('private, max-age=31536000, immutable');
    const made = await sharp(answer.bytes).metadata();
    expect(made).toMatchObject({ format: 'webp', width: height / 2, height });
    expect([made.exif, made.xmp, made.iptc, made.icc]).toEqual([undefined, undefined, undefined, undefined]);
    expect(answer.bytes.includes('Phone maker')).toBe(false);
  }
});

test('a small photo is never enlarged; what hides behind a photo does not come out again', async () => {
  const { lotCode } = await addDraft(seller);
  const polyglot = Buffer.concat([
    await plainPhoto({ width: 90, height: 60 }),
    Buffer.from('<script>alert(1)</script>'),
  ]);
  const { body } = await add(lotCode, polyglot, { name: '../../x.html' });
  expect(body).toMatchObject({ width: 90, height: 60 });
  const { bytes, headers } = await read(seller, body.id, 'zoom');
  expect(bytes.includes('script')).toBe(false);
  expect(headers.get('content-security-policy')).toContain('sandbox');
});

test.each<[string, () => Buffer | Promise<Buffer>, string, number, string, RegExp]>([
  ['a drawing', svgDrawing, 'board.svg', 422, 'photo.kind_refused', /not a JPEG, PNG or WebP/],
  [
    'a text named .jpg',
    () => Buffer.from('no photo at all'),
    'board.jpg',
    422,
    'photo.kind_refused',
    /whatever its name/,
  ],
  ['an empty file', () => Buffer.alloc(0), 'board.jpg', 422, 'photo.kind_refused', /not a JPEG/],
  [
    'a phone’s HEIC',
    () => Buffer.from('\0\0\0\x18ftypheic\0\0\0\0', 'latin1'),
    'a.heic',
    422,
    'photo.kind_refused',
    /JPEG/,
  ],
  ['30 000 × 30 000 pixels', hugePng, 'huge.png', 422, 'photo.too_many_pixels', /30000 × 30000 .* 900 megapixels/],
  ['40 MB', fortyMegabytes, 'large.jpg', 413, 'photo.too_large', /larger than 25 MB/],
  ['half a photo', async () => (await plainPhoto()).subarray(0, 900), 'half.jpg', 422, 'photo.unreadable', /damaged/],
])('%s is refused in words, and nothing is lost', async (_, make, name, status, code, words) => {
  const { lotCode } = await addDraft(seller);
  const before = await seller.call('GET /my/lots/:lotCode', { params: { lotCode } });
  const refused = await add(lotCode, await make(), { name });
  expect([refused.status, refused.problem.code]).toEqual([status, code]);
  expect(refused.problem.detail).toMatch(words);
  const after = await seller.call('GET /my/lots/:lotCode', { params: { lotCode } });
  expect(after.body).toEqual(before.body);
  expect((await read(seller, after.body.photos[0]!.id)).status).toBe(200);
});

test('nothing stays in quarantine, whether a photo was taken, refused or given up half way', async () => {
  const { lotCode } = await addDraft(seller);
  const leaving = new AbortController();
  const half = new ReadableStream({
    start(body) {
      body.enqueue(Buffer.from('--b\r\ncontent-disposition: form-data; name="photo"; filename="a.jpg"\r\n\r\n'));
      body.enqueue(Buffer.alloc(300_000, 0xff));
    },
  });
  const sent = seller.fetch(`/api/my/lots/${lotCode}/photos`, {
    method: 'POST',
    body: half,
    signal: leaving.signal,
    headers: { 'content-type': 'multipart/form-data; boundary=b', [clientHeader]: 'test' },
    ...{ duplex: 'half' },
  });
  const quarantine = join(market.world.settings.FILES_DIR, 'quarantine');
  await vi.waitFor(async () => expect(await readdir(quarantine)).toHaveLength(1), 5000);
  leaving.abort();
  await expect(sent).rejects.toThrow('abort');
  await vi.waitFor(async () => expect(await readdir(quarantine)).toEqual([]), 5000);
});

test('no file, a wrong field and an unknown slot are answered as bad requests', async () => {
  const { lotCode } = await addDraft(seller);
  const params = { lotCode };
  const none = await seller.call('POST /my/lots/:lotCode/photos', { params, form: new FormData() });
  expect([none.status, none.problem.code]).toEqual([400, 'photo.missing']);
  const odd = await add(lotCode, await plainPhoto(), { slot: '../etc' });
  expect([odd.status, odd.problem.fields[0]?.path]).toEqual([400, 'slot']);
});

test('at most 24 photos, even when they come at once', async () => {
  const { lotCode } = await addDraft(seller);
  const photo = await plainPhoto({ width: 40, height: 30 });
  const answers = await Promise.all(Array.from({ length: 26 }, () => add(lotCode, photo)));
  expect(answers.filter(({ status }) => status === 201)).toHaveLength(23);
  expect(answers.filter(({ status }) => status !== 201).map(({ problem }) => problem.code)).toEqual(
    Array.from({ length: 3 }, () => 'photo.too_many'),
  );
  const { body } = await seller.call('GET /my/lots/:lotCode', { params: { lotCode } });
  expect(body.photos).toHaveLength(24);
});

test('photos are ordered and described together; the first is the cover; a removed one is gone with its files', async () => {
  const { lotCode } = await addDraft(seller);
  const params = { lotCode };
  const { body: second } = await add(lotCode, await plainPhoto({ colour: '#aa0000' }));
  const { body: lot } = await seller.call('GET /my/lots/:lotCode', { params });
  const [first] = lot.photos;
  const order = [
    { id: second.id, description: 'Close-up' },
    { id: first!.id, description: '' },
  ];
  const put = await seller.call('PUT /my/lots/:lotCode/photos', { params, body: { photos: order } });
  expect(put.body.map(({ id, description }) => ({ id, description }))).toEqual(order);
  const { body: rows } = await seller.call('GET /my/lots');
  expect(rows.find(({ code }) => code === lotCode)?.coverPhotoId).toBe(second.id);
  const partial = await seller.call('PUT /my/lots/:lotCode/photos', { params, body: { photos: order.slice(1) } });
  expect([partial.status, partial.problem.code]).toEqual([409, 'lot.changed']);

  const remove = () =>
    seller.call('DELETE /my/lots/:lotCode/photos/:photoId', { params: { lotCode, photoId: second.id } });
  expect((await remove()).status).toBe(204);
  expect((await remove()).problem.code).toBe('photo.not_found');
  expect((await read(seller, second.id)).status).toBe(404);
  expect(await market.world.files.read(`originals/${second.id}`)).toBeNull();
});

test('photos of a listed lot are public, those of a draft are the owner’s and the desk’s', async () => {
  const { lotCode } = await addDraft(seller);
  const { body: draft } = await seller.call('GET /my/lots/:lotCode', { params: { lotCode } });
  const photoId = draft.photos[0]!.id;
  const others = [
    market.visitor(),
    await addSeller(market),
    await market.as(await addMember(market, { roles: ['buyer'] })),
  ];
  for (const other of others) expect((await read(other, photoId)).problem.code).toBe('photo.not_found');
  expect((await read(await market.as(await addMember(market, { roles: ['operator'] })), photoId)).status).toBe(200);

  const listed = await addListedLot(seller);
  const { body: lot } = await market.visitor().call('GET /lots/:lotCode', { params: { lotCode: listed } });
  for (const other of others) {
    const { status, headers } = await read(other, lot.photos[0]!.id, 'list');
    expect([status, headers.get('cache-control')]).toEqual([200, 'public, max-age=31536000, immutable']);
  }
  const late = await add(listed, await plainPhoto());
  expect([late.status, late.problem.code]).toEqual([409, 'lot.wrong_state']);
});

test('photos of a deal are seen by its two sides and the desk only', async () => {
  const { form: _form, ...terms } = completeDraft().sale;
  const lotCode = await addListedLot(seller, { sale: { ...terms, form: 'asking-price', askingMinor: 9000 } });
  const buyer = await market.as(await addMember(market));
  const body = { priceMinor: 9000, attempt: randomUUID() };
  const { body: taken } = await buyer.call('POST /lots/:lotCode/take', { params: { lotCode }, body });
  const [deal]: { id: string }[] = await market.db.query('select id from deals where code = $1', [taken.dealCode]);
  const path = join(market.world.settings.FILES_DIR, 'scale.jpg');
  await writeFile(path, await plainPhoto());
  const photo = await storePhoto(market.world, {
    ownerId: buyer.memberId!,
    dealId: deal!.id,
    slot: 'on-scale',
    upload: { path },
  });
  const desk = await market.as(await addMember(market, { roles: ['operator'] }));
  for (const side of [buyer, seller, desk]) {
    const { status, headers } = await read(side, photo.id);
    expect([status, headers.get('cache-control')]).toEqual([200, 'private, max-age=31536000, immutable']);
  }
  const stranger = await market.as(await addMember(market, { roles: ['buyer', 'seller'] }));
  for (const other of [stranger, market.visitor()])
    expect((await read(other, photo.id)).problem.code).toBe('photo.not_found');
});
