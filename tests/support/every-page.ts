import type { DealAction, DealRow, DealView, LotList, MyBids, MyLotRow } from '@lydite/contracts';
import type { Call } from './calls.ts';

/** Step of a deal that has a page of its own, by the action it is for. */
const stepPages: Partial<Record<DealAction, string>> = {
  pay: 'pay',
  dispatch: 'dispatch',
  weigh_in: 'weigh-in',
  accept: 'accept',
  claim_mass: 'claim',
  countersign: 'countersign',
  accept_claim: 'accept-claim',
  cancel_late: 'cancel',
};

export const visitorPages = [
  '/sign-in',
  '/register',
  '/register/sent',
  '/forgot',
  '/reset?token=a-token-that-nobody-has',
  '/confirm?token=a-token-that-nobody-has',
  '/nowhere',
  '/sell/sign-in',
  '/desk/sign-in',
];

const ownPages = (base: string) => [`${base}/account`, `${base}/notices`];

/** Of each kind one: pages of lots and deals in the same state are drawn by the same parts. */
function oneOfEach<T>(rows: readonly T[], kindOf: (row: T) => string): T[] {
  const seen = new Map<string, T>();
  for (const row of rows) if (!seen.has(kindOf(row))) seen.set(kindOf(row), row);
  return [...seen.values()];
}

async function dealPages(call: Call, { side, base }: { side: 'buyer' | 'seller'; base: string }): Promise<string[]> {
  const rows = await call<DealRow[]>(`GET /my/deals?side=${side}`);
  const pages: string[] = [`${base}/deals`];
  for (const { code } of oneOfEach(rows, ({ state, duty, payoutState }) => `${state} ${duty} ${payoutState}`)) {
    const { actions, settlement } = await call<DealView>(`GET /deals/${code}`);
    pages.push(`${base}/deals/${code}`);
    if (settlement) pages.push(`${base}/deals/${code}/statement`);
    pages.push(...actions.flatMap((action) => stepPages[action] ?? []).map((step) => `${base}/deals/${code}/${step}`));
  }
  return oneOfEach(pages, (page) => page.replace(/(D-\d+)\/(statement|[a-z-]+)$/, 'D/$2'));
}

/** The list in its views, and a lot of each form, as anybody may read them. */
export async function marketPages(call: Call): Promise<string[]> {
  const { rows } = await call<LotList>('GET /lots');
  const lots = oneOfEach(rows, ({ form, bidders }) => `${form} ${bidders > 0}`);
  return [
    '/',
    '/?form=asking-price&sort=-grade',
    '/?q=nothing-of-this-kind',
    ...lots.map(({ code }) => `/lots/${code}`),
  ];
}

/** A buyer's pages, with the check of a bid and of a lot at a price. */
export async function buyerPages(call: Call): Promise<string[]> {
  const { rows } = await call<LotList>('GET /lots');
  const bids = await call<MyBids>('GET /my/bids');
  const open = rows.find(({ form, you }) => form === 'open-bids' && you === null);
  const asked = rows.find(({ form }) => form === 'asking-price');
  return [
    ...(await marketPages(call)),
    `/lots/${open?.code}/bid?most=${((open?.priceMinor ?? open?.startMinor ?? 0) / 100) * 2}`,
    `/lots/${asked?.code}/take`,
    ...oneOfEach(bids.rows, ({ lotState, standing, offer }) => `${lotState} ${standing} ${offer !== null}`).map(
      ({ lotCode, offer }) => `/lots/${lotCode}${offer ? '/offer' : ''}`,
    ),
    '/bids',
    '/terms',
    ...(await dealPages(call, { side: 'buyer', base: '' })),
    ...ownPages(''),
  ];
}

/** A seller's pages, with the five of a draft. */
export async function sellerPages(call: Call): Promise<string[]> {
  const lots = await call<MyLotRow[]>('GET /my/lots');
  const pages = oneOfEach(lots, ({ state }) => state).flatMap(({ code, state }) =>
    state === 'draft'
      ? ['photos', 'contents', 'weight', 'sale', 'check'].map((step) => `/sell/lots/${code}/${step}`)
      : [`/sell/lots/${code}`],
  );
  const withdrawable = lots.find(({ state, bidders }) => state === 'open' && bidders === 0);
  return [
    '/sell/lots',
    ...pages,
    ...(withdrawable ? [`/sell/lots/${withdrawable.code}/withdraw`] : []),
    '/sell/payouts',
    ...(await dealPages(call, { side: 'seller', base: '/sell' })),
    ...ownPages('/sell'),
  ];
}

/** An operator's pages, with the papers of one member. */
export async function deskPages(call: Call): Promise<string[]> {
  const { rows } = await call<{ rows: { id: string; email: string }[] }>('GET /desk/members?page=1');
  const [member] = rows;
  return [
    '/desk',
    '/desk/lots',
    '/desk/members',
    `/desk/members/${member?.id}/verify?email=${encodeURIComponent(member?.email ?? '')}`,
    '/desk/effects',
    '/desk/ledger',
    ...ownPages('/desk'),
  ];
}
