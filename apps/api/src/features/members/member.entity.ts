import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment, money } from '../../platform/columns.ts';

@Entity({ name: 'members' })
export class Member {
  @PrimaryColumn({ type: 'uuid' }) id!: string;
  @Column({ type: 'text' }) email!: string;
  @Column({ type: 'text', name: 'password_hash' }) passwordHash!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'text' }) place!: string;
  @Column(moment('email_confirmed_at', { nullable: true })) emailConfirmedAt!: Date | null;
  @Column(moment('verified_at', { nullable: true })) verifiedAt!: Date | null;
  @Column(money('limit_minor', { insert: false })) limitMinor!: number;
  @Column(moment('suspended_at', { nullable: true })) suspendedAt!: Date | null;
}
