import { Column, Entity, PrimaryColumn } from 'typeorm';
import { measure, moment } from '../../platform/columns.ts';

/** What the receiver's scale said, or the declared mass when nobody weighed in time. */
@Entity({ name: 'weigh_ins' })
export class WeighIn {
  @PrimaryColumn({ type: 'uuid', name: 'deal_id' }) dealId!: string;
  @Column(measure('gross_g')) grossG!: number;
  @Column(measure('tare_g')) tareG!: number;
  @Column(measure('net_g')) netG!: number;
  @Column(measure('scale_resolution_g')) scaleResolutionG!: number;
  @Column({ type: 'text', name: 'scale_serial' }) scaleSerial!: string;
  @Column({ type: 'text' }) note!: string;
  @Column({ type: 'uuid', name: 'photo_ids', array: true }) photoIds!: string[];
  @Column({ type: 'uuid', name: 'entered_by', nullable: true }) enteredBy!: string | null;
  @Column(moment('at')) at!: Date;
  @Column(moment('countersigned_at', { nullable: true })) countersignedAt!: Date | null;
  @Column(moment('claim_ends_at')) claimEndsAt!: Date;
  @Column(moment('countersign_ends_at')) countersignEndsAt!: Date;
}
