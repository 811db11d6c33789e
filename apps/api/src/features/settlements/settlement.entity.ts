import type { SettlementView } from '@lydite/contracts';
import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment, money } from '../../platform/columns.ts';

/** How a deal's hold was divided. One per deal, never changed. */
@Entity({ name: 'settlements' })
export class Settlement {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'uuid', name: 'deal_id' }) dealId!: string;
  @Column(money('value_minor')) valueMinor!: number;
  @Column(money('freight_minor')) freightMinor!: number;
  @Column(money('adjustment_minor')) adjustmentMinor!: number;
  @Column(money('buyer_fee_minor')) buyerFeeMinor!: number;
  @Column(money('seller_fee_minor')) sellerFeeMinor!: number;
  @Column(money('buyer_tax_minor')) buyerTaxMinor!: number;
  @Column(money('seller_tax_minor')) sellerTaxMinor!: number;
  @Column(money('paid_in_minor')) paidInMinor!: number;
  @Column(money('seller_gets_minor')) sellerGetsMinor!: number;
  @Column(money('refund_minor')) refundMinor!: number;
  @Column({ type: 'jsonb' }) steps!: Pick<SettlementView, 'sellerSteps' | 'buyerSteps'>;
  @Column({ type: 'text' }) hash!: string;
  @Column(moment('at')) at!: Date;
}
