import type { AnswerOf, BodyOf, ParamsOf, ProblemBody, QueryOf, Route } from '@lydite/contracts';
import { ApiError, networkError } from './api-error.ts';
import { renewIfDue, renewSession } from './renew.ts';

type Part<Name extends string, T> = [T] extends [undefined]
  ? { [K in Name]?: undefined }
  : undefined extends T
    ? { [K in Name]?: T }
    : { [K in Name]: T };

/** What a route wants, by name: its path parameters, query and body as the contracts type them. */
export type Request<K extends Route> = Part<'params', ParamsOf<K>> &
  Part<'query', QueryOf<K>> &
  Part<'body', BodyOf<K>> & { signal?: AbortSignal };

type Args<K extends Route> = object extends Request<K> ? [request?: Request<K>] : [request: Request<K>];

/**
 * Calls a route of the API, typed by the contracts alone: no schema reaches the browser for it. The session is renewed
 * before its access token runs out, and once more when the API says it has.
 * @throws ApiError
 */
export async function call<K extends Route>(route: K, ...[request]: Args<K>): Promise<AnswerOf<K>> {
  const { params, query, body, signal } = (request ?? {}) as {
    params?: object;
    query?: object;
    body?: unknown;
    signal?: AbortSignal;
  };
  const method = route.slice(0, route.indexOf(' '));
  const init: RequestInit = {
    method,
    headers: { 'x-lydite-client': 'web', ...(body === undefined ? {} : { 'content-type': 'application/json' }) },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    ...(signal ? { signal } : {}),
  };
  const url = addressOf(route, params, query);
  await renewIfDue(route);
  let response = await send(url, init);
  if (response.status === 401 && (await isExpired(response)) && (await renewSession()))
    response = await send(url, init);
  return (await read(response)) as AnswerOf<K>;
}

/** Address of a route, for links to files and pictures. */
export function addressOf(route: Route, params: object = {}, query: object = {}): string {
  const path = route
    .slice(route.indexOf(' ') + 1)
    .replaceAll(/:(\w+)/g, (_, name: string) => encodeURIComponent(String((params as Record<string, unknown>)[name])));
  const entries = Object.entries(query).filter(([, value]) => value !== undefined && value !== '');
  const search = new URLSearchParams(entries.map(([key, value]) => [key, String(value)])).toString();
  return `/api${path}${search && `?${search}`}`;
}

async function send(url: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(url, init);
  } catch (error) {
    if (init.signal?.aborted) throw error;
    throw networkError();
  }
}

const isExpired = async (response: Response): Promise<boolean> => {
  const { code } = (await response
    .clone()
    .json()
    .catch(() => ({}))) as { code?: string };
  return code === 'session.required' || code === 'session.expired';
};

/** @throws ApiError for any answer that is not a success */
export async function read(response: Response): Promise<unknown> {
  if (response.status === 204 || response.headers.get('content-length') === '0') return undefined;
  const text = await response.text();
  const isJson = response.headers.get('content-type')?.includes('json') ?? false;
  if (response.ok) return isJson && text ? JSON.parse(text) : undefined;
  if (isJson) throw new ApiError(JSON.parse(text) as ProblemBody);
  throw networkError();
}
