import { catalogue20261 } from '@lydite/valuation';
import type { EntityManager } from 'typeorm';

/** Puts the first catalogue in, and in force where none is yet. A version that is there already stays as it is. */
export async function ensureCatalogue(tx: EntityManager): Promise<void> {
  await tx.query(
    `insert into catalogue_versions (version, content, in_force)
     values ($1, $2, not exists (select from catalogue_versions where in_force)) on conflict (version) do nothing`,
    [catalogue20261.version, JSON.stringify(catalogue20261)],
  );
}
