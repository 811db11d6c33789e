import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { addDeal, bringToReceipt, must, payIn, weighIn, type TestDeal } from '../../../test/deals.ts';
import { addListedLot, addPrice, addSeller } from '../../../test/listed-lots.ts';
import { lineOf } from '../../../test/lot-drafts.ts';
import { openMarket, type Market } from '../../../test/market.ts';
import { readPdf } from '../../../test/read-pdf.ts';
import { ensureCatalogue } from '../catalogue/catalogue.commands.ts';
import { photoForm, plainPhoto } from '../../../test/photo-files.ts';

let market: Market;
beforeAll(async () => {
  market = await openMarket();
  await ensureCatalogue(market.db.manager);
  await addPrice(market);
});
afterAll(() => market.close());

const entry = { grossG: 12_800, tareG: 400, scaleResolutionG: 10, scaleSerial: 'B-204', note: '' };

async function received(): Promise<TestDeal> {
  const deal = await addDeal(market);
  await bringToReceipt(market, deal);
  return deal;
}

describe('the weigh-in', () => {
  test('that cannot be true is refused by field, and can be entered again', async () => {
    const deal = await received();
    const buyer = await deal.buyer();
    const params = { dealCode: deal.code };
    const photo = await must(
      buyer.call('POST /deals/:dealCode/photos', { params, form: photoForm(await plainPhoto()) }),
      201,
    );
    const photoIds = [photo.body.id];
    const enter = (change: Partial<typeof entry>) =>
      buyer.call('POST /deals/:dealCode/weigh-in', { params, body: { ...entry, ...change, photoIds } });
    const swapped = await enter({ grossG: 400, tareG: 12_800 });
    expect(swapped).toMatchObject({ status: 422, problem: { code: 'weigh_in.implausible' } });
    expect(swapped.problem.fields.map(({ path }) => path)).toEqual(['tareG']);
    expect((await enter({ grossG: 128_000 })).problem.fields.map(({ path }) => path)).toEqual(['grossG']);
    expect((await enter({})).body.weighIn?.netG).toBe(12_400);
    expect((await enter({})).problem.code).toBe('deal.wrong_state');
  });

  test('wants a photo, and one of this deal', async () => {
    const [deal, other] = [await received(), await received()];
    const photo = await must(
      (await other.buyer()).call('POST /deals/:dealCode/photos', {
        params: { dealCode: other.code },
        form: photoForm(await plainPhoto()),
      }),
      201,
    );
    const buyer = await deal.buyer();
    const enter = (photoIds: string[]) =>
      buyer.call('POST /deals/:dealCode/weigh-in', { params: { dealCode: deal.code }, body: { ...entry, photoIds } });
    expect(await enter([])).toMatchObject({ status: 400, problem: { code: 'request.invalid' } });
    expect(await enter([photo.body.id])).toMatchObject({ status: 404, problem: { code: 'photo.not_found' } });
    expect((await must(buyer.call('GET /deals/:dealCode', { params: { dealCode: deal.code } }))).body.state).toBe(
      'received',
    );
  });

  test('takes photos only between receipt and weigh-in', async () => {
    const deal = await addDeal(market);
    await payIn(market, deal);
    const refused = await (
      await deal.buyer()
    ).call('POST /deals/:dealCode/photos', { params: { dealCode: deal.code }, form: photoForm(await plainPhoto()) });
    expect(refused).toMatchObject({ status: 409, problem: { code: 'deal.wrong_state' } });
  });
});

test('a lot for collection is made ready, and received at the hand-over', async () => {
  const deal = await addDeal(market, { freightMinor: 0 });
  await market.db.query(
    `update lots set delivery_way = 'collection', delivery_hours = 'Mon to Fri, 8 to 16' where id = $1`,
    [deal.lotId],
  );
  await payIn(market, deal);
  const params = { dealCode: deal.code };
  const ready = await must((await deal.seller()).call('POST /deals/:dealCode/ready', { params }));
  expect(ready.body).toMatchObject({ state: 'ready', due: { what: 'The buyer collects the lot' } });
  expect((await must((await deal.buyer()).call('POST /deals/:dealCode/receive', { params }))).body.state).toBe(
    'received',
  );
});

describe('papers', () => {
  const lines = [
    lineOf(),
    lineOf({ label: 'Pinned ceramic processors', classCode: 'ceramic-processors', massG: 2_100.5, pieces: 74 }),
  ];

  async function dealOnListedLot(): Promise<TestDeal & { lotCode: string }> {
    const seller = await addSeller(market);
    const lotCode = await addListedLot(seller, { lines });
    const rows: { id: string }[] = await market.db.query('select id from lots where code = $1', [lotCode]);
    const deal = await addDeal(market, { lot: { id: rows[0]!.id, sellerId: seller.memberId! } });
    return { ...deal, lotCode };
  }

  test('the packing slip names parties, lines, masses and cautions, and is tagged', async () => {
    const deal = await dealOnListedLot();
    await payIn(market, deal);
    const params = { dealCode: deal.code };
    const slip = await must((await deal.seller()).call('GET /deals/:dealCode/packing-slip.pdf', { params }));
    expect(slip.headers.get('content-type')).toBe('application/pdf');
    expect(slip.headers.get('content-disposition')).toBe(`inline; filename=packing-slip-${deal.code}.pdf`);
    const { text, title, lang, headings } = await readPdf(slip.bytes);
    expect({ title, lang }).toEqual({ title: `Packing slip ${deal.code}`, lang: 'en-GB' });
    expect(headings).toEqual(['Packing slip', 'Parties and delivery', 'Contents', 'Handling cautions']);
    for (const part of [
      deal.lotCode,
      'Vennaby Recovery, Vennaby',
      'Pinned ceramic processors',
      '2.1005 kg',
      '14.5005 kg',
      'beryllium oxide',
      'Local law',
    ])
      expect(text).toContain(part);
  });

  test('the statement carries the figures of the page', async () => {
    const deal = await dealOnListedLot();
    await bringToReceipt(market, deal);
    await must(weighIn(deal, 13_000));
    const params = { dealCode: deal.code };
    await must((await deal.buyer()).call('POST /deals/:dealCode/claim', { params, body: { ground: 'mass' } }));
    await must((await deal.seller()).call('POST /deals/:dealCode/accept-claim', { params }));
    const { settlement } = (await must((await deal.buyer()).call('GET /deals/:dealCode', { params }))).body;
    const paper = await must((await deal.buyer()).call('GET /deals/:dealCode/statement.pdf', { params }));
    const { text } = await readPdf(paper.bytes);
    for (const { label, detail, amountMinor } of [...settlement!.sellerSteps, ...settlement!.buyerSteps]) {
      const amount = `${amountMinor < 0 ? '−' : ''}$${(Math.abs(amountMinor) / 100).toLocaleString('en-GB', { minimumFractionDigits: 2 })}`;
      for (const part of [label, detail, amount]) expect(text).toContain(part.replaceAll('\u00a0', ' '));
    }
    expect(text).toContain(settlement!.hash);
    expect(settlement!.refundMinor).toBeGreaterThan(0);
  });
});
