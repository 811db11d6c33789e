import type { CatalogueView } from '@lydite/contracts';
import type { Catalogue } from '@lydite/valuation';
import { AppError } from '../../platform/app-error.ts';
import type { World } from '../../platform/world.ts';
import { catalogueInForce, catalogueVersion } from './catalogue.reads.ts';

/** The catalogue in force, or the version that a frozen estimate names. @throws AppError catalogue.not_found */
export async function readCatalogue({ db }: Pick<World, 'db'>, version?: string): Promise<CatalogueView> {
  if (version === undefined) return toCatalogueView(await catalogueInForce(db.manager));
  const catalogue = await catalogueVersion(db.manager, version);
  if (!catalogue) throw new AppError('catalogue.not_found', `There is no catalogue ${version}.`);
  return toCatalogueView(catalogue);
}

const toCatalogueView = ({ version, classes }: Catalogue): CatalogueView => ({
  version,
  classes: classes.map((materialClass) => ({ ...materialClass })),
});
