import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { checkLedger } from './ledger-check.ts';

export function ledgerRoutes(on: On, world: World): void {
  on('GET /desk/ledger', () => checkLedger(world));
}
