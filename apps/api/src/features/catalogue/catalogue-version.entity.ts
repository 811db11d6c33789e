import type { Catalogue } from '@lydite/valuation';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A published catalogue of material classes. Its content never changes; a correction is a new version. */
@Entity({ name: 'catalogue_versions' })
export class CatalogueVersion {
  @PrimaryColumn({ type: 'text' }) version!: string;
  @Column({ type: 'jsonb' }) content!: Catalogue;
  @Column({ type: 'boolean', name: 'in_force' }) inForce!: boolean;
}
