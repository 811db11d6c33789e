import type { On } from '../../platform/routes.ts';
import type { DeskService } from './desk.service.ts';

export function deskRoutes(on: On, desk: DeskService): void {
  on('GET /desk/members', ({ query }) => desk.members(query));
  on('POST /desk/members/:memberId/verify', ({ actor, params, body }) => desk.verify(actor, { ...params, ...body }));
  on('GET /desk/lots', ({ query }) => desk.lots(query));
  on('GET /desk/deals', ({ query }) => desk.deals(query));
  on('POST /desk/deals/:dealCode/approve', ({ actor, params }) => desk.approve(actor, params.dealCode));
  on('GET /desk/outbox', ({ query }) => desk.outbox(query));
  on('GET /desk/jobs', () => desk.jobs());
}
