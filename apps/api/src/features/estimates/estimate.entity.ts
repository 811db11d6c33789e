import type { Estimate, LotInput } from '@lydite/valuation';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A lot's estimate as frozen at its listing: with its input, catalogue version, seed and draws anyone can compute it again. */
@Entity({ name: 'estimates' })
export class FrozenEstimate {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'lot_id' }) lotId!: string;
  @Column({ type: 'text', name: 'model_version' }) modelVersion!: string;
  @Column({ type: 'text', name: 'catalogue_version' }) catalogueVersion!: string;
  @Column({ type: 'integer' }) seed!: number;
  @Column({ type: 'integer' }) draws!: number;
  @Column({ type: 'bigint', name: 'reference_price_id' }) referencePriceId!: string;
  @Column({ type: 'jsonb' }) input!: LotInput;
  @Column({ type: 'jsonb' }) result!: Estimate;
  @Column({ type: 'double precision', name: 'gold_p10_g' }) goldP10G!: number;
  @Column({ type: 'double precision', name: 'gold_p50_g' }) goldP50G!: number;
  @Column({ type: 'double precision', name: 'gold_p90_g' }) goldP90G!: number;
  @Column({ type: 'double precision', name: 'grade_p50_g_per_t' }) gradeP50GPerT!: number;
}
