import type { Settings } from '../../settings.ts';

type Where = Pick<Settings, 'PAYMENTS_API_URL'>;

/** The address as this process reaches it: pages are given out under the name by which a browser finds them. */
const reachable = ({ PAYMENTS_API_URL }: Where, page: string): URL => {
  if (!PAYMENTS_API_URL) throw new Error('The demo market is played against the stand-in: set PAYMENTS_API_URL.');
  const { pathname, search } = new URL(page);
  return new URL(pathname + search, PAYMENTS_API_URL);
};

async function submit(url: URL, form: Record<string, string>): Promise<void> {
  const answer = await fetch(url, { method: 'POST', body: new URLSearchParams(form), redirect: 'manual' });
  if (answer.status !== 303) throw new Error(`${url.pathname} answered ${answer.status}: ${await answer.text()}`);
}

/** What a buyer does on the payment page: chooses a test card or bank account and presses Pay. */
export const payOnPage = (where: Where, page: string, method: string): Promise<void> =>
  submit(reachable(where, page), { method });

/** What a seller does on the page that the single-use link leads to: fills in the name, chooses the bank account. */
export async function setUpOnPage(where: Where, link: string, name: string): Promise<void> {
  const opened = await fetch(reachable(where, link), { redirect: 'manual' });
  const page = opened.headers.get('location');
  if (opened.status !== 303 || !page) throw new Error(`The account link answered ${opened.status}`);
  await submit(reachable(where, page), { name, bank: '000123456789' });
}

/** The button of the stand-in's overview by which a bank sends a debit back. */
export const sendDebitBack = (where: Where, intentId: string): Promise<void> =>
  submit(reachable(where, `http://processor/_control/payment_intents/${intentId}/fail`), {});
