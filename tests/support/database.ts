import { Client } from 'pg';

/** Runs one statement as the owner of the tables: only to let time pass that no test can wait for. */
export async function asOwner(sql: string, values: unknown[] = []): Promise<void> {
  const client = new Client({ connectionString: process.env.E2E_DATABASE_URL });
  await client.connect();
  try {
    await client.query(sql, values);
  } finally {
    await client.end();
  }
}

/** Moves a lot's close into the past, as if its days were over. */
export const letLotClose = (lotCode: string): Promise<void> =>
  asOwner(
    `update lots set closes_at = market_now() - interval '30 seconds', latest_closes_at = market_now() - interval '30 seconds'
      where code = $1 and state = 'open'`,
    [lotCode],
  );
