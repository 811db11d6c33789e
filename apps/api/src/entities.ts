import { Bid, UnderOffer } from './features/bids/bid.entity.ts';
import { Member } from './features/members/member.entity.ts';
import { CatalogueVersion } from './features/catalogue/catalogue-version.entity.ts';
import { Claim, Deal, DealEvent } from './features/deals/deal.entity.ts';
import { WeighIn } from './features/deliveries/weigh-in.entity.ts';
import { FrozenEstimate } from './features/estimates/estimate.entity.ts';
import { Lot, LotLine } from './features/lots/lot.entity.ts';
import { Payment, Refund, Transfer } from './features/payments/payment.entity.ts';
import { PayoutAccount, Payout } from './features/payouts/payout-account.entity.ts';
import { Photo } from './features/photos/photo.entity.ts';
import { ReferencePriceRow } from './features/prices/reference-price.entity.ts';
import { Settlement } from './features/settlements/settlement.entity.ts';

/** Every entity class, by feature. Features add theirs here. */
export const entities: (new () => object)[] = [
  Bid,
  UnderOffer,
  CatalogueVersion,
  FrozenEstimate,
  Lot,
  LotLine,
  Member,
  Payment,
  Refund,
  Transfer,
  PayoutAccount,
  Payout,
  Photo,
  ReferencePriceRow,
  Claim,
  Deal,
  DealEvent,
  WeighIn,
  Settlement,
];
