import { badParameter } from './errors.ts';
import type { Kind } from './kinds.ts';
import { presentRow } from './present.ts';
import type { Work } from './work.ts';

const kindByPrefix: Record<string, Kind> = {
  acct: 'account',
  ba: 'bank_account',
  cus: 'customer',
  pm: 'payment_method',
  cs: 'checkout.session',
  pi: 'payment_intent',
  ch: 'charge',
  py: 'charge',
  txn: 'balance_transaction',
  tr: 'transfer',
  trr: 'transfer_reversal',
  re: 'refund',
  po: 'payout',
  du: 'dispute',
};

type Branch = Record<string, unknown>;

/** The answer with every path of `expand[]` (such as `latest_charge.balance_transaction`) turned from id to object. */
export function expand(work: Work, answer: object, paths: string[]): object {
  return paths.reduce((whole, path) => expandPath(work, whole as Branch, path.split('.'), path), answer);
}

function expandPath(work: Work, branch: Branch, [key, ...rest]: string[], whole: string): Branch {
  if (key === undefined) return branch;
  const value = key in branch ? branch[key] : includable(work, branch, key);
  if (value === undefined)
    throw badParameter('parameter_invalid', `This property cannot be expanded (${whole}).`, 'expand');
  if (Array.isArray(value)) {
    const items = value.map((item: unknown) => expandPath(work, resolve(work, item) as Branch, rest, whole));
    return { ...branch, [key]: items };
  }
  if (value === null) return branch;
  return { ...branch, [key]: expandPath(work, resolve(work, value) as Branch, rest, whole) };
}

function resolve(work: Work, value: unknown): unknown {
  if (typeof value !== 'string') return value;
  const kind = kindByPrefix[value.split('_')[0] ?? ''];
  const row = kind && work.store.row(kind, value);
  if (!row) throw badParameter('parameter_invalid', 'This property cannot be expanded.', 'expand');
  return presentRow(row, work.nowS);
}

/** Lists that an object carries only when asked for. */
function includable(work: Work, branch: Branch, key: string): unknown {
  const url = (data: unknown[], address: string) => ({ object: 'list', data, has_more: false, url: address });
  if (branch.object === 'checkout.session' && key === 'line_items') {
    const items = work.store.row('checkout.session', String(branch.id))?.hidden.lineItems ?? [];
    return url(items, `/v1/checkout/sessions/${String(branch.id)}/line_items`);
  }
  if (branch.object === 'charge' && key === 'refunds') {
    const refunds = work.store.all('refund').filter(({ value }) => value.charge === branch.id);
    return url(refunds.map(({ value }) => value).toReversed(), `/v1/charges/${String(branch.id)}/refunds`);
  }
  return undefined;
}
