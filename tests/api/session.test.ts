import { randomUUID } from 'node:crypto';
import { SignJWT } from 'jose';
import { describe, expect, it } from 'vitest';
import { signAccessToken } from '#server/auth/tokens.ts';
import type { Claims } from '#server/services/context.ts';
import { testKeys, useApi } from '../support/api.ts';
import { TEST_PASSWORD } from '../support/factories.ts';

const api = useApi();

/** Cookies of a reply by name. */
function cookiesOf(headers: Record<string, unknown>): Map<string, string> {
  const set = (headers['set-cookie'] ?? []) as string[];
  return new Map(
    set.map((line) => {
      const [pair = ''] = line.split(';');
      const at = pair.indexOf('=');
      return [pair.slice(0, at), pair.slice(at + 1)];
    }),
  );
}

async function signIn(signIn: string, password = TEST_PASSWORD) {
  return api.as(null).post('/api/session', { signIn, password });
}

const cookieHeader = (cookies: Map<string, string>) => [...cookies].map(([k, v]) => `${k}=${v}`).join('; ');

describe('Signing in', () => {
  it('gives a club-scoped session in HttpOnly cookies and says where to go', async () => {
    const person = await api.factory.person({ role: 'captain' });
    const res = await signIn(person.signIn.toUpperCase());
    expect(res.status).toBe(200);
    expect(res.body.next).toBe('/desk/squad');
    expect(res.body.session).toMatchObject({ role: 'captain', club: { clubId: person.clubId } });
    for (const line of res.headers['set-cookie'] as unknown as string[]) {
      expect(line).toContain('HttpOnly');
      expect(line).toContain('SameSite=Lax');
    }
  });

  it('takes administrators to their places, in no club', async () => {
    const administrator = await api.factory.administrator();
    const res = await signIn(administrator.signIn);
    expect(res.body).toMatchObject({ next: '/admin/intake', session: { role: 'administrator', club: null } });
  });

  it('says the same for a wrong password, an unknown name and a disabled account', async () => {
    const person = await api.factory.person();
    const disabled = await api.factory.person();
    await api.factory.sql('update account set disabled_at = now() where account_id = $1', [
      disabled.accountId,
    ]);
    const replies = [
      await signIn(person.signIn, 'not this one'),
      await signIn('nobody@example.test'),
      await signIn(disabled.signIn),
    ];
    expect(replies.map((r) => r.status)).toEqual([401, 401, 401]);
    expect(new Set(replies.map((r) => r.body.detail)).size).toBe(1);
  });

  it.each([
    [{ signIn: '', password: 'x' }, '/signIn'],
    [{ signIn: 'a', password: '' }, '/password'],
    [{ signIn: 'a' }, '/password'],
    [{ signIn: 'a', password: 'x', role: 'captain' }, '/'],
  ])('refuses %j and points at the field', async (body, pointer) => {
    const res = await api.as(null).post('/api/session', body);
    expect(res.status).toBe(400);
    expect(res.body.errors[0].pointer).toBe(pointer);
  });

  it('waits after ten failures on one name, with the right password too, and leaves other names alone', async () => {
    const person = await api.factory.person();
    const other = await api.factory.person();
    for (let n = 0; n < 10; n++) expect((await signIn(person.signIn, 'wrong')).status).toBe(401);
    const held = await signIn(person.signIn);
    expect(held.status).toBe(429);
    expect(Number(held.headers['retry-after'])).toBeGreaterThan(0);
    expect((await signIn(other.signIn)).status).toBe(200);
  });

  it('comes only from a page of ours', async () => {
    const person = await api.factory.person();
    const res = await api.foreign('/api/session', { signIn: person.signIn, password: TEST_PASSWORD });
    expect(res.status).toBe(403);
  });
});

describe('A session', () => {
  it('is changed for a new one, and the old refresh token ends the device once its minute is over', async () => {
    const person = await api.factory.person();
    const first = cookiesOf((await signIn(person.signIn)).headers);
    const second = await api.withCookie(cookieHeader(first)).post('/api/session/refresh');
    expect(second.status).toBe(200);
    const fresh = cookiesOf(second.headers);
    expect(fresh.get('sixteenfold-refresh')).not.toBe(first.get('sixteenfold-refresh'));
    // The reply may have been lost on the way: within a minute the old token is taken again.
    expect((await api.withCookie(cookieHeader(first)).post('/api/session/refresh')).status).toBe(200);
    api.clock.advance(61_000);
    expect((await api.withCookie(cookieHeader(first)).post('/api/session/refresh')).status).toBe(401);
    expect((await api.withCookie(cookieHeader(fresh)).post('/api/session/refresh')).status).toBe(401);
    expect((await api.withCookie(cookieHeader(fresh)).get('/api/session')).status).toBe(401);
  });

  it('twenty tabs that renew at once all stay signed in', async () => {
    const person = await api.factory.person();
    const cookies = cookieHeader(cookiesOf((await signIn(person.signIn)).headers));
    const replies = await Promise.all(
      Array.from({ length: 20 }, () => api.withCookie(cookies).post('/api/session/refresh')),
    );
    expect(replies.map((r) => r.status)).toEqual(Array(20).fill(200));
  });

  it('ends at once with sign-out, with a change of role, with disabling, and with leaving the club', async () => {
    const ends = [
      async (person: { memberId: string; accountId: string }, cookie: string) => {
        await api.withCookie(cookie).delete('/api/session');
        return person;
      },
      (person: { memberId: string }) =>
        api.factory.sql(`update membership set role = 'captain', epoch = epoch + 1 where member_id = $1`, [
          person.memberId,
        ]),
      (person: { accountId: string }) =>
        api.factory.sql('update account set disabled_at = now() where account_id = $1', [person.accountId]),
      (person: { memberId: string }) =>
        api.factory.sql('update membership set left_at = now() where member_id = $1', [person.memberId]),
    ];
    for (const end of ends) {
      const person = await api.factory.person();
      const cookie = cookieHeader(cookiesOf((await signIn(person.signIn)).headers));
      expect((await api.withCookie(cookie).get('/api/today')).status).toBe(200);
      await end(person, cookie);
      expect((await api.withCookie(cookie).get('/api/today')).status).toBe(401);
      expect((await api.withCookie(cookie).get('/api/session')).status).toBe(401);
    }
  });

  it('moves to another club of the same person and to no other', async () => {
    const person = await api.factory.person();
    const second = await api.factory.club();
    await api.factory.sql(
      `insert into membership (club_id, member_id, account_id, role, nickname, time_zone, joined_at)
       values ($1, $2, $3, 'captain', 'Elsewhere', 'Europe/Paris', now())`,
      [second.clubId, randomUUID(), person.accountId],
    );
    const cookie = cookieHeader(cookiesOf((await signIn(person.signIn)).headers));
    const moved = await api.withCookie(cookie).post('/api/session/club', { clubId: second.clubId });
    expect(moved.body).toMatchObject({
      next: '/desk/squad',
      session: { nickname: 'Elsewhere', role: 'captain' },
    });
    const there = cookieHeader(cookiesOf(moved.headers));
    expect((await api.withCookie(there).get('/api/session')).body.club.clubId).toBe(second.clubId);
    const foreign = await api.factory.club();
    expect((await api.withCookie(there).post('/api/session/club', { clubId: foreign.clubId })).status).toBe(
      404,
    );
    expect((await api.withCookie(there).post('/api/session/club', { clubId: null })).status).toBe(404);
    expect((await api.as(null).post('/api/session/club', { clubId: foreign.clubId })).status).toBe(401);
  });
});

describe('A forged token', () => {
  const claims = async (): Promise<Claims & { familyId: string }> => {
    const person = await api.factory.person();
    const familyId = randomUUID();
    await api.factory.sql(
      `insert into refresh_token (token_id, family_id, account_id, club_id, token_hash, issued_at, expires_at, family_started_at)
       values ($1, $2, $3, $4, $5, now(), now() + interval '1 day', now())`,
      [randomUUID(), familyId, person.accountId, person.clubId, Buffer.from(familyId)],
    );
    return { ...person.claims, familyId };
  };
  const payload = (c: Claims) => ({ club: c.clubId, role: c.role, epoch: c.epoch, sid: c.familyId });
  const header = { alg: 'HS256', typ: 'at+jwt', kid: 'test' };
  const good = (c: Claims, now = Date.now(), head: typeof header | Omit<typeof header, 'kid'> = header) =>
    new SignJWT(payload(c))
      .setProtectedHeader(head)
      .setSubject(c.accountId)
      .setIssuer('sixteenfold')
      .setAudience('sixteenfold-web')
      .setIssuedAt(Math.floor(now / 1000))
      .setExpirationTime(Math.floor(now / 1000) + 600);
  const secret = testKeys.newest.secret;
  const other = new Uint8Array(32).fill(9);

  // RFC 8725, section 3, as a table: each differs from a good token in one thing.
  const forgeries: [string, (c: Claims & { familyId: string }) => Promise<string>][] = [
    ['another key', (c) => good(c).sign(other)],
    ['no signature', async (c) => `${(await good(c).sign(secret)).split('.').slice(0, 2).join('.')}.`],
    [
      'alg none',
      async (c) => {
        const part = (o: object) => Buffer.from(JSON.stringify(o)).toString('base64url');
        const [, body] = (await good(c).sign(secret)).split('.');
        return `${part({ alg: 'none', typ: 'at+jwt', kid: 'test' })}.${body}.`;
      },
    ],
    ['HS512', (c) => good(c, Date.now(), { ...header, alg: 'HS512' }).sign(new Uint8Array(64).fill(7))],
    ['unknown kid', (c) => good(c, Date.now(), { ...header, kid: 'other' }).sign(secret)],
    ['no kid', (c) => good(c, Date.now(), { alg: 'HS256', typ: 'at+jwt' }).sign(secret)],
    ['another typ', (c) => good(c, Date.now(), { ...header, typ: 'JWT' }).sign(secret)],
    ['another issuer', (c) => good(c).setIssuer('someone').sign(secret)],
    ['another audience', (c) => good(c).setAudience('someone').sign(secret)],
    ['run out', (c) => good(c, Date.now() - 700_000).sign(secret)],
    [
      'no expiry',
      (c) =>
        new SignJWT(payload(c))
          .setProtectedHeader(header)
          .setSubject(c.accountId)
          .setIssuer('sixteenfold')
          .setAudience('sixteenfold-web')
          .setIssuedAt()
          .sign(secret),
    ],
    ['another role', (c) => signAccessToken(testKeys, { ...c, role: 'captain' }, Date.now())],
    [
      'administrator',
      (c) => signAccessToken(testKeys, { ...c, role: 'administrator', clubId: null }, Date.now()),
    ],
    ['another epoch', (c) => signAccessToken(testKeys, { ...c, epoch: 1 }, Date.now())],
    [
      'another club',
      async (c) => signAccessToken(testKeys, { ...c, clubId: (await api.factory.club()).clubId }, Date.now()),
    ],
    [
      "somebody else's device",
      async (c) => signAccessToken(testKeys, { ...c, familyId: (await claims()).familyId }, Date.now()),
    ],
    [
      'a changed body',
      async (c) => {
        const [head, , signature] = (await good(c).sign(secret)).split('.');
        const body = Buffer.from(
          JSON.stringify({
            ...payload(c),
            role: 'captain',
            sub: c.accountId,
            iss: 'sixteenfold',
            aud: 'sixteenfold-web',
            iat: 1,
            exp: 9_999_999_999,
          }),
        ).toString('base64url');
        return `${head}.${body}.${signature}`;
      },
    ],
    ['nothing like a token', async () => 'a.b.c'],
    ['empty', async () => ''],
  ];

  it('the unforged one is taken', async () => {
    const token = await good(await claims()).sign(secret);
    expect((await api.withCookie(`sixteenfold-access=${token}`).get('/api/today')).status).toBe(200);
  });

  it.each(forgeries)('%s is refused', async (_title, forge) => {
    const token = await forge(await claims());
    expect((await api.withCookie(`sixteenfold-access=${token}`).get('/api/session')).status).toBe(401);
  });
});
