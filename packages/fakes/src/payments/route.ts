import { z } from 'zod';
import { listOf, text } from './parameters.ts';
import type { Work } from './work.ts';

/** One path of the API. `path` holds `:name` parts; `run` is synchronous, so a request is one commit. */
export interface Route {
  method: 'GET' | 'POST' | 'DELETE';
  path: string;
  schema: z.ZodType;
  run: (work: Work, params: never, at: Record<string, string>) => object;
}

type Shape = Record<string, z.ZodType>;

/** Describes a route; `expand` is understood everywhere, any parameter not listed is refused. */
export function route<S extends Shape>(
  method: Route['method'],
  path: string,
  shape: S,
  run: (work: Work, params: z.output<z.ZodObject<S>>, at: Record<string, string>) => object,
): Route {
  const schema = z.strictObject({ ...shape, expand: listOf(text()).optional() });
  return { method, path, schema, run: run as Route['run'] };
}
