import type { On } from '../../platform/routes.ts';
import type { World } from '../../platform/world.ts';
import { answerOffer } from './answer-offer.ts';
import { myBids } from './bids.queries.ts';
import { keepTerms, readTerms } from './buying-terms.ts';
import { placeBid } from './place-bid.ts';
import { takeLot } from './take-lot.ts';

export function bidRoutes(on: On, world: World): void {
  on('POST /lots/:lotCode/bids', ({ params, body, actor }) =>
    placeBid(world, { ...params, ...body, bidderId: actor.id }),
  );
  on('POST /lots/:lotCode/take', ({ params, body, actor }) =>
    takeLot(world, { ...params, ...body, buyerId: actor.id }),
  );
  on('POST /lots/:lotCode/offer-answer', ({ params, body, actor }) =>
    answerOffer(world, { ...params, ...body, buyerId: actor.id }),
  );
  on('GET /my/bids', ({ actor }) => myBids(world.db.manager, actor.id));
  on('GET /my/terms', ({ actor }) => readTerms(world.db, actor.id));
  on('PUT /my/terms', ({ actor, body }) => keepTerms(world.db, actor.id, body));
}
