import type { z } from 'zod';
import type { Role } from './common.ts';

/** Who may call: anybody, anybody signed in, or members with one of the roles. */
export type Access = 'public' | 'signed-in' | readonly Role[];

/**
 * The object a call is about. A caller who is no party to it is answered 404, as if it did not exist;
 * `param` names the path parameter that carries its id.
 */
export interface OwnedObject {
  kind: 'lot-draft' | 'lot' | 'photo' | 'deal' | 'session' | 'member';
  param: string;
}

export interface EndpointSpec {
  summary: string;
  access: Access;
  owned?: OwnedObject;
  /** Wants a password entered within the last ten minutes. */
  fresh?: boolean;
  params?: z.ZodType;
  query?: z.ZodType;
  body?: z.ZodType;
  /** JSON by default; `multipart` for uploads, `raw` for signed webhooks. */
  consumes?: 'json' | 'multipart' | 'raw';
  /** The schema of the answer; what it does not list never leaves. `file` for pictures, PDFs and streams. */
  response: z.ZodType | 'file' | 'none';
  status?: 200 | 201 | 202 | 204;
}

/** Keeps the literal types of a group of endpoints while checking their shape. Keys are `METHOD /path/:param`. */
export const endpoints = <
  const T extends Record<`${'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'} /${string}`, EndpointSpec>,
>(
  group: T,
): T => group;
