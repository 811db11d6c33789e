import { z } from 'zod';
import { amountMinor, dealCode, isoTime, nothing, pageNumber, page, role } from './common.ts';
import { endpoints } from './endpoint.ts';

const query = z.strictObject({ page: pageNumber, q: z.string().trim().max(80).optional() });

export const deskMember = z
  .object({
    id: z.uuid(),
    name: z.string(),
    email: z.string(),
    place: z.string(),
    roles: z.array(role),
    emailConfirmed: z.boolean(),
    verifiedAt: isoTime.nullable(),
    limitMinor: amountMinor,
    payoutAccount: z.string(),
    createdAt: isoTime,
  })
  .meta({ id: 'DeskMember' });
export type DeskMember = z.infer<typeof deskMember>;

export const deskLot = z
  .object({
    code: z.string(),
    title: z.string(),
    seller: z.string(),
    state: z.string(),
    form: z.string(),
    priceMinor: amountMinor.nullable(),
    bidders: z.int(),
    goldG: z.object({ p10: z.number(), p50: z.number(), p90: z.number() }).nullable(),
    closesAt: isoTime.nullable(),
    dealCode: z.string().nullable(),
  })
  .meta({ id: 'DeskLot' });
export type DeskLot = z.infer<typeof deskLot>;

export const deskDeal = z
  .object({
    code: z.string(),
    lotCode: z.string(),
    title: z.string(),
    seller: z.string(),
    buyer: z.string(),
    state: z.string(),
    frozen: z.boolean(),
    holdMinor: amountMinor,
    heldMinor: amountMinor,
    dueAt: isoTime.nullable(),
    dueWhat: z.string(),
    events: z.array(z.object({ at: isoTime, by: z.string(), title: z.string() })),
  })
  .meta({ id: 'DeskDeal' });
export type DeskDeal = z.infer<typeof deskDeal>;

export const outboxRow = z
  .object({
    id: z.string(),
    kind: z.string(),
    key: z.string(),
    state: z.string(),
    attempts: z.int(),
    lastError: z.string().nullable(),
    createdAt: isoTime,
    nextAt: isoTime.nullable(),
    doneAt: isoTime.nullable(),
  })
  .meta({ id: 'OutboxRow' });
export type OutboxRow = z.infer<typeof outboxRow>;

export const jobRow = z
  .object({
    queue: z.string(),
    waiting: z.int(),
    active: z.int(),
    failed: z.int(),
    oldestWaitingAt: isoTime.nullable(),
  })
  .meta({ id: 'JobRow' });
export type JobRow = z.infer<typeof jobRow>;

export const ledgerReport = z
  .object({
    checkedAt: isoTime,
    balanced: z.boolean(),
    checks: z.array(z.object({ name: z.string(), ok: z.boolean(), detail: z.string() })),
    accounts: z.array(z.object({ code: z.string(), side: z.enum(['debit', 'credit']), balanceMinor: z.int() })),
    processor: z.object({ availableMinor: z.int(), pendingMinor: z.int() }).nullable(),
  })
  .meta({ id: 'LedgerReport' });
export type LedgerReport = z.infer<typeof ledgerReport>;

const operator = ['operator'] as const;

export const deskEndpoints = endpoints({
  'GET /desk/members': { summary: 'Members', access: operator, query, response: page(deskMember) },
  'POST /desk/members/:memberId/verify': {
    summary: 'Record that identity and licence papers were seen; sets the buying limit',
    access: operator,
    fresh: true,
    params: z.object({ memberId: z.uuid() }),
    body: z.strictObject({
      limitMinor: amountMinor,
      reason: z.string().trim().min(3, 'Say which papers you saw.').max(300),
    }),
    response: deskMember,
  },
  'GET /desk/lots': { summary: 'All lots', access: operator, query, response: page(deskLot) },
  'GET /desk/deals': { summary: 'All deals', access: operator, query, response: page(deskDeal) },
  'POST /desk/deals/:dealCode/approve': {
    summary: 'Approve a large settlement that waits for it',
    access: operator,
    fresh: true,
    params: z.object({ dealCode }),
    body: nothing,
    response: 'none',
    status: 204,
  },
  'GET /desk/outbox': { summary: 'Outside effects, newest first', access: operator, query, response: page(outboxRow) },
  'GET /desk/jobs': { summary: 'Job queues', access: operator, response: z.array(jobRow) },
  'GET /desk/ledger': { summary: 'The ledger check, run now', access: operator, response: ledgerReport },
});
