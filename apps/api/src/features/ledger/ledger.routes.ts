import type { On } from '../../platform/routes.ts';
import type { LedgerService } from './ledger.service.ts';

export function ledgerRoutes(on: On, ledger: LedgerService): void {
  on('GET /desk/ledger', () => ledger.check());
}
