import { z } from 'zod';

/** Every error code the API answers with, and its HTTP status. A code that is not listed here does not compile. */
export const errorStatus = {
  'request.invalid': 400,
  'request.unsupported': 415,
  'request.too_large': 413,
  'request.cross_site': 403,
  'request.too_many': 429,
  'route.not_found': 404,
  'session.required': 401,
  'session.expired': 401,
  'session.stale': 403,
  'session.wrong_credentials': 401,
  'session.email_unconfirmed': 403,
  'session.code_required': 401,
  'session.code_wrong': 401,
  'session.totp_missing': 403,
  'member.role_missing': 403,
  'member.email_taken': 409,
  'member.token_spent': 410,
  'member.password_weak': 400,
  'member.suspended': 403,
  'member.not_found': 404,
  'member.totp_state': 409,
  'lot.not_found': 404,
  'lot.changed': 409,
  'lot.wrong_state': 409,
  'lot.incomplete': 422,
  'lot.own': 403,
  'lot.closed': 409,
  'lot.price_changed': 409,
  'catalogue.not_found': 404,
  'price.unavailable': 503,
  'photo.not_found': 404,
  'photo.unreadable': 422,
  'photo.kind_refused': 422,
  'photo.too_large': 413,
  'photo.too_many_pixels': 422,
  'photo.too_many': 422,
  'photo.missing': 400,
  'bid.below_least': 409,
  'bid.over_limit': 403,
  'deal.not_found': 404,
  'deal.wrong_state': 409,
  'deal.frozen': 409,
  'weigh_in.implausible': 422,
  'claim.none': 422,
  'payout.not_found': 404,
  'processor.unavailable': 503,
  internal: 500,
} as const;

export type ErrorCode = keyof typeof errorStatus;

export const fieldError = z.object({ path: z.string(), message: z.string() });
export type FieldError = z.infer<typeof fieldError>;

/** RFC 9457 problem body. `code` is for programs, `detail` for people, `fields` names each bad field and its fix. */
export const problemBody = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.int(),
    code: z.string(),
    detail: z.string(),
    requestId: z.string(),
    fields: z.array(fieldError),
    /** What the caller needs to go on: the newest version after a conflict, the least next bid, seconds to wait. */
    context: z.record(z.string(), z.unknown()).optional(),
  })
  .meta({ id: 'Problem' });
export type ProblemBody = z.infer<typeof problemBody>;
