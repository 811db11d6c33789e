import type { On } from '../../platform/routes.ts';
import type { BidsService } from './bids.service.ts';

export function bidRoutes(on: On, bids: BidsService): void {
  on('POST /lots/:lotCode/bids', ({ params, body, actor }) => bids.place({ ...params, ...body, bidderId: actor.id }));
  on('POST /lots/:lotCode/take', ({ params, body, actor }) => bids.take({ ...params, ...body, buyerId: actor.id }));
  on('POST /lots/:lotCode/offer-answer', ({ params, body, actor }) =>
    bids.answerOffer({ ...params, ...body, buyerId: actor.id }),
  );
  on('GET /my/bids', ({ actor }) => bids.mine(actor.id));
  on('GET /my/terms', ({ actor }) => bids.terms(actor.id));
  on('PUT /my/terms', ({ actor, body }) => bids.keepTerms(actor.id, body));
}
