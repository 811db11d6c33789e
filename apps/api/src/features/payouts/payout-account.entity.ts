import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment, money } from '../../platform/columns.ts';

/** What we know of a seller's account at the processor; bank data stays there. */
@Entity({ name: 'payout_accounts' })
export class PayoutAccount {
  @PrimaryColumn({ type: 'uuid', name: 'member_id' }) memberId!: string;
  @Column({ type: 'text', name: 'account_id' }) accountId!: string;
  @Column({ type: 'boolean', name: 'transfers_active' }) transfersActive!: boolean;
  @Column({ type: 'boolean', name: 'payouts_enabled' }) payoutsEnabled!: boolean;
  @Column({ type: 'text', array: true }) requirements!: string[];
  @Column(moment('updated_at')) updatedAt!: Date;
}

/** A payout of the processor to a seller's bank, as last heard. */
@Entity({ name: 'payouts' })
export class Payout {
  @PrimaryColumn({ type: 'text' }) id!: string;
  @Column({ type: 'text', name: 'account_id' }) accountId!: string;
  @Column(money('amount_minor')) amountMinor!: number;
  @Column({ type: 'text' }) state!: PayoutState;
  @Column(moment('at')) at!: Date;
}

export type PayoutState = 'pending' | 'in_transit' | 'paid' | 'failed' | 'cancelled';
