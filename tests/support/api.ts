import { randomUUID } from 'node:crypto';
import { pino } from 'pino';
import request from 'supertest';
import { afterAll, beforeAll } from 'vitest';
import { type Database, openDatabase } from '#database/client.ts';
import { createApp } from '#server/app.ts';
import { readSigningKeys, type SigningKeys, signAccessToken } from '#server/auth/tokens.ts';
import type { Claims, Ctx } from '#server/services/context.ts';
import { type DatabaseUrls, useDatabase } from './database.ts';
import { Factory } from './factories.ts';

/** Signing keys of tests; any 32 bytes do. */
export const testKeys: SigningKeys = readSigningKeys(
  JSON.stringify([{ kid: 'test', secret: Buffer.alloc(32, 7).toString('base64url'), created: 0 }]),
);

/** A clock that a test sets; it starts at the real time. */
export class TestClock {
  #offset = 0;

  now(): number {
    return Date.now() + this.#offset;
  }

  advance(ms: number): void {
    this.#offset += ms;
  }
}

export interface TestApi {
  readonly urls: DatabaseUrls;
  readonly clock: TestClock;
  readonly factory: Factory;
  readonly db: Database;
  /** Requests of this person (null: of nobody), each from a device just signed in. */
  as(claims: Claims | null): Agent;
  /** Requests with this Cookie header, as a browser that has it would send them. */
  withCookie(cookie: string): Agent;
  /** A request that another site's page makes. */
  foreign(path: string, body: object): Promise<request.Response>;
  /** A service's context, for calling it without HTTP. */
  ctx(claims: Claims | null): Ctx;
}

export interface Agent {
  get(path: string): Promise<request.Response>;
  post(path: string, body?: object): Promise<request.Response>;
  put(path: string, body?: object): Promise<request.Response>;
  patch(path: string, body?: object): Promise<request.Response>;
  delete(path: string, body?: object): Promise<request.Response>;
}

/** The whole API on a database of its own, for one test file. Call it at the top. */
export function useApi(urls: DatabaseUrls = useDatabase()): TestApi {
  const clock = new TestClock();
  let state:
    | { factory: Factory; database: ReturnType<typeof openDatabase>; app: ReturnType<typeof createApp> }
    | undefined;
  const here = () => {
    if (!state) throw new Error('useApi is ready in hooks and tests, not before.');
    return state;
  };

  beforeAll(() => {
    const database = openDatabase(urls.appUrl, { max: 5, waitMs: 20_000 });
    const app = createApp({
      deps: { db: database.db, clock, random: Math.random },
      pool: database.pool,
      keys: testKeys,
      log: pino({ level: 'silent' }),
      demo: false,
      secure: false,
      development: false,
    });
    state = { factory: new Factory(urls.ownerUrl), database, app };
  });
  afterAll(async () => {
    await state?.factory.end();
    await state?.database.pool.end();
  });

  return {
    urls,
    clock,
    get factory() {
      return here().factory;
    },
    get db() {
      return here().database.db;
    },
    ctx: (claims) => ({ db: here().database.db, clock, random: Math.random, claims, requestId: 'test' }),
    as: (claims) =>
      agent(
        () => here().app,
        async () => (claims ? signedIn(here().factory, claims, clock.now()) : null),
      ),
    withCookie: (cookie) =>
      agent(
        () => here().app,
        async () => cookie,
      ),
    foreign: async (path, body) =>
      request(here().app).post(path).set('Sec-Fetch-Site', 'cross-site').send(body),
  };
}

/** Sends requests the way our own pages do, with a cookie made just before each. */
function agent(app: () => ReturnType<typeof createApp>, cookie: () => Promise<string | null>): Agent {
  const send = async (method: 'get' | 'post' | 'put' | 'patch' | 'delete', path: string, body?: object) => {
    const test = request(app())
      [method](path)
      .set('Accept', 'application/json')
      .set('Sec-Fetch-Site', 'same-origin');
    const jar = await cookie();
    if (jar) test.set('Cookie', jar);
    return body === undefined ? test : test.send(body);
  };
  return {
    get: (path) => send('get', path),
    post: (path, body = {}) => send('post', path, body),
    put: (path, body = {}) => send('put', path, body),
    patch: (path, body = {}) => send('patch', path, body),
    delete: (path, body = {}) => send('delete', path, body),
  };
}

/** The cookie of a person who has just signed in on a device of their own. */
async function signedIn(factory: Factory, claims: Claims, now: number): Promise<string> {
  const familyId = randomUUID();
  await factory.sql(
    `insert into refresh_token (token_id, family_id, account_id, club_id, token_hash, issued_at, expires_at, family_started_at)
     values ($1, $2, $3, $4, $5, now(), now() + interval '1 day', now())`,
    [randomUUID(), familyId, claims.accountId, claims.clubId, Buffer.from(randomUUID())],
  );
  return `sixteenfold-access=${await signAccessToken(testKeys, { ...claims, familyId }, now)}`;
}
