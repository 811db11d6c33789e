import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment, money } from '../../platform/columns.ts';

export type PaymentState = 'created' | 'open' | 'processing' | 'failed' | 'expired' | 'succeeded' | 'refunded';

/** One attempt of a buyer to pay into a deal's hold. `refunded`: it came when the deal could not take it, and goes back whole. */
@Entity({ name: 'payments' })
export class Payment {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'deal_id' }) dealId!: string;
  @Column({ type: 'integer' }) attempt!: number;
  @Column(money('amount_minor')) amountMinor!: number;
  @Column({ type: 'text' }) state!: PaymentState;
  @Column({ type: 'text', name: 'session_id', nullable: true }) sessionId!: string | null;
  @Column({ type: 'text', name: 'intent_id', nullable: true }) intentId!: string | null;
  @Column({ type: 'text', name: 'charge_id', nullable: true }) chargeId!: string | null;
  @Column(money('processor_fee_minor', { nullable: true })) processorFeeMinor!: number | null;
  @Column({ type: 'text', nullable: true }) url!: string | null;
  @Column({ type: 'text' }) message!: string;
  @Column(moment('created_at')) createdAt!: Date;
  @Column(moment('succeeded_at', { nullable: true })) succeededAt!: Date | null;
}

/** A seller's money on its way to their account at the processor. */
@Entity({ name: 'transfers' })
export class Transfer {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'settlement_id' }) settlementId!: string;
  @Column({ type: 'uuid', name: 'deal_id' }) dealId!: string;
  @Column({ type: 'uuid', name: 'member_id' }) memberId!: string;
  @Column(money('amount_minor')) amountMinor!: number;
  @Column({ type: 'text' }) state!: 'waiting' | 'queued' | 'sent' | 'failed';
  @Column({ type: 'text' }) reason!: string;
  @Column({ type: 'text', name: 'transfer_id', nullable: true }) transferId!: string | null;
  /** Idempotency key of the call in progress; a new one after an attempt that the processor recorded as failed. */
  @Column({ type: 'text' }) key!: string;
  @Column(moment('sent_at', { nullable: true })) sentAt!: Date | null;
}

/** A buyer's money on its way back. */
@Entity({ name: 'refunds' })
export class Refund {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'deal_id' }) dealId!: string;
  @Column({ type: 'uuid', name: 'payment_id' }) paymentId!: string;
  @Column(money('amount_minor')) amountMinor!: number;
  @Column({ type: 'text' }) why!: string;
  @Column({ type: 'text' }) state!: 'queued' | 'sent' | 'failed';
  @Column({ type: 'text' }) reason!: string;
  @Column({ type: 'text', name: 'refund_id', nullable: true }) refundId!: string | null;
  @Column({ type: 'text' }) key!: string;
  @Column(moment('sent_at', { nullable: true })) sentAt!: Date | null;
}
