import type { World } from '../../platform/world.ts';
import { openPayment, type Press } from './open-payment.ts';
import { receiveEvent, type SignedEvent } from './receive-event.ts';

/** Paying into a hold, and hearing from the processor. */
export const createPaymentsService = (world: Pick<World, 'db' | 'payments' | 'settings' | 'log'>) => ({
  open: (press: Press) => openPayment(world, press),
  receive: (event: SignedEvent) => receiveEvent(world, event),
});
export type PaymentsService = ReturnType<typeof createPaymentsService>;
