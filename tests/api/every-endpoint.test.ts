import { beforeAll, describe, expect, it } from 'vitest';
import { contract } from '#server/api/contract.ts';
import { type EndpointName, endpoints } from '#shared/contracts/endpoints.ts';
import { useApi } from '../support/api.ts';
import type { Person } from '../support/factories.ts';

const api = useApi();

/** Endpoints that read or write the session's cookies: server/api/session/routes.ts. */
const WITH_COOKIES: readonly EndpointName[] = [
  'signInPage',
  'signIn',
  'refreshSession',
  'switchClub',
  'signOut',
];

const rows = Object.values(contract);
const anyUuid = '00000000-0000-4000-8000-000000000000';
const pathOf = (path: string) =>
  path
    .replace(/:(draftId|memberId)/g, anyUuid)
    .replace(/:(line|number)/g, '1')
    .replace(/:(setKey|key|caseKey)/g, 'pll');

function send(agent: ReturnType<typeof api.as>, { method, path }: { method: string; path: string }) {
  const to = pathOf(path);
  return method === 'GET'
    ? agent.get(to)
    : agent[method.toLowerCase() as 'post' | 'put' | 'patch' | 'delete'](to, {});
}

it('every endpoint has its row, or is one of those with cookies', () => {
  const known = new Set([...Object.keys(contract), ...WITH_COOKIES]);
  expect(Object.keys(endpoints).filter((name) => !known.has(name))).toEqual([]);
});

describe.each(rows.map((row) => [`${row.endpoint.method} ${row.endpoint.path}`, row] as const))(
  '%s',
  (_title, row) => {
    let member: Person;
    let captain: Person;
    let administrator: Awaited<ReturnType<typeof api.factory.administrator>>;
    beforeAll(async () => {
      member = await api.factory.person();
      captain = await api.factory.person({ role: 'captain' });
      administrator = await api.factory.administrator();
    });

    it('asks the signed-out to sign in, as problem details, unless it is open to all', async () => {
      const res = await send(api.as(null), row.endpoint);
      if (row.who === 'anyone') {
        expect([200, 400]).toContain(res.status);
        return;
      }
      expect(res.status).toBe(401);
      expect(res.headers['content-type']).toContain('application/problem+json');
      expect(res.body).toMatchObject({ status: 401, type: '/problems/signed-out' });
    });

    it('refuses the roles it is not for, and no other', async () => {
      const allowed = {
        anyone: ['member', 'captain', 'administrator'],
        'signed-in': ['member', 'captain', 'administrator'],
        member: ['member', 'captain'],
        captain: ['captain'],
        administrator: ['administrator'],
        definer: ['captain', 'administrator'],
      }[row.who];
      for (const [role, who] of Object.entries({ member, captain, administrator })) {
        const { status } = await send(api.as(who.claims), row.endpoint);
        expect({ role, refused: status === 403 }).toEqual({ role, refused: !allowed.includes(role) });
        expect(status).toBeLessThan(500);
      }
    });

    it('knows no other method', async () => {
      const others = (['get', 'post', 'put', 'patch', 'delete'] as const).filter(
        (method) =>
          !Object.values(endpoints).some(
            (known) => known.path === row.endpoint.path && known.method.toLowerCase() === method,
          ),
      );
      const res = await api.as(captain.claims)[others[0] ?? 'patch'](pathOf(row.endpoint.path));
      if (others.length > 0) {
        expect(res.status).toBe(405);
        expect(res.headers.allow).toContain(row.endpoint.method);
      }
    });

    it('takes no write from another site', async () => {
      if (row.endpoint.method === 'GET') {
        const res = await api.as(null).get(pathOf(row.endpoint.path));
        expect(res.headers['cache-control']).toContain('no-store');
        return;
      }
      const res = await api.foreign(pathOf(row.endpoint.path), {});
      expect(res.status).toBe(403);
    });
  },
);
