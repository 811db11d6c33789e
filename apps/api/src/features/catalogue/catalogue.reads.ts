import type { Catalogue } from '@lydite/valuation';
import type { EntityManager } from 'typeorm';
import { CatalogueVersion } from './catalogue-version.entity.ts';

/** The catalogue that new estimates use. @throws when the reference data was never put in */
export async function catalogueInForce(tx: EntityManager): Promise<Catalogue> {
  const row = await tx.findOneByOrFail(CatalogueVersion, { inForce: true });
  return row.content;
}

/** A version of the catalogue as frozen estimates name it; null when there is none of that name. */
export async function catalogueVersion(tx: EntityManager, version: string): Promise<Catalogue | null> {
  const row = await tx.findOneBy(CatalogueVersion, { version });
  return row?.content ?? null;
}
