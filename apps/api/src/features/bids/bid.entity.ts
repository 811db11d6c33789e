import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment, money } from '../../platform/columns.ts';

/** One accepted bid. Rows are only ever added; `seq` is gapless per lot. */
@Entity({ name: 'bids' })
export class Bid {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'lot_id' }) lotId!: string;
  @Column({ type: 'integer' }) seq!: number;
  @Column({ type: 'uuid', name: 'bidder_id' }) bidderId!: string;
  @Column(money('ceiling_minor')) ceilingMinor!: number;
  @Column(money('price_after_minor')) priceAfterMinor!: number;
  @Column({ type: 'uuid', name: 'leader_after' }) leaderAfter!: string;
  @Column(moment('closes_after')) closesAfter!: Date;
  @Column(moment('placed_at')) placedAt!: Date;
  @Column({ type: 'uuid' }) attempt!: string;
}

/** The lot offered to the under-bidder after the winner did not pay. */
@Entity({ name: 'under_offers' })
export class UnderOffer {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'lot_id' }) lotId!: string;
  @Column({ type: 'uuid', name: 'buyer_id' }) buyerId!: string;
  @Column(money('price_minor')) priceMinor!: number;
  @Column(moment('answer_by')) answerBy!: Date;
  @Column(moment('answered_at', { nullable: true })) answeredAt!: Date | null;
  @Column({ type: 'boolean', nullable: true }) accepted!: boolean | null;
}
