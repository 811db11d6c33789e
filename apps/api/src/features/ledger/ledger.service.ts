import type { World } from '../../platform/world.ts';
import { checkLedger } from './ledger-check.ts';

/** The books, as operators read them. */
export const createLedgerService = (world: Pick<World, 'db' | 'payments'>) => ({ check: () => checkLedger(world) });
export type LedgerService = ReturnType<typeof createLedgerService>;
