import { expect, test } from 'vitest';
import { dutyOf, type DutyFacts } from './duty.rules.ts';

const at = new Date('2026-03-05T17:00:00Z');
const facts = (some: Partial<DutyFacts>): DutyFacts => ({
  state: 'awarded',
  dealState: null,
  dealDueAt: at,
  frozen: false,
  deliveryWay: 'seller-sends',
  countersignBy: null,
  payoutWaits: false,
  ...some,
});

test.each<[string, Partial<DutyFacts>, string, Date | null]>([
  ['a draft', { state: 'draft' }, 'Finish and list it', null],
  ['an open lot', { state: 'open' }, '', null],
  ['an unpaid award', { dealState: 'awaiting_payment' }, '', null],
  ['a paid deal that is sent', { dealState: 'held' }, 'Send it', at],
  [
    'a paid deal that is collected',
    { dealState: 'held', deliveryWay: 'collection' },
    'Make it ready for collection',
    at,
  ],
  ['a frozen deal', { dealState: 'held', frozen: true }, '', null],
  ['a lot on its way', { dealState: 'dispatched' }, '', null],
  ['a weigh-in to check', { dealState: 'weighed_in', countersignBy: at }, 'Check the weigh-in', at],
  ['a countersigned weigh-in', { dealState: 'weighed_in' }, '', null],
  ['a claim', { dealState: 'in_dispute' }, 'Answer the claim', at],
  ['a settled deal', { dealState: 'settled' }, '', null],
  ['a payout without an account', { dealState: 'settled', payoutWaits: true }, 'Set up your payout account', null],
])('%s', (_, some, duty, by) => expect(dutyOf(facts(some))).toEqual({ duty, by }));
