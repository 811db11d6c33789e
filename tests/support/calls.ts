import type { APIRequestContext } from '@playwright/test';
import { addresses } from './stack.ts';

interface CallOptions {
  body?: unknown;
  /** A form with a file. */
  form?: Record<string, string | { name: string; mimeType: string; buffer: Buffer }>;
}

/** `call('POST /lots/L-1/bids', { body })`: the answer's JSON, or an error with the market's own words. */
export type Call = <T = unknown>(route: string, options?: CallOptions) => Promise<T>;

/** Calls the API as the clients do, with the cookies of a browser. */
export function createCall(request: APIRequestContext): Call {
  return async <T>(route: string, { body, form }: CallOptions = {}) => {
    const [method = 'GET', path = ''] = route.split(' ');
    const answer = await request.fetch(`${addresses.web}/api${path}`, {
      method,
      headers: { 'x-lydite-client': 'e2e', origin: addresses.web },
      ...(body !== undefined && { data: body }),
      ...(form && { multipart: form }),
    });
    const text = await answer.text();
    if (!answer.ok()) throw new Error(`${route}: ${answer.status()} ${text}`);
    return (text === '' ? undefined : JSON.parse(text)) as T;
  };
}

export const signInByCall = (call: Call, body: { email: string; password: string }) => call('POST /session', { body });
