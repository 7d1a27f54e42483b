import { getTableColumns, getTableName, is, sql } from 'drizzle-orm';
import { PgTable } from 'drizzle-orm/pg-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { type Transaction, tables } from '#database/client.ts';
import { asAdministrator, asMember } from '#server/services/context.ts';
import { useApi } from '../support/api.ts';
import type { Person } from '../support/factories.ts';
import { Phone } from '../support/training.ts';

const api = useApi();

interface TableRow {
  name: string;
  forced: boolean;
  enabled: boolean;
  owner: string;
}

/** Every table of ours, partitions too. */
async function allTables(): Promise<TableRow[]> {
  return api.factory.sql<TableRow>(
    `select c.relname as name, c.relrowsecurity as enabled, c.relforcerowsecurity as forced,
            pg_get_userbyid(c.relowner) as owner
     from pg_class c join pg_namespace n on n.oid = c.relnamespace
     where n.nspname = 'public' and c.relkind in ('r', 'p') order by 1`,
  );
}

async function tenantTables(): Promise<string[]> {
  const rows = await api.factory.sql<{ name: string }>(
    `select c.relname as name from pg_attribute a join pg_class c on c.oid = a.attrelid
     join pg_namespace n on n.oid = c.relnamespace
     where n.nspname = 'public' and c.relkind in ('r', 'p') and a.attname = 'club_id' and not a.attisdropped
     order by 1`,
  );
  // Sign-in tokens belong to an account; the club in them is where the device works, not whose row it is. Sets are
  // part of the catalogue, some of them for one club only: their walls have tests of their own below.
  return rows.map((row) => row.name).filter((name) => name !== 'refresh_token' && name !== 'case_set');
}

describe('The catalogue of tables', () => {
  it('holds what the schema says, column by column', async () => {
    for (const table of Object.values(tables)) {
      if (!is(table, PgTable)) continue;
      const name = getTableName(table);
      const rows = await api.factory.sql<{ column: string; not_null: boolean }>(
        `select attname as column, attnotnull as not_null from pg_attribute
         where attrelid = $1::regclass and attnum > 0 and not attisdropped order by 1`,
        [name],
      );
      const written = Object.values(getTableColumns(table))
        .map((column) => ({ column: column.name, not_null: column.notNull }))
        .sort((a, b) => (a.column < b.column ? -1 : 1));
      expect({ name, rows }).toEqual({ name, rows: written });
    }
  });

  it('has club_id in every primary and unique key of every tenant table', async () => {
    const names = await tenantTables();
    expect(names.length).toBeGreaterThan(25);
    const keys = await api.factory.sql<{ table: string; index: string; has_club: boolean }>(
      `select c.relname as table, i.indexrelid::regclass::text as index,
              exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attname = 'club_id'
                      and a.attnum = any (i.indkey)) as has_club
       from pg_index i join pg_class c on c.oid = i.indrelid where i.indisunique and c.relname = any ($1)`,
      [names],
    );
    expect(new Set(keys.map((key) => key.table))).toEqual(new Set(names));
    expect(keys.filter((key) => !key.has_club)).toEqual([]);
  });

  it('has club_id in every foreign key between tenant tables', async () => {
    const keys = await api.factory.sql<{ name: string }>(
      `select con.conname as name from pg_constraint con
       join pg_class c on c.oid = con.conrelid join pg_class r on r.oid = con.confrelid
       where con.contype = 'f' and c.relname = any ($1) and r.relname = any ($1)
         and not exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attname = 'club_id'
                         and a.attnum = any (con.conkey))`,
      [await tenantTables()],
    );
    expect(keys).toEqual([]);
  });

  it('forces row-level security on every tenant table and partition, with both policies', async () => {
    const all = new Map((await allTables()).map((table) => [table.name, table]));
    for (const name of await tenantTables()) {
      expect(all.get(name)).toMatchObject({ enabled: true, forced: true, owner: 'sixteenfold_owner' });
      const policies = await api.factory.sql<{ policyname: string }>(
        'select policyname from pg_policies where tablename = $1 order by 1',
        [name],
      );
      expect({ name, policies: policies.map((p) => p.policyname) }).toEqual({
        name,
        policies: ['own_club', 'owner_all'],
      });
    }
  });

  it('lets nobody of the application near accounts and tokens, and gives it no way round the walls', async () => {
    for (const table of ['account', 'refresh_token']) {
      await expect(api.db.execute(sql.raw(`select * from ${table}`))).rejects.toThrow();
    }
    const [role] = await api.factory.sql(
      `select rolsuper, rolbypassrls, rolcreaterole, rolcreatedb from pg_roles where rolname = 'sixteenfold_app'`,
    );
    expect(role).toEqual({ rolsuper: false, rolbypassrls: false, rolcreaterole: false, rolcreatedb: false });
  });

  it('has no SECURITY DEFINER function beside these, each with a fixed search path', async () => {
    const functions = await api.factory.sql<{ name: string; fixed: boolean; open: boolean }>(
      `select p.proname as name, coalesce(array_to_string(p.proconfig, ',') like '%search_path%', false) as fixed,
              has_function_privilege('public', p.oid, 'execute') as open
       from pg_proc p join pg_namespace n on n.oid = p.pronamespace
       where n.nspname = 'public' and p.prosecdef order by 1`,
    );
    expect(functions).toEqual(
      [
        'change_pictures',
        'clubs_training',
        'end_session',
        'memberships_of',
        'open_session',
        'pictures_of',
        'published_team_rows',
        'rehash_password',
        'rotate_session',
        'session_subject',
        'sign_in_lookup',
        'start_session',
      ].map((name) => ({ name, fixed: true, open: false })),
    );
  });
});

describe('Between two clubs', () => {
  let mine: Person;
  let theirs: Person;
  beforeAll(async () => {
    for (const side of ['mine', 'theirs'] as const) {
      const club = await api.factory.club();
      const person = await api.factory.person({ club });
      await api.factory.assign(club, 'pll');
      await new Phone(api, person).answerNext({ named: 'lost', aufBefore: null });
      if (side === 'mine') mine = person;
      else theirs = person;
    }
  });

  const trained = [
    'club',
    'membership',
    'programme',
    'showing',
    'review',
    'case_state',
    'first_answer',
    'rollup',
  ];

  it.each(trained)('a query on %s without a WHERE shows one club only', async (table) => {
    const all = await api.factory.sql(`select club_id from ${table}`);
    expect(new Set(all.map((row) => row.club_id)).size).toBeGreaterThan(1);
    const seen = await asMember(
      api.ctx(mine.claims),
      async (tx) => (await tx.execute(sql.raw(`select club_id from ${table}`))).rows,
    );
    expect(seen.length).toBeGreaterThan(0);
    expect(new Set(seen.map((row) => row.club_id))).toEqual(new Set([mine.clubId]));
  });

  it.each(trained)('without a session %s shows nothing', async (table) => {
    expect((await api.db.execute(sql.raw(`select 1 from ${table}`))).rows).toEqual([]);
  });

  it('nothing can be written into the other club', async () => {
    await expect(
      asMember(api.ctx(mine.claims), (tx) =>
        tx.insert(tables.programme).values({ clubId: theirs.clubId, setKey: 'oll', limitMs: 3000 }),
      ),
    ).rejects.toThrow();
    const changed = await asMember(api.ctx(mine.claims), (tx) =>
      tx.execute(sql`update membership set minutes_per_day = 1 where club_id = ${theirs.clubId}::uuid`),
    );
    expect(changed.rowCount).toBe(0);
  });

  it('the session ends with its transaction: the next user of the connection sees nothing', async () => {
    await asMember(api.ctx(mine.claims), (tx) => tx.execute(sql`select 1`));
    for (let n = 0; n < 10; n++) {
      expect((await api.db.execute(sql`select 1 from membership`)).rows).toEqual([]);
    }
  });
});

describe('Sets of a club’s own', () => {
  const TABLES = ['case_set', 'set_case', 'edition', 'edition_case', 'edition_algorithm'];
  let captain: Person;
  let other: Person;
  let setKey: string;
  beforeAll(async () => {
    const club = await api.factory.club();
    captain = await api.factory.person({ club, role: 'captain' });
    other = await api.factory.person({ role: 'captain' });
    const made = await api.as(captain.claims).post('/api/case-sets', {
      kind: 'whole',
      name: 'Edges after corners',
      entries: [{ entry: 'co', parts: 1 }],
      toldApart: ['eo'],
      solved: ['co', 'eo'],
    });
    setKey = made.body.setKey;
    await api.factory.sql(`insert into edition (set_key, number, published_at) values ($1, 1, now())`, [
      setKey,
    ]);
    await api.factory.sql(
      `insert into edition_case (set_key, edition_number, case_key, name, group_name)
       select set_key, 1, case_key, 'Own ' || number, '' from set_case where set_key = $1 and not is_skip`,
      [setKey],
    );
    await api.factory.sql(
      `insert into edition_algorithm (set_key, edition_number, case_key, rank, algorithm)
       select set_key, 1, case_key, 1, 'M ' || case_key from edition_case where set_key = $1`,
      [setKey],
    );
    const [one] = await api.factory.sql<{ case_key: string }>(
      'select case_key from set_case where set_key = $1 and not is_skip limit 1',
      [setKey],
    );
    const named = await api
      .as(captain.claims)
      .put(`/api/aliases/${setKey}/${one?.case_key}`, { alias: 'Among us' });
    expect(named.status).toBe(200);
  });

  const rowsOf = async (claims: Person['claims'], table: string) =>
    claims.role === 'administrator'
      ? asAdministrator(api.ctx(claims), (tx) => count(tx, table))
      : asMember(api.ctx(claims), (tx) => count(tx, table));
  const count = async (tx: Transaction, table: string) =>
    (await tx.execute(sql`select 1 from ${sql.identifier(table)} where set_key = ${setKey}`)).rows.length;

  it.each(TABLES)('%s shows them to their club and to administrators, and to nobody else', async (table) => {
    const administrator = await api.factory.administrator();
    expect(await rowsOf(captain.claims, table)).toBeGreaterThan(0);
    expect(await rowsOf(administrator.claims, table)).toBeGreaterThan(0);
    expect(await rowsOf(other.claims, table)).toBe(0);
    const outside = await api.db.execute(
      sql`select 1 from ${sql.identifier(table)} where set_key = ${setKey}`,
    );
    expect(outside.rows).toEqual([]);
  });

  it('what one club has read of its set is not shown to another', async () => {
    for (const path of [`/api/catalogue/sets/${setKey}`, `/api/catalogue/sets/${setKey}/editions/1`]) {
      expect((await api.as(captain.claims).get(path)).status).toBe(200);
      expect((await api.as(other.claims).get(path)).status).toBe(404);
    }
  });

  it('aliases are the club’s own', async () => {
    const aliases = (claims: Person['claims']) =>
      asMember(
        api.ctx(claims),
        async (tx) => (await tx.execute<{ alias: string }>(sql`select alias from case_alias`)).rows,
      );
    expect(await aliases(captain.claims)).toEqual([{ alias: 'Among us' }]);
    expect(await aliases(other.claims)).toEqual([]);
    expect((await api.db.execute(sql`select 1 from case_alias`)).rows).toEqual([]);
  });

  it('nobody writes into another club’s, a member into none, and a definition stays as it is', async () => {
    const member = await api.factory.person({ club: { clubId: captain.clubId, name: '' } });
    const insert = (claims: Person['claims'], clubId: string | null) =>
      asMember(api.ctx(claims), (tx) =>
        tx
          .insert(tables.caseSet)
          .values({ setKey: 'smuggled', name: 'Smuggled', entry: 'any', toldApart: [], solved: [], clubId }),
      );
    await expect(insert(other.claims, captain.clubId)).rejects.toThrow();
    await expect(insert(member.claims, captain.clubId)).rejects.toThrow();
    await expect(insert(captain.claims, null)).rejects.toThrow();
    const change = (claims: Person['claims'], what: ReturnType<typeof sql>) =>
      asMember(api.ctx(claims), (tx) =>
        tx.execute(sql`update case_set set ${what} where set_key = ${setKey}`),
      );
    expect((await change(other.claims, sql`retired_at = now()`)).rowCount).toBe(0);
    expect((await change(member.claims, sql`retired_at = now()`)).rowCount).toBe(0);
    await expect(change(captain.claims, sql`entry = 'any'`)).rejects.toThrow();
    await expect(
      asMember(api.ctx(captain.claims), (tx) =>
        tx.execute(sql`insert into set_case (set_key, case_key, number, canonical, weight, angles, cluster, is_skip)
          values ('pll', 'smuggled', 99, 0, 1, 1, 0, false)`),
      ),
    ).rejects.toThrow();
  });
});

describe('What is written once', () => {
  it('the application cannot change or take back a row of the log', async () => {
    const club = await api.factory.club();
    const person = await api.factory.person({ club });
    await api.factory.assign(club, 'pll');
    await new Phone(api, person).answerNext();
    for (const statement of [
      "update review set outcome = 'missed'",
      'delete from review',
      'delete from mis_tap',
    ]) {
      await expect(
        asMember(api.ctx(person.claims), (tx) => tx.execute(sql.raw(statement))),
      ).rejects.toThrow();
    }
  });

  it('an edition cannot be changed, not even by the owner', async () => {
    for (const statement of [
      "update edition set note = 'other'",
      "update edition_case set name = 'X' where set_key = 'pll'",
      "delete from edition_algorithm where set_key = 'pll'",
    ]) {
      await expect(api.factory.sql(statement)).rejects.toThrow(/append-only/);
    }
  });

  it('only a session opened as administrator writes the catalogue or sees drafts', async () => {
    const captain = await api.factory.person({ role: 'captain' });
    await expect(
      asMember(api.ctx(captain.claims), (tx) =>
        tx.execute(sql`insert into edition (set_key, number, published_at) values ('pll', 99, now())`),
      ),
    ).rejects.toThrow();
    const drafts = await asMember(api.ctx(captain.claims), (tx) =>
      tx.execute(sql`select 1 from intake_draft`),
    );
    expect(drafts.rows).toEqual([]);
  });

  it('rows go to the partition of their id, and none lands in the one for odd clocks', async () => {
    const rows = await api.factory.sql<{ partition: string }>(
      'select distinct tableoid::regclass::text as partition from review',
    );
    expect(rows.length).toBeGreaterThan(0);
    for (const { partition } of rows) expect(partition).toMatch(/^review_20\d\d_\d\d$/);
  });
});
