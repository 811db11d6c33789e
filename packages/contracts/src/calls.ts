import type { z } from 'zod';
import type { Api } from './api.ts';

/** A route of the API, such as `POST /lots/:lotCode/bids`. */
export type Route = keyof Api;

type Part<K extends Route, P extends string> = Api[K] extends Record<P, infer S extends z.ZodType> ? S : never;

/** Path parameters, query and body as the caller writes them; absent when the route has none. */
export type ParamsOf<K extends Route> = [Part<K, 'params'>] extends [never] ? undefined : z.input<Part<K, 'params'>>;
export type QueryOf<K extends Route> = [Part<K, 'query'>] extends [never] ? undefined : z.input<Part<K, 'query'>>;
export type BodyOf<K extends Route> = [Part<K, 'body'>] extends [never] ? undefined : z.input<Part<K, 'body'>>;
export type AnswerOf<K extends Route> = [Part<K, 'response'>] extends [never]
  ? undefined
  : z.output<Part<K, 'response'>>;

/** The same after parsing, as the server's handler receives them. */
export type ParsedParams<K extends Route> = [Part<K, 'params'>] extends [never]
  ? undefined
  : z.output<Part<K, 'params'>>;
export type ParsedQuery<K extends Route> = [Part<K, 'query'>] extends [never] ? undefined : z.output<Part<K, 'query'>>;
export type ParsedBody<K extends Route> = [Part<K, 'body'>] extends [never] ? undefined : z.output<Part<K, 'body'>>;
/** What a handler returns before the answer's schema trims it. */
export type RawAnswer<K extends Route> = [Part<K, 'response'>] extends [never] ? void : z.input<Part<K, 'response'>>;
