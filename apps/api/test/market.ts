import { mkdtemp, rm } from 'node:fs/promises';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { AnswerOf, BodyOf, ParamsOf, ProblemBody, QueryOf, Role, Route } from '@lydite/contracts';
import pg from 'pg';
import { createApp } from '../src/app.ts';
import { createDataSource } from '../src/data-source.ts';
import { createFolderStore } from '../src/platform/files.ts';
import { createLog } from '../src/platform/log.ts';
import type { Mail } from '../src/platform/mail.ts';
import type { PaymentGateway } from '../src/platform/payments.ts';
import type { QuotedPrice } from '../src/platform/prices.ts';
import { clientHeader } from '../src/platform/guards.ts';
import { createSessions } from '../src/platform/session.ts';
import { cookieNames } from '../src/platform/session-cookies.ts';
import type { World } from '../src/platform/world.ts';
import { readSettings, type Settings } from '../src/settings.ts';
import { createInbox, createRunner } from '../src/work.ts';
import { copyDatabase } from './database.ts';

export interface Options {
  payments?: (settings: Settings) => PaymentGateway;
  env?: Record<string, string>;
}

export interface Request<K extends Route> {
  params?: ParamsOf<K>;
  query?: QueryOf<K>;
  body?: BodyOf<K>;
  form?: FormData;
  headers?: Record<string, string>;
}

export interface Reply<T> {
  status: number;
  body: T;
  problem: ProblemBody;
  headers: Headers;
  bytes: Buffer;
}

/** A caller of the API with its own cookies. */
export interface Caller {
  memberId: string | null;
  cookies: Map<string, string>;
  call<K extends Route>(route: K, request?: Request<K>): Promise<Reply<AnswerOf<K>>>;
  fetch(path: string, init?: RequestInit): Promise<Response>;
}

const noPayments = new Proxy({} as PaymentGateway, {
  get: (_target, name) => () =>
    Promise.reject(new Error(`This test planned no call of the processor: ${String(name)}`)),
});

const testSettings = (env: Record<string, string>): Settings =>
  readSettings({
    NODE_ENV: 'test',
    PUBLIC_URL: 'http://localhost:4400',
    JOBS_DATABASE_URL: 'postgres://unused.example/none',
    JWT_SECRETS: 'a-secret-of-the-tests-that-is-long-enough',
    PASSWORD_PEPPER: 'a-pepper-of-the-tests-that-is-long-enough',
    SMTP_URL: 'smtp://unused.example:1',
    PAYMENTS_SECRET_KEY: 'sk_test_of_the_tests',
    PAYMENTS_WEBHOOK_SECRETS: 'whsec_of_the_tests',
    PRICES_URL: 'http://unused.example',
    LOG_LEVEL: process.env.LOG_LEVEL ?? 'silent',
    LIMITS: 'off',
    ...env,
  });

/**
 * The whole API over HTTP on its own copy of the database. Mails are kept in `mails`, the price service answers with `quotes`,
 * the processor refuses every call unless `payments` is given.
 */
export async function openMarket({ payments = () => noPayments, env = {} }: Options = {}) {
  const database = await copyDatabase();
  const folder = await mkdtemp(join(tmpdir(), 'lydite-test-'));
  const settings = testSettings({ DATABASE_URL: database.appUrl, FILES_DIR: folder, ...env });
  const db = await createDataSource(database.appUrl, {
    zone: settings.MARKET_ZONE,
    currency: settings.MARKET_CURRENCY,
    poolSize: 20,
  }).initialize();
  const owner = new pg.Client({ connectionString: database.ownerUrl });
  await owner.connect();
  const mails: Mail[] = [];
  const quotes: QuotedPrice[] = [];
  const world: World = {
    settings,
    db,
    log: createLog(settings),
    sessions: createSessions({ db, settings }),
    mail: { send: async (mail) => void mails.push(mail), close: () => {} },
    prices: { since: async (from) => quotes.filter((quote) => quote.at >= from) },
    files: createFolderStore(folder),
    payments: payments(settings),
  };
  const server = await new Promise<Server>((resolve) => {
    const listening = createApp(world).listen(0, '127.0.0.1', () => resolve(listening));
  });
  const origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const runner = createRunner(world);
  const inbox = createInbox(world);
  const work = async (): Promise<number> => {
    const count = (await inbox.runAll()) + (await runner.runAll());
    return count === 0 ? 0 : count + (await work());
  };

  return {
    world,
    db,
    owner,
    database,
    mails,
    quotes,
    origin,
    visitor: () => createCaller(origin, null),
    /** Signs a member in without asking for the password. */
    as: async (memberId: string): Promise<Caller> => {
      const caller = createCaller(origin, memberId);
      const roles: { role: Role }[] = await db.query('select role from member_roles where member_id = $1', [memberId]);
      const tokens = await db.transaction((tx) =>
        world.sessions.begin(tx, { memberId, roles: roles.map((row) => row.role), device: 'test', ip: '127.0.0.1' }),
      );
      caller.cookies.set(cookieNames.access, tokens.access).set(cookieNames.refresh, tokens.refresh);
      return caller;
    },
    /** Carries out every due outside effect and every effect of events received, until none is left; their number. */
    work,
    /** Moves the market's clock ahead, e.g. by `3 days`. */
    advance: (interval: string) => owner.query('update market_clock set shift = shift + $1::interval', [interval]),
    async close() {
      server.closeAllConnections();
      server.close();
      await db.destroy();
      await owner.end();
      await database.drop();
      await rm(folder, { recursive: true, force: true });
    },
  };
}
export type Market = Awaited<ReturnType<typeof openMarket>>;

function createCaller(origin: string, memberId: string | null): Caller {
  const cookies = new Map<string, string>();

  async function send(path: string, init: RequestInit = {}): Promise<Response> {
    const headers = new Headers(init.headers);
    if (cookies.size > 0) headers.set('cookie', [...cookies].map(([name, value]) => `${name}=${value}`).join('; '));
    const response = await fetch(`${origin}${path}`, { redirect: 'manual', ...init, headers });
    for (const line of response.headers.getSetCookie()) {
      const [, name, value] = /^([^=]+)=([^;]*)/.exec(line)!;
      if (value) cookies.set(name!, value);
      else cookies.delete(name!);
    }
    return response;
  }

  return {
    memberId,
    cookies,
    fetch: send,
    async call(route, { params, query, body, form, headers = {} } = {}) {
      const [method, pattern] = route.split(' ') as [string, string];
      const path = pattern.replaceAll(/:(\w+)/g, (_, name: string) =>
        encodeURIComponent(String((params as Record<string, unknown>)[name])),
      );
      const search = query
        ? `?${new URLSearchParams(Object.entries(query as object).map(([key, value]): [string, string] => [key, String(value)])).toString()}`
        : '';
      const response = await send(`/api${path}${search}`, {
        method,
        headers: {
          [clientHeader]: 'test',
          ...(body === undefined ? {} : { 'content-type': 'application/json' }),
          ...headers,
        },
        ...(form ? { body: form } : body === undefined ? {} : { body: JSON.stringify(body) }),
      });
      const bytes = Buffer.from(await response.arrayBuffer());
      const parsed: unknown = response.headers.get('content-type')?.includes('json')
        ? JSON.parse(bytes.toString())
        : undefined;
      return {
        status: response.status,
        body: parsed as never,
        problem: parsed as ProblemBody,
        headers: response.headers,
        bytes,
      };
    },
  };
}
