import { randomUUID } from 'node:crypto';
import type { LotDraft } from '@lydite/contracts';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { addMember } from '../../../test/factories.ts';
import { addDraft, addListedLot, addPrice, addSeller } from '../../../test/listed-lots.ts';
import { completeDraft, lineOf } from '../../../test/lot-drafts.ts';
import { openMarket, type Caller, type Market } from '../../../test/market.ts';

let market: Market;
let seller: Caller;
beforeAll(async () => {
  market = await openMarket();
  await addPrice(market);
  seller = await addSeller(market);
});
afterAll(() => market.close());

const save = (lotCode: string, version: number, draft: LotDraft, caller = seller) =>
  caller.call('PUT /my/lots/:lotCode', { params: { lotCode }, body: { version, draft } });
const readOwn = (lotCode: string, caller = seller) => caller.call('GET /my/lots/:lotCode', { params: { lotCode } });

test('a draft begins empty at the seller’s place, and survives being left half filled in', async () => {
  const { status, body: begun } = await seller.call('POST /my/lots');
  expect(status).toBe(201);
  expect(begun).toMatchObject({ state: 'draft', version: 1, listedAt: null, photos: [], dealCode: null });
  expect(begun.draft.delivery.place).toBe('Harrowmere');
  expect(begun.missing.length).toBeGreaterThan(5);

  const half: LotDraft = { ...begun.draft, title: 'Network', lines: [lineOf({ classCode: null, massG: null })] };
  const saved = await save(begun.code, 1, half);
  expect(saved.body).toMatchObject({ version: 2, draft: half });
  const again = await readOwn(begun.code);
  expect(again.body).toEqual(saved.body);
  expect(again.body.missing.map(({ path }) => path)).toContain('lines.0.massG');
});

test('a save over an older version changes nothing and brings the newest along', async () => {
  const { lotCode, version } = await addDraft(seller);
  const first = await save(lotCode, version, completeDraft({ title: 'First tab' }));
  expect(first.status).toBe(200);
  const second = await save(lotCode, version, completeDraft({ title: 'Second tab' }));
  expect([second.status, second.problem.code]).toEqual([409, 'lot.changed']);
  expect(second.problem.context?.current).toEqual(first.body);
  expect((await readOwn(lotCode)).body.draft.title).toBe('First tab');
});

test('of two saves at once one wins', async () => {
  const { lotCode, version } = await addDraft(seller);
  const answers = await Promise.all(['a', 'b', 'c'].map((title) => save(lotCode, version, completeDraft({ title }))));
  expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 409, 409]);
});

test('what is no draft is refused field by field', async () => {
  const { lotCode, version } = await addDraft(seller);
  const draft = completeDraft();
  const bad = { ...draft, title: 'x'.repeat(91), lines: [{ ...lineOf(), massG: -1, role: 'operator' }] };
  const { status, problem } = await save(lotCode, version, bad as LotDraft);
  expect([status, problem.code]).toEqual([400, 'request.invalid']);
  expect(problem.fields.map(({ path }) => path).toSorted()).toEqual([
    'draft.lines.0.massG',
    'draft.lines.0.role',
    'draft.title',
  ]);
});

test('a deleted draft is gone for good; a listed lot is neither deleted nor changed', async () => {
  const { lotCode } = await addDraft(seller);
  const remove = (code: string) => seller.call('DELETE /my/lots/:lotCode', { params: { lotCode: code } });
  expect((await remove(lotCode)).status).toBe(204);
  expect((await remove(lotCode)).problem.code).toBe('lot.not_found');
  expect((await readOwn(lotCode)).problem.code).toBe('lot.not_found');

  const listed = await addListedLot(seller);
  expect((await remove(listed)).problem.code).toBe('lot.wrong_state');
  expect((await save(listed, 2, completeDraft({ title: 'Other things' }))).problem.code).toBe('lot.wrong_state');
});

test('a copy takes lines, terms and photos along, but declares nothing', async () => {
  const lotCode = await addListedLot(seller);
  const { body: copy, status } = await seller.call('POST /my/lots/:lotCode/copy', { params: { lotCode } });
  expect(status).toBe(201);
  expect(copy).toMatchObject({ state: 'draft', version: 1, listedAt: null, closesAt: null });
  expect(copy.code).not.toBe(lotCode);
  expect(copy.draft.lines[0]).toMatchObject({ massG: 12_400, label: 'DDR3 registered, double-sided' });
  expect(copy.draft.declarations.rightToSell).toBe(false);
  expect(copy.photos).toHaveLength(1);
  const { body: source } = await readOwn(lotCode);
  expect(copy.photos[0]!.id).not.toBe(source.photos[0]!.id);
  const params = { photoId: copy.photos[0]!.id, size: 'page' } as const;
  expect((await seller.call('GET /photos/:photoId/:size', { params })).status).toBe(200);
});

test('own lots say what is to be done, the last touched first', async () => {
  const one = await addSeller(market);
  const listed = await addListedLot(one);
  const { lotCode } = await addDraft(one);
  await one.call('POST /my/lots');
  const { body: rows } = await one.call('GET /my/lots');
  expect(rows.map(({ state, duty }) => [state, duty])).toEqual([
    ['draft', 'Finish and list it'],
    ['draft', 'Finish and list it'],
    ['open', ''],
  ]);
  expect(rows[0]).toMatchObject({ title: '', massG: null, goldG: null, coverPhotoId: null });
  expect(rows[1]).toMatchObject({ code: lotCode, title: completeDraft().title, massG: 12_400, goldG: null });
  expect(rows[2]).toMatchObject({ code: listed, coverPhotoId: expect.any(String), bidders: 0, dealCode: null });
  expect(rows[2]!.goldG!.p10).toBeLessThan(rows[2]!.goldG!.p50);
  expect(rows[1]!.estimate).toBeNull();
  expect(rows[2]!.estimate!.goldG.p50).toBe(rows[2]!.goldG!.p50);
});

test('somebody else’s lot is not found by any call on it; a buyer has no lots', async () => {
  const { lotCode, version } = await addDraft(seller);
  const { body: before } = await readOwn(lotCode);
  const other = await addSeller(market);
  const params = { lotCode };
  const photoId = before.photos[0]!.id;
  const answers = [
    await readOwn(lotCode, other),
    await save(lotCode, version, completeDraft({ title: 'Taken over' }), other),
    await other.call('DELETE /my/lots/:lotCode', { params }),
    await other.call('POST /my/lots/:lotCode/list', { params, body: { version } }),
    await other.call('POST /my/lots/:lotCode/withdraw', { params }),
    await other.call('POST /my/lots/:lotCode/copy', { params }),
    await other.call('POST /my/lots/:lotCode/photos', { params, form: new FormData() }),
    await other.call('PUT /my/lots/:lotCode/photos', { params, body: { photos: [{ id: photoId, description: '' }] } }),
    await other.call('DELETE /my/lots/:lotCode/photos/:photoId', { params: { lotCode, photoId } }),
    await other.call('GET /lots/:lotCode', { params }),
  ];
  expect(answers.map(({ status, problem }) => [status, problem.code])).toEqual(
    answers.map(() => [404, 'lot.not_found']),
  );
  expect((await readOwn(lotCode)).body).toEqual(before);

  const buyer = await market.as(await addMember(market, { roles: ['buyer'] }));
  expect((await buyer.call('GET /my/lots')).status).toBe(403);
  expect((await market.visitor().call('GET /my/lots')).status).toBe(401);
  const mixed = await seller.call('DELETE /my/lots/:lotCode/photos/:photoId', {
    params: { lotCode, photoId: randomUUID() },
  });
  expect(mixed.problem.code).toBe('photo.not_found');
});
