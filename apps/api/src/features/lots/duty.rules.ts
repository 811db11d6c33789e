export interface DutyFacts {
  state: string;
  dealState: string | null;
  dealDueAt: Date | null;
  frozen: boolean;
  deliveryWay: 'seller-sends' | 'collection' | null;
  /** End of the seller's time to countersign the weigh-in; null once it is countersigned or over. */
  countersignBy: Date | null;
  /** The seller's share waits for their payout account, which is not the desk's to set up. */
  payoutWaits: boolean;
}

export interface Duty {
  duty: string;
  by: Date | null;
}

const nothing: Duty = { duty: '', by: null };

/** The next thing a lot asks of its seller, and until when; empty words when it is somebody else's turn. */
export function dutyOf(facts: DutyFacts): Duty {
  const { state, dealState, dealDueAt, frozen, deliveryWay, countersignBy, payoutWaits } = facts;
  if (state === 'draft') return { duty: 'Finish and list it', by: null };
  if (payoutWaits) return { duty: 'Set up your payout account', by: null };
  if (frozen) return nothing;
  if (dealState === 'held')
    return { duty: deliveryWay === 'collection' ? 'Make it ready for collection' : 'Send it', by: dealDueAt };
  if (dealState === 'weighed_in' && countersignBy) return { duty: 'Check the weigh-in', by: countersignBy };
  if (dealState === 'in_dispute') return { duty: 'Answer the claim', by: dealDueAt };
  return nothing;
}
