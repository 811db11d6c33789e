import {
  api,
  type EndpointSpec,
  type ParsedBody,
  type ParsedParams,
  type ParsedQuery,
  type RawAnswer,
  type Route,
} from '@lydite/contracts';
import express, { Router, type Request, type RequestHandler, type Response } from 'express';
import type { Actor } from './actor.ts';
import { AppError } from './app-error.ts';
import { readInput } from './read-input.ts';
import { sendFile, type FileAnswer } from './send-file.ts';

type Spec<K extends Route> = (typeof api)[K];

export interface Upload {
  path: string;
  size: number;
  originalName: string;
}

export interface Call<K extends Route> {
  params: ParsedParams<K>;
  query: ParsedQuery<K>;
  body: ParsedBody<K>;
  actor: Spec<K>['access'] extends 'public' ? Actor | null : Actor;
  /** The uploaded file of a multipart route, and its text fields. */
  upload: Upload | undefined;
  fields: Record<string, string>;
  /** The untouched bytes of a raw route. */
  raw: Buffer;
  ip: string;
  requestId: string;
  req: Request;
  res: Response;
}

export type Answer<K extends Route> = Spec<K>['response'] extends 'file' ? FileAnswer : RawAnswer<K>;
export type Handler<K extends Route> = (call: Call<K>) => Promise<Answer<K>>;

export interface HandlerOptions<K extends Route> {
  /** Runs before an upload's bytes are accepted: refuse here whoever may not upload. */
  before?: (call: Call<K>) => Promise<void>;
}

/** Binds a route of the contracts to its handler. */
export type On = <K extends Route>(route: K, handler: Handler<K>, options?: HandlerOptions<K>) => void;

/** Knows who calls: see platform/session.ts. */
export interface SessionGate {
  actorOf(req: Request): Promise<Actor | null>;
  /** Re-reads the session: @throws AppError session.expired when it has ended, session.stale when `fresh` and the password was entered too long ago. */
  assertLive(actor: Actor, wants: { fresh: boolean }): Promise<void>;
}

interface Options {
  sessions: SessionGate;
  upload: RequestHandler;
  /** Runs first on every route but the signed webhook: see refuseCrossSite. */
  guard: RequestHandler;
}

const unsafe = (method: string): boolean => method !== 'GET' && method !== 'HEAD';

const allowed = (spec: EndpointSpec, actor: Actor | null): void => {
  if (spec.access === 'public') return;
  if (!actor) throw new AppError('session.required', 'Sign in to go on.');
  if (spec.access === 'signed-in') return;
  if (spec.access.some((role) => actor.roles.includes(role))) return;
  if (spec.access.some((role) => actor.withheldRoles.includes(role)))
    throw new AppError('session.totp_missing', 'Set up the second step at sign-in first: it is on your account page.');
  throw new AppError('member.role_missing', `This needs the role ${spec.access.join(' or ')}.`);
};

const parserOf = (spec: EndpointSpec): RequestHandler[] => {
  if (spec.consumes === 'raw') return [express.raw({ type: () => true, limit: '256kb' })];
  if (spec.consumes === 'multipart' || !spec.body) return [];
  return [express.json({ limit: '256kb', strict: true })];
};

/**
 * Mounts the routes of the contracts: each is authorised, its input parsed by its schema, its answer trimmed by its schema.
 */
export function createRoutes({ sessions, upload, guard }: Options) {
  const router = Router();
  const bound = new Set<Route>();

  const on: On = (route, handler, options = {}) => {
    if (bound.has(route)) throw new Error(`${route} is bound twice`);
    bound.add(route);
    const spec: EndpointSpec = api[route];
    const [method, path] = route.split(' ') as ['GET', string];

    const authorise: RequestHandler = async (req, res, next) => {
      const actor = await sessions.actorOf(req);
      allowed(spec, actor);
      // Reading trusts the token for its ten minutes; whatever changes something asks the session itself.
      if (actor && spec.access !== 'public' && unsafe(method))
        await sessions.assertLive(actor, { fresh: spec.fresh ?? false });
      res.locals.actor = actor;
      res.locals.params = readInput(spec.params, req.params, 'path');
      res.locals.query = readInput(spec.query, req.query, 'query');
      if (options.before) await options.before(callOf(req, res));
      next();
    };

    const answer: RequestHandler = async (req, res) => {
      res.locals.body = spec.consumes ? undefined : readInput(spec.body, req.body, 'body');
      const result: unknown = await handler(callOf(req, res));
      if (spec.response === 'file') return sendFile(res, result as FileAnswer);
      if (spec.response === 'none') return void res.status(spec.status ?? 204).end();
      res.status(spec.status ?? 200).json(spec.response.parse(result));
    };

    const chain = [
      ...(spec.consumes === 'raw' ? [] : [guard]),
      authorise,
      ...parserOf(spec),
      ...(spec.consumes === 'multipart' ? [upload] : []),
      answer,
    ];
    router[method.toLowerCase() as 'get'](path, ...chain);
  };

  return {
    on,
    router,
    /** Routes of the contracts that nobody has bound: none, says a test. */
    missing: (): Route[] => (Object.keys(api) as Route[]).filter((route) => !bound.has(route)),
  };
}

const callOf = (req: Request, res: Response): Call<never> =>
  ({
    params: res.locals.params,
    query: res.locals.query,
    body: res.locals.body,
    actor: res.locals.actor,
    upload: req.file && { path: req.file.path, size: req.file.size, originalName: req.file.originalname },
    fields: (req.body ?? {}) as Record<string, string>,
    raw: req.body as Buffer,
    ip: req.ip ?? '',
    requestId: String(req.id),
    req,
    res,
  }) as unknown as Call<never>;
