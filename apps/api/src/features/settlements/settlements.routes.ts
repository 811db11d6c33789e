import type { On } from '../../platform/routes.ts';
import type { SettlementsService } from './settlements.service.ts';

export function settlementRoutes(on: On, settlements: SettlementsService): void {
  on('GET /deals/:dealCode/statement.pdf', ({ params, actor }) =>
    settlements.statement({ ...params, memberId: actor.id }),
  );
}
