import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { ProgrammeView } from '#shared/contracts/desk.ts';
import { editionNumbers } from '../catalogue/read-edition.ts';
import { asCaptain, type Ctx } from '../context.ts';
import { groupBy } from '../group-by.ts';

/** What the club trains, and what it could. */
export async function readProgrammeView(ctx: Ctx): Promise<ProgrammeView> {
  return asCaptain(ctx, (tx, { clubId }) => programmeView(tx, clubId));
}

/** The view within a transaction that is open already: edits answer with it. */
export async function programmeView(tx: Transaction, clubId: string): Promise<ProgrammeView> {
  const editions = await editionNumbers(tx);
  const rows = await assigned(tx, clubId);
  const chosen = groupBy(await answering(tx, clubId), (row) => row.setKey);
  const names = await setNames(tx);
  return {
    rows: rows.map((row) => ({
      setKey: row.setKey,
      name: names.get(row.setKey)?.name ?? row.setKey,
      pinnedEdition: row.pinnedEdition,
      newestEdition: editions.get(row.setKey)?.[0] ?? null,
      limitMs: row.limitMs,
      asksAuf: row.asksAuf,
      forEveryone: row.forEveryone,
      memberIds: row.forEveryone ? [] : (chosen.get(row.setKey) ?? []).map(({ memberId }) => memberId),
      version: row.version,
    })),
    available: [...editions]
      .filter(([setKey]) => names.has(setKey) && !rows.some((row) => row.setKey === setKey))
      .map(([setKey, numbers]) => ({
        setKey,
        name: names.get(setKey)?.name ?? setKey,
        editions: numbers,
        cases: names.get(setKey)?.cases ?? 0,
      }))
      .sort((a, b) => a.cases - b.cases || a.name.localeCompare(b.name, 'en')),
    editions: Object.fromEntries(editions),
    members: await people(tx, clubId),
  };
}

async function assigned(tx: Transaction, clubId: string) {
  const { programme } = tables;
  return tx
    .select()
    .from(programme)
    .where(eq(programme.clubId, clubId))
    .orderBy(asc(programme.position), asc(programme.setKey));
}

/** Who is chosen for sets that are not for everyone; people who have left are not counted. */
async function answering(tx: Transaction, clubId: string) {
  const { programmeMember, membership } = tables;
  return tx
    .select({ setKey: programmeMember.setKey, memberId: programmeMember.memberId })
    .from(programmeMember)
    .innerJoin(
      membership,
      and(eq(membership.clubId, programmeMember.clubId), eq(membership.memberId, programmeMember.memberId)),
    )
    .where(and(eq(programmeMember.clubId, clubId), isNull(membership.leftAt)))
    .orderBy(asc(sql`lower(${membership.nickname})`));
}

async function people(tx: Transaction, clubId: string): Promise<ProgrammeView['members']> {
  const { membership } = tables;
  return tx
    .select({ memberId: membership.memberId, nickname: membership.nickname })
    .from(membership)
    .where(and(eq(membership.clubId, clubId), isNull(membership.leftAt)))
    .orderBy(asc(sql`lower(${membership.nickname})`));
}

async function setNames(tx: Transaction): Promise<Map<string, { name: string; cases: number }>> {
  const { rows } = await tx.execute<{ set_key: string; name: string; cases: number }>(sql`
    select s.set_key, s.name,
      (select count(*)::int from set_case c where c.set_key = s.set_key and not c.is_skip) as cases
    from case_set s where s.retired_at is null and (
      exists (select 1 from edition e where e.set_key = coalesce(s.parent_key, s.set_key))
      or exists (select 1 from programme p where p.set_key = s.set_key))`);
  return new Map(rows.map((row) => [row.set_key, { name: row.name, cases: row.cases }]));
}
