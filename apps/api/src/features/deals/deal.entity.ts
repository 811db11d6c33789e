import type { DealState } from '@lydite/contracts';
import { Column, Entity, PrimaryColumn } from 'typeorm';
import { measure, moment, money } from '../../platform/columns.ts';
import type { DueKind } from './deadlines.rules.ts';

/** The contract that follows an award. Its state moves only through deal-steps.commands.ts. */
@Entity({ name: 'deals' })
export class Deal {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'text' }) code!: string;
  @Column({ type: 'uuid', name: 'lot_id' }) lotId!: string;
  @Column({ type: 'uuid', name: 'seller_id' }) sellerId!: string;
  @Column({ type: 'uuid', name: 'buyer_id' }) buyerId!: string;
  @Column({ type: 'text' }) state!: DealState;
  @Column(moment('frozen_at', { nullable: true })) frozenAt!: Date | null;
  @Column(money('price_minor')) priceMinor!: number;
  @Column(money('freight_minor')) freightMinor!: number;
  @Column({ type: 'integer', name: 'buyer_fee_bp' }) buyerFeeBp!: number;
  @Column({ type: 'integer', name: 'seller_fee_bp' }) sellerFeeBp!: number;
  @Column({ type: 'integer', name: 'buyer_tax_bp' }) buyerTaxBp!: number;
  @Column({ type: 'integer', name: 'seller_tax_bp' }) sellerTaxBp!: number;
  @Column(money('hold_minor')) holdMinor!: number;
  @Column({ type: 'text', name: 'due_kind', nullable: true }) dueKind!: DueKind | null;
  @Column(moment('due_from', { nullable: true })) dueFrom!: Date | null;
  @Column(moment('due_at', { nullable: true })) dueAt!: Date | null;
  @Column(moment('due_paused_at', { nullable: true })) duePausedAt!: Date | null;
  @Column(moment('awarded_at')) awardedAt!: Date;
  @Column(moment('paid_at', { nullable: true })) paidAt!: Date | null;
  @Column({ type: 'text', nullable: true }) carrier!: string | null;
  @Column({ type: 'text', name: 'tracking_code', nullable: true }) trackingCode!: string | null;
  @Column(moment('dispatched_at', { nullable: true })) dispatchedAt!: Date | null;
  @Column(moment('received_at', { nullable: true })) receivedAt!: Date | null;
  @Column(moment('weighed_in_at', { nullable: true })) weighedInAt!: Date | null;
  @Column(moment('accepted_at', { nullable: true })) acceptedAt!: Date | null;
  @Column(moment('settled_at', { nullable: true })) settledAt!: Date | null;
  @Column(moment('ended_at', { nullable: true })) endedAt!: Date | null;
  @Column(moment('updated_at')) updatedAt!: Date;
}

/** What happened, when and by whom; both sides see all of it. Rows are only ever added. */
@Entity({ name: 'deal_events' })
export class DealEvent {
  @PrimaryColumn({ type: 'bigint', generated: 'identity' }) id!: string;
  @Column({ type: 'uuid', name: 'deal_id' }) dealId!: string;
  @Column(moment('at')) at!: Date;
  @Column({ type: 'text' }) actor!: 'seller' | 'buyer' | 'market' | 'desk';
  @Column({ type: 'uuid', name: 'actor_id', nullable: true }) actorId!: string | null;
  @Column({ type: 'text' }) kind!: string;
  @Column({ type: 'jsonb' }) detail!: Record<string, string | number>;
}

/** The buyer's claim that the mass is short. */
@Entity({ name: 'claims' })
export class Claim {
  @PrimaryColumn({ type: 'uuid', name: 'deal_id' }) dealId!: string;
  @Column({ type: 'text' }) ground!: 'mass';
  @Column(measure('declared_g')) declaredG!: number;
  @Column(measure('found_g')) foundG!: number;
  @Column(money('adjustment_minor')) adjustmentMinor!: number;
  @Column(moment('at')) at!: Date;
  @Column(moment('accepted_at', { nullable: true })) acceptedAt!: Date | null;
}
