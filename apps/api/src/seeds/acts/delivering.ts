import { onScale, type Picture } from '../lot-plan.ts';
import type { FirmKey } from '../people.ts';
import type { Stage } from '../stage.ts';
import type { Deal } from './buying.ts';

interface Step {
  by: FirmKey;
  deal: Deal;
}

const own = ({ people }: Stage, { by, deal }: Step) => ({ dealCode: deal.code, memberId: people[by].id });

export const dispatch = (stage: Stage, step: Step, trackingCode: string) =>
  stage.deliveries.dispatch({ ...own(stage, step), carrier: 'Wendlesea Carriers', trackingCode });
export const makeReady = (stage: Stage, step: Step) => stage.deliveries.markReady(own(stage, step));
export const receive = (stage: Stage, step: Step) => stage.deliveries.receive(own(stage, step));

interface Scale {
  /** Net mass found, in kilograms. */
  netKg: number;
  tareKg: number;
  resolutionG: number;
  serial: string;
  note?: string;
  /** What the photo shows: a sack on the scale, if nothing else. The ticket of the public scale names masses of its own. */
  picture?: 'memory-crate-scale' | 'sack-floor-scale' | 'weigh-ticket';
}

const pictureOf = ({ picture = 'sack-floor-scale', ...on }: Scale): Picture =>
  picture === 'weigh-ticket' ? { file: picture } : onScale(picture, on);

/** The buyer weighs in, with a photo of the scale or its ticket. */
export async function weighIn(stage: Stage, step: Step, scale: Scale) {
  const { netKg, tareKg, resolutionG, serial, note = '' } = scale;
  const tareG = Math.round(tareKg * 1000);
  const photo = await stage.album.hang({
    ...pictureOf(scale),
    slot: 'on-scale',
    description: scale.picture === 'weigh-ticket' ? 'Ticket of the public scale' : 'On the scale',
    ownerId: stage.people[step.by].id,
    of: { dealId: step.deal.id },
    position: 0,
  });
  return stage.deliveries.weighIn({
    ...own(stage, step),
    grossG: Math.round(netKg * 1000) + tareG,
    tareG,
    scaleResolutionG: resolutionG,
    scaleSerial: serial,
    note,
    photoIds: [photo.id],
  });
}

export const countersign = (stage: Stage, step: Step) => stage.deals.countersign(own(stage, step));
export const accept = (stage: Stage, step: Step) => stage.deals.accept(own(stage, step));
export const claimMass = (stage: Stage, step: Step) => stage.deals.claim(own(stage, step));
export const acceptClaim = (stage: Stage, step: Step) => stage.deals.acceptClaim(own(stage, step));
