import type { LineDraft, LotDraft, SaleForm } from '@lydite/contracts';
import { Column, Entity, PrimaryColumn } from 'typeorm';
import { measure, moment, money } from '../../platform/columns.ts';

export type LotState =
  'draft' | 'in_review' | 'open' | 'frozen' | 'deciding' | 'awarded' | 'offered' | 'unsold' | 'withdrawn' | 'deleted';

const optional = { nullable: true };

/** A lot from its first draft on. What is nullable here is filled when it is listed, and stays as it is from then on. */
@Entity({ name: 'lots' })
export class Lot {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'text' }) code!: string;
  @Column({ type: 'uuid', name: 'seller_id' }) sellerId!: string;
  @Column({ type: 'text' }) state!: LotState;
  /** Goes up with each save of the draft. */
  @Column({ type: 'integer' }) version!: number;
  @Column({ type: 'jsonb' }) draft!: LotDraft;
  @Column(moment('saved_at')) savedAt!: Date;
  @Column({ type: 'text', ...optional }) title!: string | null;
  @Column({ type: 'text', ...optional }) description!: string | null;
  @Column({ type: 'text', ...optional }) form!: SaleForm | null;
  @Column({ type: 'text', ...optional }) basis!: 'outright' | null;
  @Column({ type: 'text', ...optional }) place!: string | null;
  @Column({ type: 'text', ...optional }) country!: string | null;
  @Column({ type: 'text', name: 'delivery_way', ...optional }) deliveryWay!: 'seller-sends' | 'collection' | null;
  @Column({ type: 'text', name: 'delivery_hours', ...optional }) deliveryHours!: string | null;
  @Column(money('freight_minor', optional)) freightMinor!: number | null;
  @Column(money('start_minor', optional)) startMinor!: number | null;
  @Column(money('reserve_minor', optional)) reserveMinor!: number | null;
  @Column(money('asking_minor', optional)) askingMinor!: number | null;
  @Column(measure('mass_g', optional)) massG!: number | null;
  @Column({ type: 'text', name: 'mass_evidence', ...optional }) massEvidence!: 'stated' | 'weighed' | null;
  @Column({ type: 'integer', ...optional }) pieces!: number | null;
  @Column({ type: 'text', name: 'class_codes', array: true, ...optional }) classCodes!: string[] | null;
  @Column({ type: 'uuid', name: 'cover_photo_id', ...optional }) coverPhotoId!: string | null;
  @Column(moment('listed_at', optional)) listedAt!: Date | null;
  @Column(moment('first_closes_at', optional)) firstClosesAt!: Date | null;
  @Column(moment('closes_at', optional)) closesAt!: Date | null;
  @Column(moment('latest_closes_at', optional)) latestClosesAt!: Date | null;
  @Column(moment('closed_at', optional)) closedAt!: Date | null;
  @Column({ type: 'text', name: 'review_reason', ...optional }) reviewReason!: string | null;
  @Column(money('price_minor', optional)) priceMinor!: number | null;
  @Column({ type: 'uuid', name: 'leader_id', ...optional }) leaderId!: string | null;
  @Column(money('leader_ceiling_minor', optional)) leaderCeilingMinor!: number | null;
  @Column({ type: 'integer' }) seq!: number;
  @Column({ type: 'integer' }) bidders!: number;
}

/** A line of a listed lot, as it was described at its listing. */
@Entity({ name: 'lot_lines' })
export class LotLine {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'lot_id' }) lotId!: string;
  @Column({ type: 'integer' }) position!: number;
  @Column({ type: 'text' }) label!: string;
  @Column({ type: 'text', name: 'class_code' }) classCode!: string;
  @Column(measure('mass_g', optional)) massG!: number | null;
  @Column({ type: 'integer', ...optional }) pieces!: number | null;
  @Column({ type: 'jsonb' }) input!: LineDraft;
}
