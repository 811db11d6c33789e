import type { TestProject } from 'vitest/node';
import { openCluster, startCluster } from '../../../scripts/postgres/cluster.mjs';
import { databaseUrls, dropDatabase, ensureDatabase } from '../../../scripts/postgres/database.mjs';
import { createOwnerSource } from '../src/data-source.ts';
import { ensureReferenceData } from '../src/seeds/reference-data.ts';

export interface TestDatabase {
  adminUrl: string;
  appUrl: string;
  ownerUrl: string;
  template: string;
}

declare module 'vitest' {
  interface ProvidedContext {
    database: TestDatabase;
  }
}

/** One migrated template database per run; each test file copies it (see `openMarket`). */
export default async function setup(project: TestProject): Promise<void> {
  const cluster = openCluster({ fast: true });
  await startCluster(cluster);
  const database = 'lydite_template';
  dropDatabase({ cluster, database });
  ensureDatabase({ cluster, database });
  const urls = databaseUrls({ cluster, database });
  const owner = await createOwnerSource(urls.DATABASE_OWNER_URL).initialize();
  await owner.runMigrations();
  await ensureReferenceData(owner);
  await owner.destroy();
  project.provide('database', {
    adminUrl: urls.ADMIN_DATABASE_URL,
    appUrl: urls.DATABASE_URL,
    ownerUrl: urls.DATABASE_OWNER_URL,
    template: database,
  });
}
