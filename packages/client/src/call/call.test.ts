import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiError } from './api-error.ts';
import { addressOf, call } from './call.ts';
import { noteSignedIn, noteSignedOut, wasSignedIn } from './renew.ts';

interface Sent {
  url: string;
  method: string;
  body: unknown;
}

const sent: Sent[] = [];

/** Answers in turn; a request too many fails the test. */
function answer(...answers: (Response | Error)[]): void {
  vi.stubGlobal('fetch', (url: string, { method = 'GET', body }: { method?: string; body?: string } = {}) => {
    sent.push({ url, method, body: body === undefined ? undefined : JSON.parse(body) });
    const next = answers.shift() ?? new Error(`nobody answers ${method} ${url}`);
    return next instanceof Error ? Promise.reject(next) : Promise.resolve(next);
  });
}

const json = (body: unknown, status = 200) => Response.json(body, { status });
const problem = (code: string, status: number, rest: object = {}) =>
  new Response(
    JSON.stringify({ type: '', title: '', status, code, detail: `${code} said`, requestId: 'r1', fields: [], ...rest }),
    {
      status,
      headers: { 'content-type': 'application/problem+json' },
    },
  );
const refusal = (promise: Promise<unknown>) =>
  promise.then(
    () => expect.unreachable(),
    (error: ApiError) => error,
  );

beforeEach(() => {
  sent.length = 0;
  localStorage.clear();
  vi.useFakeTimers({ now: 1_000_000_000 });
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('a call', () => {
  it('fills the path, the query and the body', async () => {
    answer(json({ rows: [] }), json({ dealCode: null }));
    await call('GET /lots', { query: { q: 'memory & more', page: 2, form: undefined } });
    await call('POST /lots/:lotCode/offer-answer', { params: { lotCode: 'L-1' }, body: { accept: true } });
    expect(sent).toEqual([
      { url: '/api/lots?q=memory+%26+more&page=2', method: 'GET', body: undefined },
      { url: '/api/lots/L-1/offer-answer', method: 'POST', body: { accept: true } },
    ]);
  });
  it('keeps a parameter within its part of the path', () => {
    expect(addressOf('GET /lots/:lotCode', { lotCode: '../session?x' })).toBe('/api/lots/..%2Fsession%3Fx');
  });
  it('answers undefined when there is no content', async () => {
    answer(new Response(null, { status: 204 }));
    await expect(call('POST /my/notices/read')).resolves.toBeUndefined();
  });
  it('throws the refusal with its code, fields and context', async () => {
    const fields = [{ path: 'ceilingMinor', message: 'At least $50.' }];
    answer(problem('bid.below_least', 409, { fields, context: { leastNextMinor: 5000 } }));
    const error = await refusal(call('GET /market'));
    expect(error).toBeInstanceOf(ApiError);
    expect(error).toMatchObject({ code: 'bid.below_least', status: 409, fields, context: { leastNextMinor: 5000 } });
    expect(error.message).toBe('bid.below_least said');
  });
  it('says so when the market cannot be reached, or something else answers for it', async () => {
    answer(new TypeError('failed to fetch'), new Response('<html>bad gateway</html>', { status: 502 }));
    expect((await refusal(call('GET /market'))).code).toBe('network');
    expect((await refusal(call('GET /market'))).code).toBe('network');
  });
});

describe('renewing the session', () => {
  it('happens once when the access token has run out, and the call is sent again', async () => {
    noteSignedIn();
    answer(problem('session.expired', 401), json({ member: { id: 'm' } }), json([]));
    await expect(call('GET /my/lots')).resolves.toEqual([]);
    expect(sent.map(({ method, url }) => `${method} ${url}`)).toEqual([
      'GET /api/my/lots',
      'POST /api/session/refresh',
      'GET /api/my/lots',
    ]);
  });
  it('happens before a call when the page has been open for long, once for all callers', async () => {
    noteSignedIn();
    vi.setSystemTime(Date.now() + 9 * 60_000);
    answer(json({ member: { id: 'm' } }), json([]), json([]));
    await Promise.all([call('GET /my/lots'), call('GET /my/notices')]);
    expect(sent.map(({ url }) => url)).toEqual(['/api/session/refresh', '/api/my/lots', '/api/my/notices']);
  });
  it('does not happen for a visitor', async () => {
    answer(problem('session.required', 401));
    expect((await refusal(call('GET /my/lots'))).code).toBe('session.required');
    expect(sent).toHaveLength(1);
  });
  it('is over when the session is: the refusal stands, and nothing is renewed from then on', async () => {
    noteSignedIn();
    answer(problem('session.expired', 401), json({ member: null }));
    expect((await refusal(call('GET /my/lots'))).code).toBe('session.expired');
    expect(wasSignedIn()).toBe(false);
  });
  it('does not answer a wrong password with a renewal', async () => {
    noteSignedIn();
    answer(problem('session.wrong_credentials', 401));
    const error = await refusal(call('POST /session', { body: { email: 'a@b.example', password: 'x' } }));
    expect(error.code).toBe('session.wrong_credentials');
    noteSignedOut();
  });
});
