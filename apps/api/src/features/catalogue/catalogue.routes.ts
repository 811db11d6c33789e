import type { CatalogueView } from '@lydite/contracts';
import type { Catalogue } from '@lydite/valuation';
import { AppError } from '../../platform/app-error.ts';
import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { catalogueInForce, catalogueVersion } from './catalogue.reads.ts';

const toCatalogueView = ({ version, classes }: Catalogue): CatalogueView => ({
  version,
  classes: classes.map((materialClass) => ({ ...materialClass })),
});

export function catalogueRoutes(on: On, { db }: Pick<World, 'db'>): void {
  on('GET /catalogue', async () => toCatalogueView(await catalogueInForce(db.manager)));
  on('GET /catalogue/:version', async ({ params: { version } }) => {
    const catalogue = await catalogueVersion(db.manager, version);
    if (!catalogue) throw new AppError('catalogue.not_found', `There is no catalogue ${version}.`);
    return toCatalogueView(catalogue);
  });
}
