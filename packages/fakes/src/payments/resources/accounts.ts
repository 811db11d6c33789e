import type { Stripe } from 'stripe';
import { z } from 'zod';
import { capabilityOf, completeAccount, requirementsOf, saveAccount, setBankAccount } from '../accounts.ts';
import { missing, refused } from '../errors.ts';
import { newId } from '../ids.ts';
import { listPage } from '../listing.ts';
import { mergeMetadata } from '../metadata.ts';
import { flag, ignored, metadata, paging, text } from '../parameters.ts';
import { route } from '../route.ts';
import { mustFind, type Work } from '../work.ts';

const LINK_LIFE_S = 300;

const bankInput = z.union([
  z.object({
    object: z.literal('bank_account'),
    account_number: text(),
    routing_number: text().optional(),
    account_holder_name: text().optional(),
    country: text().optional(),
    currency: text().optional(),
  }),
  z.string().startsWith('btok_'),
]);

const facts = {
  business_profile: z.object({ name: text().optional(), url: text().optional() }).loose().optional(),
  business_type: z.enum(['company', 'government_entity', 'individual', 'non_profit']).optional(),
  capabilities: z.record(z.string(), z.object({ requested: flag() })).optional(),
  email: text().optional(),
  external_account: bankInput.optional(),
  metadata: metadata().optional(),
  tos_acceptance: z.object({ date: text().optional(), ip: text().optional() }).loose().optional(),
  ...ignored('company', 'individual', 'settings', 'default_currency', 'documents'),
};

type Facts = z.output<z.ZodObject<typeof facts>>;

const createInput = {
  ...facts,
  type: z.enum(['custom', 'express', 'standard']).optional(),
  country: z.string().length(2).optional(),
  controller: z.record(z.string(), z.unknown()).optional(),
};

const create = route('POST', '/accounts', createInput, (work, params) => {
  const id = newId('acct', 16);
  const list = (url: string) => ({ object: 'list' as const, data: [], has_more: false, url });
  const account: Stripe.Account = {
    id,
    object: 'account',
    business_profile: null,
    business_type: null,
    capabilities: {},
    charges_enabled: false,
    controller: { type: 'application', is_controller: true, requirement_collection: 'stripe' },
    country: params.country ?? 'US',
    created: work.nowS,
    default_currency: 'usd',
    details_submitted: false,
    email: null,
    external_accounts: list(`/v1/accounts/${id}/external_accounts`),
    future_requirements: requirementsOf(true),
    metadata: {},
    payouts_enabled: false,
    requirements: requirementsOf(false),
    settings: null,
    tos_acceptance: { date: null, ip: null, user_agent: null },
    type: params.type ?? 'none',
  };
  work.store.put('account', account);
  return applyFacts(work, account, params);
});

/** Takes over what was sent; with a bank account and accepted terms the set-up is complete without a page. */
function applyFacts(work: Work, before: Stripe.Account, params: Facts): Stripe.Account {
  const requested = Object.entries(params.capabilities ?? {}).flatMap(([name, { requested: wanted }]) => {
    const now = (before.capabilities as Record<string, string> | undefined)?.[name];
    return wanted ? [[name, now ?? (before.details_submitted ? 'active' : 'inactive')]] : [];
  });
  const account: Stripe.Account = {
    ...before,
    business_type: params.business_type ?? before.business_type ?? null,
    business_profile: params.business_profile
      ? ({ ...before.business_profile, ...params.business_profile } as Stripe.Account.BusinessProfile)
      : (before.business_profile ?? null),
    capabilities: { ...before.capabilities, ...(Object.fromEntries(requested) as object) },
    email: params.email ?? before.email,
    metadata: mergeMetadata(before.metadata ?? {}, params.metadata),
  };
  if (params.external_account) {
    const bank = params.external_account;
    const numbers = typeof bank === 'string' ? { account_number: '000123456789' } : bank;
    setBankAccount(work, account, {
      accountNumber: numbers.account_number,
      routingNumber: ('routing_number' in numbers ? numbers.routing_number : undefined) ?? '110000000',
      holder: ('account_holder_name' in numbers ? numbers.account_holder_name : undefined) ?? null,
    });
  }
  if (params.tos_acceptance?.date && params.external_account) {
    const accepted = {
      date: Number(params.tos_acceptance.date),
      ip: params.tos_acceptance.ip ?? null,
      user_agent: null,
    };
    return completeAccount(work, account, { tos_acceptance: accepted });
  }
  return saveAccount(work, before, account);
}

const linkInput = {
  account: text(),
  type: z.enum(['account_onboarding', 'account_update']),
  refresh_url: z.url(),
  return_url: z.url(),
  ...ignored('collect', 'collection_options'),
};

const createLink = route('POST', '/account_links', linkInput, (work, params): Stripe.AccountLink => {
  mustFind(work, 'account', params.account, 'account');
  const visit = work.store.put('visit', {
    id: newId('link', 32),
    account: params.account,
    returnUrl: params.return_url,
    refreshUrl: params.refresh_url,
    expiresAtS: work.nowS + LINK_LIFE_S,
    step: 'link',
  });
  const url = `${work.settings.publicUrl}/setup/${visit.id}`;
  return { object: 'account_link', created: work.nowS, expires_at: visit.expiresAtS, url };
});

/** An account asked for by the market, or by itself through the `Stripe-Account` header. */
function readAccount(work: Work, id: string): Stripe.Account {
  const account = work.owner === null || work.owner === id ? work.store.find('account', id) : undefined;
  if (!account) throw missing('account', id);
  return account;
}

function marketItself(
  work: Work,
): Pick<Stripe.Account, 'id' | 'object' | 'email' | 'charges_enabled' | 'payouts_enabled'> & object {
  const base = {
    details_submitted: true,
    country: 'US',
    default_currency: 'usd',
    type: 'standard',
    created: work.nowS,
  };
  return { id: 'acct_market', object: 'account', email: null, charges_enabled: true, payouts_enabled: true, ...base };
}

export const accountRoutes = [
  create,
  createLink,
  route('GET', '/accounts', paging, (work, page) => listPage(work, 'account', { url: '/v1/accounts', page })),
  route('GET', '/account', {}, (work) => (work.owner ? readAccount(work, work.owner) : marketItself(work))),
  route('GET', '/accounts/:id', {}, (work, _, { id = '' }) => readAccount(work, id)),
  route('POST', '/accounts/:id', facts, (work, params, { id = '' }) => applyFacts(work, readAccount(work, id), params)),
  route('GET', '/accounts/:id/capabilities', {}, (work, _, { id = '' }) => {
    const account = readAccount(work, id);
    const data = Object.keys(account.capabilities ?? {}).map((name) => capabilityOf(account, name));
    return { object: 'list', data, has_more: false, url: `/v1/accounts/${id}/capabilities` };
  }),
  route('GET', '/accounts/:id/capabilities/:name', {}, (work, _, { id = '', name = '' }) =>
    capabilityOf(readAccount(work, id), name),
  ),
  route('POST', '/accounts/:id/external_accounts', { external_account: bankInput }, (work, params, { id = '' }) => {
    const account = readAccount(work, id);
    const after = applyFacts(work, account, { external_account: params.external_account });
    const bank = work.store.all('bank_account').find(({ owner }) => owner === id)!.value;
    saveAccount(work, after, { ...after, external_accounts: { ...after.external_accounts!, data: [bank] } });
    return bank;
  }),
  route('POST', '/accounts/:id/login_links', {}, (work, _, { id = '' }): Stripe.LoginLink => {
    const account = readAccount(work, id);
    if (!account.details_submitted) throw refused('account_invalid', 'This account has not completed its set-up.');
    return { object: 'login_link', created: work.nowS, url: `${work.settings.publicUrl}/#${id}` };
  }),
];
