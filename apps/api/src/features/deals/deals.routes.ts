import type { On } from '../../platform/routes.ts';
import type { DealsService } from './deals.service.ts';

export function dealRoutes(on: On, deals: DealsService): void {
  on('GET /my/deals', ({ query, actor }) => deals.list({ memberId: actor.id, side: query.side }));
  on('GET /deals/:dealCode', ({ params, actor }) => deals.view({ ...params, memberId: actor.id }));
  on('POST /deals/:dealCode/accept', ({ params, actor }) => deals.accept({ ...params, memberId: actor.id }));
  on('POST /deals/:dealCode/countersign', ({ params, actor }) => deals.countersign({ ...params, memberId: actor.id }));
  on('POST /deals/:dealCode/claim', ({ params, actor }) => deals.claim({ ...params, memberId: actor.id }));
  on('POST /deals/:dealCode/accept-claim', ({ params, actor }) => deals.acceptClaim({ ...params, memberId: actor.id }));
  on('POST /deals/:dealCode/cancel', ({ params, actor }) => deals.cancel({ ...params, memberId: actor.id }));
}
