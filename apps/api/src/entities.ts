import { Bid, UnderOffer } from './features/bids/bid.entity.ts';

/** Every entity class, by feature. Features add theirs here. */
export const entities: (new () => object)[] = [Bid, UnderOffer];
