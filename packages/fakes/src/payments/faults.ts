import type { Fault } from './kinds.ts';
import { requestFaults, webhookFaults } from './kinds.ts';
import type { Store } from './store.ts';

const isOneOf = (kinds: readonly string[], fault: Fault) => kinds.includes(fault.kind);

/** The first planned fault for this request, used up by one. `path` of a fault is a prefix. */
export function takeFault(store: Store, request: { method: string; path: string }): Fault | undefined {
  return take(store, (fault) => {
    const fitsMethod = !fault.method || fault.method === request.method;
    return isOneOf(requestFaults, fault) && fitsMethod && (!fault.path || request.path.startsWith(fault.path));
  });
}

/** The first planned fault for an event of this type on its way out, used up by one. */
export function takeWebhookFault(store: Store, eventType: string): Fault | undefined {
  return take(store, (fault) => isOneOf(webhookFaults, fault) && (!fault.event || fault.event === eventType));
}

/** A planned failure of the next payout, used up by one. */
export function takePayoutFault(store: Store): Fault | undefined {
  return take(store, (fault) => fault.kind === 'payout_fail');
}

function take(store: Store, fits: (fault: Fault) => boolean): Fault | undefined {
  const fault = store.all('fault').find(({ value }) => fits(value))?.value;
  if (!fault) return undefined;
  if (fault.times > 1) store.put('fault', { ...fault, times: fault.times - 1 });
  else store.remove('fault', fault.id);
  return fault;
}
