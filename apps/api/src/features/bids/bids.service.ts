import type { BuyingTerms } from '@lydite/contracts';
import type { World } from '../../platform/world.ts';
import { answerOffer, type OfferAnswer } from './answer-offer.ts';
import { myBids } from './bids.queries.ts';
import { keepTerms, readTerms } from './buying-terms.ts';
import { placeBid, type BidOrder } from './place-bid.ts';
import { takeLot, type TakeOrder } from './take-lot.ts';

export const createBidsService = (world: Pick<World, 'db' | 'settings'>) => ({
  place: (order: BidOrder) => placeBid(world, order),
  take: (order: TakeOrder) => takeLot(world, order),
  answerOffer: (answer: OfferAnswer) => answerOffer(world, answer),
  mine: (memberId: string) => myBids(world.db.manager, memberId),
  terms: (memberId: string) => readTerms(world.db, memberId),
  keepTerms: (memberId: string, terms: BuyingTerms) => keepTerms(world.db, memberId, terms),
});
export type BidsService = ReturnType<typeof createBidsService>;
