import { getTableColumns, getTableName, is, sql } from 'drizzle-orm';
import { PgTable } from 'drizzle-orm/pg-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { tables } from '#database/client.ts';
import { asMember } from '#server/services/context.ts';
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
