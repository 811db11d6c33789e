import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { inject } from 'vitest';

async function asAdmin(sql: string): Promise<void> {
  const client = new pg.Client({ connectionString: inject('database').adminUrl });
  await client.connect();
  try {
    await client.query(sql);
  } finally {
    await client.end();
  }
}

const withName = (url: string, name: string): string =>
  Object.assign(new URL(url), { pathname: `/${name}` }).toString();

/** A copy of the migrated template for one test file. Dropped by `drop`. */
export async function copyDatabase() {
  const { template, appUrl, ownerUrl, adminUrl } = inject('database');
  const name = `lydite_t_${randomBytes(6).toString('hex')}`;
  await asAdmin(`create database ${name} template ${template} strategy file_copy owner lydite_owner`);
  return {
    appUrl: withName(appUrl, name),
    ownerUrl: withName(ownerUrl, name),
    adminUrl: withName(adminUrl, name),
    drop: () => asAdmin(`drop database if exists ${name} with (force)`),
  };
}
