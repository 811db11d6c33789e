import type { Stripe } from 'stripe';
import { emit } from './events.ts';
import { newId } from './ids.ts';
import { schedule, type Work } from './work.ts';

type Account = Stripe.Account;

const stillDue = ['business_type', 'external_account', 'tos_acceptance.date', 'tos_acceptance.ip'];

/** The work of a connected account itself, so that its events carry its id. */
export function asAccount(work: Work, id: string): Work {
  return { ...work, owner: id };
}

/** What is still asked of an account: everything before its set-up, nothing after. */
export function requirementsOf(isComplete: boolean): Stripe.Account.Requirements {
  const due = isComplete ? [] : stillDue;
  return {
    alternatives: [],
    current_deadline: null,
    currently_due: due,
    disabled_reason: isComplete ? null : 'requirements.past_due',
    errors: [],
    eventually_due: due,
    past_due: due,
    pending_verification: [],
  };
}

export interface BankInput {
  accountNumber: string;
  routingNumber: string;
  holder: string | null;
}

/** Replaces the bank account payouts go to. */
export function setBankAccount(work: Work, account: Account, input: BankInput): Stripe.BankAccount {
  const old = work.store.all('bank_account').find(({ owner }) => owner === account.id);
  if (old) work.store.remove('bank_account', old.id);
  const bank: Stripe.BankAccount = {
    id: newId('ba'),
    object: 'bank_account',
    account: account.id,
    account_holder_name: input.holder,
    account_holder_type: 'company',
    account_type: null,
    available_payout_methods: ['standard'],
    bank_name: 'Test bank',
    country: account.country ?? 'US',
    currency: account.default_currency ?? 'usd',
    customer: null,
    default_for_currency: true,
    fingerprint: newId('bank').slice(5, 21),
    last4: input.accountNumber.slice(-4),
    metadata: {},
    routing_number: input.routingNumber,
    status: 'new',
  };
  work.store.put('bank_account', bank, { owner: account.id });
  emit(asAccount(work, account.id), 'account.external_account.created', bank);
  return bank;
}

/** Completes an account: its capabilities turn active, payouts are on, and waiting money is paid out. */
export function completeAccount(work: Work, account: Account, more: Partial<Account> = {}): Account {
  const bank = work.store.all('bank_account').find(({ owner }) => owner === account.id)?.value;
  const active = Object.keys(account.capabilities ?? {}).map((name) => [name, 'active'] as const);
  const done: Account = {
    ...account,
    ...more,
    capabilities: Object.fromEntries(active),
    charges_enabled: 'card_payments' in (account.capabilities ?? {}),
    details_submitted: true,
    payouts_enabled: bank !== undefined,
    requirements: requirementsOf(true),
    future_requirements: requirementsOf(true),
    external_accounts: { ...account.external_accounts!, data: bank ? [bank] : [] },
  };
  saveAccount(work, account, done);
  schedule(work, 'pay-out', account.id, work.settings.payoutDelayS);
  return done;
}

/** Writes an account and tells its Connect endpoints what changed. */
export function saveAccount(work: Work, before: Account, after: Account): Account {
  work.store.put('account', after);
  const changed = (Object.keys(after) as (keyof Account)[]).filter(
    (key) => JSON.stringify(before[key]) !== JSON.stringify(after[key]),
  );
  const previous = Object.fromEntries(changed.map((key) => [key, before[key]]));
  emit(asAccount(work, after.id), 'account.updated', after, previous);
  for (const [name, status] of Object.entries(after.capabilities ?? {})) {
    const was = (before.capabilities as Record<string, string> | undefined)?.[name];
    if (was !== undefined && was !== status)
      emit(asAccount(work, after.id), 'capability.updated', capabilityOf(after, name));
  }
  return after;
}

/** One capability of an account in its API form. */
export function capabilityOf(account: Account, name: string): Stripe.Capability {
  const status = (account.capabilities as Record<string, Stripe.Capability.Status> | undefined)?.[name];
  const requirements = requirementsOf(status === 'active') as Stripe.Capability.Requirements;
  return {
    id: name,
    object: 'capability',
    account: account.id,
    requested: status !== undefined,
    requested_at: status === undefined ? null : (account.created ?? null),
    requirements,
    status: status ?? 'unrequested',
  };
}
