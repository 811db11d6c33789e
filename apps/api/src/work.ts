import { setTimeout as sleep } from 'node:timers/promises';
import { closeLot, lapseUnderOffer, sweepLots } from './features/bids/close-lot.ts';
import { takePrices } from './features/prices/take-prices.ts';
import { mailLink } from './features/members/mail-tokens.ts';
import { mailKnownAddress } from './features/members/register.ts';
import { mailNotice } from './features/notices/mail-notice.ts';
import { runDeadline, sweepDeadlines } from './features/deals/deadlines.service.ts';
import { alarmOnDifference } from './features/ledger/ledger-check.ts';
import { applyEvent } from './features/payments/event-effects.ts';
import { pollEvents } from './features/payments/receive-event.ts';
import { expireCheckout, sendRefund } from './features/payments/send-refund.ts';
import { sendTransfer } from './features/payments/send-transfer.ts';
import { createInboxRunner } from './platform/inbox.ts';
import type { JobHandlers } from './platform/jobs.ts';
import { createOutboxRunner, type OutboxHandler } from './platform/outbox.ts';
import type { World } from './platform/world.ts';

/** What each kind of outbox item does, except `alarm`, which belongs to the job queue. */
export function outboxHandlers(world: World): Record<string, OutboxHandler> {
  return {
    'notice.mail': mailNotice(world),
    'link.mail': mailLink(world),
    'known-address.mail': mailKnownAddress(world),
    'transfer.create': sendTransfer(world),
    'refund.create': sendRefund(world),
    'checkout.expire': expireCheckout(world),
  };
}

/** What each job does when it rings. */
export function jobHandlers(world: World): JobHandlers {
  return {
    'lot.close': (lotId) => closeLot(world, lotId),
    'under-offer.lapse': (offerId) => lapseUnderOffer(world, offerId),
    'deal.deadline': (dealId) => runDeadline(world, dealId),
    sweep: async () => {
      await sweepLots(world);
      await sweepDeadlines(world);
    },
    'prices.take': () => takePrices(world),
    'payments.poll': () => pollEvents(world),
    'ledger.check': () => alarmOnDifference(world),
  };
}

export const createRunner = (world: World, extra: Record<string, OutboxHandler> = {}) =>
  createOutboxRunner(world.db, { ...outboxHandlers(world), ...extra }, (error, item) =>
    world.log.warn({ err: error, kind: item.kind, key: item.key, attempts: item.attempts }, 'outbox item failed'),
  );

/** Works off the processor's events. */
export const createInbox = (world: World) =>
  createInboxRunner(world.db, applyEvent(world), (error, event) =>
    world.log.warn({ err: error, kind: event.kind, eventId: event.eventId, attempts: event.attempts }, 'event failed'),
  );

/** Calls `step` again at once while it has work, and every `idleMs` otherwise, until stopped. */
export function loop(
  step: () => Promise<boolean>,
  { idleMs, onError }: { idleMs: number; onError: (error: unknown) => void },
) {
  const stopping = new AbortController();
  const run = async (): Promise<void> => {
    while (!stopping.signal.aborted) {
      const busy = await step().catch((error: unknown) => {
        onError(error);
        return false;
      });
      if (!busy) await sleep(idleMs, undefined, { signal: stopping.signal }).catch(() => {});
    }
  };
  const done = run();
  return {
    stop: async (): Promise<void> => {
      stopping.abort();
      await done;
    },
  };
}
