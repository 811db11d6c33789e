import type { Stripe } from 'stripe';
import { missing } from './errors.ts';
import { newId } from './ids.ts';
import type { Work } from './work.ts';

/** What happens when a test method is charged. */
export type Outcome =
  | { kind: 'succeeds'; atOnce?: boolean; then?: 'dispute' | 'inquiry'; refunds?: 'fail' | 'wait' }
  | { kind: 'declines'; code: string; declineCode?: string; message: string }
  | { kind: 'asks' }
  | { kind: 'debits' };

export interface TestMethod {
  name: string;
  /** The number a person types on the hosted page. */
  number: string;
  label: string;
  /** Offered on the hosted page only under “Rarer cases”. */
  isRare?: boolean;
  outcome: Outcome;
}

const declined = (code: string, message: string, declineCode?: string): Outcome => ({
  kind: 'declines',
  code,
  message,
  ...(declineCode && { declineCode }),
});
const card = (name: string, last: string, label: string, outcome: Outcome): TestMethod => ({
  name: `pm_card_${name}`,
  number: `4000 0000 0000 ${last}`,
  label,
  outcome,
});

const generic = 'Your card was declined.';

const usualMethods: TestMethod[] = [
  { ...card('visa', '', 'Payment succeeds', { kind: 'succeeds' }), number: '4242 4242 4242 4242' },
  card('chargeDeclined', '0002', 'Card declined', declined('card_declined', generic, 'generic_decline')),
  card(
    'chargeDeclinedInsufficientFunds',
    '9995',
    'Declined: not enough money on the account',
    declined('card_declined', 'Your card has insufficient funds.', 'insufficient_funds'),
  ),
  card('authenticationRequired', '3184', 'The bank asks the payer to approve', { kind: 'asks' }),
  card('bypassPending', '0077', 'Succeeds, funds available at once', { kind: 'succeeds', atOnce: true }),
  card('createDispute', '0259', 'Succeeds, then the payer disputes it', { kind: 'succeeds', then: 'dispute' }),
  {
    name: 'pm_usBankAccount_success',
    number: '110000000 / 000123456789',
    label: 'Bank debit (US): stays in processing until settled',
    outcome: { kind: 'debits' },
  },
];

const rareMethods: TestMethod[] = [
  card('chargeDeclinedExpiredCard', '0069', 'Expired card', declined('expired_card', 'Your card has expired.')),
  card(
    'chargeDeclinedIncorrectCvc',
    '0127',
    'Wrong security code',
    declined('incorrect_cvc', "Your card's security code is incorrect."),
  ),
  card(
    'chargeDeclinedProcessingError',
    '0119',
    'Processing error',
    declined('processing_error', 'An error occurred while processing your card. Try again in a little bit.'),
  ),
  card('chargeDeclinedLostCard', '9987', 'Lost card', declined('card_declined', generic, 'lost_card')),
  card('chargeDeclinedStolenCard', '9979', 'Stolen card', declined('card_declined', generic, 'stolen_card')),
  card('createDisputeInquiry', '1976', 'Succeeds, then an inquiry', { kind: 'succeeds', then: 'inquiry' }),
  card('refundFail', '5126', 'Succeeds, a refund fails later', { kind: 'succeeds', refunds: 'fail' }),
  card('pendingRefund', '7726', 'Succeeds, a refund waits first', { kind: 'succeeds', refunds: 'wait' }),
];

/** The documented test methods, in the order the hosted page shows them. */
export const testMethods = [...usualMethods, ...rareMethods.map((method) => ({ ...method, isRare: true }))];

/** Finds a test method by `pm_card_…`, `pm_card_visa_…`, `tok_…` or its number; undefined when there is none. */
export function testMethod(reference: string): TestMethod | undefined {
  const digits = reference.replace(/\D/g, '');
  const name = reference.replace(/^tok_/, 'pm_card_').replace(/^pm_card_visa_/, 'pm_card_');
  const isName = (method: TestMethod) => {
    const short = method.name.replace('chargeDeclined', '');
    return method.name === name || (short !== 'pm_card_' && short === name);
  };
  return testMethods.find(
    (method) => isName(method) || (digits.length === 16 && digits === method.number.replace(/\D/g, '')),
  );
}

/** The stored payment method for an id, or a new one for a test method's name; throws the 404 otherwise. */
export function toPaymentMethod(work: Work, reference: string): { method: Stripe.PaymentMethod; test: TestMethod } {
  const row = work.store.row('payment_method', reference);
  const test = testMethod(row?.hidden.test ?? reference);
  if (!test) throw missing('PaymentMethod', reference, 'payment_method');
  return { method: row?.value ?? createMethod(work, test), test };
}

/** The kind of method as the API names it. */
export function typeOf(test: TestMethod): 'card' | 'us_bank_account' {
  return test.outcome.kind === 'debits' ? 'us_bank_account' : 'card';
}

/** What a charge and a method say about the card or bank account behind them. */
export function detailsOf(test: TestMethod): Record<string, unknown> {
  const last4 = test.number.replace(/\D/g, '').slice(-4);
  const card = {
    brand: 'visa',
    country: 'US',
    exp_month: 12,
    exp_year: 2034,
    funding: 'credit',
    last4,
    network: 'visa',
  };
  if (typeOf(test) === 'card') return { type: 'card', card: { ...card, fingerprint: `card${last4}`, checks: null } };
  const bank = {
    account_holder_type: 'company',
    account_type: 'checking',
    bank_name: 'Test bank',
    fingerprint: `bank${last4}`,
  };
  return { type: 'us_bank_account', us_bank_account: { ...bank, last4, routing_number: '110000000' } };
}

function createMethod(work: Work, test: TestMethod): Stripe.PaymentMethod {
  const method = {
    id: newId('pm'),
    object: 'payment_method',
    allow_redisplay: 'unspecified',
    billing_details: { address: null, email: null, name: null, phone: null, tax_id: null },
    created: work.nowS,
    customer: null,
    customer_account: null,
    livemode: false,
    metadata: {},
    ...detailsOf(test),
  } as unknown as Stripe.PaymentMethod;
  return work.store.put('payment_method', method, { owner: work.owner, hidden: { test: test.name } });
}
