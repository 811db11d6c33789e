import { setTimeout as sleep } from 'node:timers/promises';
import type { DataSource, EntityManager } from 'typeorm';

const tries = 5;
/** Serialization failure and deadlock: the whole transaction may simply run again. */
const retryable = new Set(['40001', '40P01']);

/** PostgreSQL's error code of a failed query or COMMIT, or undefined for any other error. */
export function sqlState(error: unknown): string | undefined {
  const { driverError, code } = error as { driverError?: { code?: string }; code?: string };
  return driverError?.code ?? code;
}

/** Name of the constraint a failed query ran into. */
export const violatedConstraint = (error: unknown): string | undefined =>
  (error as { driverError?: { constraint?: string } }).driverError?.constraint;

/**
 * Runs `work` in one transaction, again from the start when the database asks for it. `work` must do nothing
 * that a rollback can't undo: outside effects go through the outbox.
 */
export async function inTransaction<T>(
  db: DataSource,
  work: (tx: EntityManager) => Promise<T>,
  { isolation = 'READ COMMITTED' as 'READ COMMITTED' | 'SERIALIZABLE' } = {},
): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await db.transaction(isolation, work);
    } catch (error) {
      if (!retryable.has(sqlState(error) ?? '') || attempt >= tries) throw error;
      await sleep(Math.random() * 20 * 2 ** attempt);
    }
  }
}
