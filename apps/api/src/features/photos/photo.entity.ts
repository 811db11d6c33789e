import type { PhotoSlot } from '@lydite/contracts';
import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment } from '../../platform/columns.ts';

/** A re-encoded photo of a lot or of a deal. Its files are kept under its id. */
@Entity({ name: 'photos' })
export class Photo {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'owner_id' }) ownerId!: string;
  @Column({ type: 'uuid', name: 'lot_id', nullable: true }) lotId!: string | null;
  @Column({ type: 'uuid', name: 'deal_id', nullable: true }) dealId!: string | null;
  @Column({ type: 'text' }) slot!: PhotoSlot;
  @Column({ type: 'integer' }) position!: number;
  @Column({ type: 'text' }) description!: string;
  @Column({ type: 'integer' }) width!: number;
  @Column({ type: 'integer' }) height!: number;
  /** Dominant colour as `#rrggbb`, shown while the picture loads. */
  @Column({ type: 'text' }) colour!: string;
  @Column(moment('removed_at', { nullable: true })) removedAt!: Date | null;
}
