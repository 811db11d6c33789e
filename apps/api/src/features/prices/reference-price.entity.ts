import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import { measure, moment } from '../../platform/columns.ts';

/** A published gold price. Rows are only ever added. */
@Entity({ name: 'reference_prices' })
export class ReferencePriceRow {
  @PrimaryGeneratedColumn('identity', { type: 'bigint' }) id!: string;
  @Column(moment('at')) at!: Date;
  @Column({ type: 'text' }) source!: string;
  @Column({ type: 'text' }) currency!: string;
  @Column(measure('per_gram_minor')) perGramMinor!: number;
}
