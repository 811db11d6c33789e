import type { EntityManager } from 'typeorm';

/**
 * The market's time: the database's clock at the moment of the call. Ask after taking a lock, never in the same
 * statement, so that whoever waited for the lock is judged by the time they got it.
 */
export async function marketNow(tx: EntityManager): Promise<Date> {
  const rows: { now: Date }[] = await tx.query('select market_now() as now');
  return rows[0]!.now;
}
