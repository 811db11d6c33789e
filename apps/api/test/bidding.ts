import { randomUUID } from 'node:crypto';
import type { Caller } from './market.ts';

/** A bid as the buyer's page places it, each an attempt of its own unless told otherwise. */
export const placeBid = (caller: Caller, lotCode: string, ceilingMinor: number, attempt: string = randomUUID()) =>
  caller.call('POST /lots/:lotCode/bids', { params: { lotCode }, body: { ceilingMinor, attempt } });
