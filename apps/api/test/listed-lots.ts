import type { LotDraft } from '@lydite/contracts';
import { addMember } from './factories.ts';
import { completeDraft } from './lot-drafts.ts';
import type { Caller, Market } from './market.ts';
import { photoForm, plainPhoto } from './photo-files.ts';

/** Puts a gold price of 130.00 a gram in force, without which nothing can be listed. */
export const addPrice = (market: Market): Promise<unknown> =>
  market.db.query(
    `insert into reference_prices (at, source, currency, per_gram_minor) values (market_now() - interval '1 minute', 'Test series', 'USD', 13000)`,
  );

export const addSeller = async (market: Market): Promise<Caller> =>
  market.as(await addMember(market, { roles: ['seller'] }));

/** A saved draft with one photo that lacks nothing; answers its code and version. */
export async function addDraft(
  seller: Caller,
  draft: Partial<LotDraft> = {},
): Promise<{ lotCode: string; version: number }> {
  const { body: begun } = await seller.call('POST /my/lots');
  const params = { lotCode: begun.code };
  await seller.call('POST /my/lots/:lotCode/photos', { params, form: photoForm(await plainPhoto()) });
  const saved = await seller.call('PUT /my/lots/:lotCode', {
    params,
    body: { version: begun.version, draft: completeDraft(draft) },
  });
  if (saved.status !== 200) throw new Error(JSON.stringify(saved.problem));
  return { lotCode: begun.code, version: saved.body.version };
}

/** A lot on the market; answers its code. */
export async function addListedLot(seller: Caller, draft: Partial<LotDraft> = {}): Promise<string> {
  const { lotCode, version } = await addDraft(seller, draft);
  const listed = await seller.call('POST /my/lots/:lotCode/list', { params: { lotCode }, body: { version } });
  if (listed.status !== 200) throw new Error(JSON.stringify(listed.problem));
  return lotCode;
}
