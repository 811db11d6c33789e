import type { ChainStep, DealView } from '@lydite/contracts';
import { massWords, type Words } from '../../platform/words.ts';
import type { WeighInFacts } from '../deliveries/deliveries.reads.ts';
import { byWords, type Viewer } from './deal-events.presenter.ts';
import type { Deal } from './deal.entity.ts';
import { finalStates, type DealActor } from './deals.rules.ts';

interface ChainFacts {
  deal: Deal;
  way: DealView['delivery']['way'];
  weighIn: WeighInFacts | null;
  settlement: DealView['settlement'];
  viewer: Viewer;
  words: Words;
}

interface Link {
  key: string;
  title: string;
  note: string;
  at: Date | null;
  by: DealActor;
}

/** The chain of custody from award to payout, as both sides see it on one page. */
export function chainOf({ deal, way, weighIn, settlement, viewer, words }: ChainFacts): ChainStep[] {
  const { money } = words;
  const sentAt = settlement?.transfer?.at ?? null;
  const links: Link[] = [
    { key: 'award', title: 'Awarded', note: money(deal.priceMinor), at: deal.awardedAt, by: 'market' },
    { key: 'hold', title: 'Paid into hold', note: money(deal.holdMinor), at: deal.paidAt, by: 'buyer' },
    {
      key: 'dispatch',
      title: way === 'collection' ? 'Ready for collection' : 'Dispatched',
      note: deal.carrier ? `${deal.carrier}, ${deal.trackingCode}` : '',
      at: deal.dispatchedAt,
      by: 'seller',
    },
    { key: 'receipt', title: 'Received', note: '', at: deal.receivedAt, by: 'buyer' },
    {
      key: 'weigh_in',
      title: 'Weighed in',
      note: weighIn ? weighInNote(weighIn) : '',
      at: deal.weighedInAt,
      by: weighIn?.weighed === false ? 'market' : 'buyer',
    },
    {
      key: 'settlement',
      title: 'Settled',
      note: settlement ? `Value ${money(settlement.valueMinor)}` : '',
      at: deal.settledAt,
      by: 'market',
    },
    {
      key: 'payout',
      title: 'Hold released',
      note: settlement ? `${money(settlement.sellerGetsMinor)} to the seller` : '',
      at: sentAt ? new Date(sentAt) : null,
      by: 'market',
    },
  ];
  return lastLinks(links, deal).map((link, index, all) => toStep(link, isCurrent(all, index), viewer));
}

const weighInNote = ({ netG, weighed, countersignedAt }: WeighInFacts): string => {
  if (!weighed) return `${massWords(netG)}, as declared`;
  return `${massWords(netG)} net${countersignedAt ? ', countersigned' : ''}`;
};

/** A deal that was cancelled or refunded ends with that, and nothing is left to come. */
function lastLinks(links: Link[], deal: Deal): Link[] {
  if (!finalStates.includes(deal.state) || deal.state === 'settled') return links;
  const title = deal.state === 'cancelled' ? 'Cancelled' : 'Refunded';
  const done = links.filter(({ at, key }) => at !== null && !(key === 'hold' && at > deal.endedAt!));
  return [
    ...done,
    {
      key: deal.state,
      title,
      note: deal.paidAt ? 'All of the hold goes back' : 'Not paid in time',
      at: deal.endedAt,
      by: 'market',
    },
  ];
}

const isCurrent = (links: Link[], index: number): boolean => links.findIndex(({ at }) => at === null) === index;

const toStep = ({ key, title, note, at, by }: Link, current: boolean, viewer: Viewer): ChainStep => ({
  key,
  title,
  note,
  state: at ? 'done' : current ? 'now' : 'todo',
  at: at?.toISOString() ?? null,
  by: at ? byWords(by, viewer) : null,
});
