import { and, asc, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { newestEditions } from '../catalogue/read-edition.ts';

/** A set the club trains. */
export interface ProgrammeEntry {
  readonly setKey: string;
  readonly setName: string;
  /** The edition in force: the pinned one, or the newest. */
  readonly edition: number;
  readonly pinned: boolean;
  readonly limitMs: number;
  readonly asksAuf: boolean;
  readonly forEveryone: boolean;
  readonly position: number;
  /** Who answers for it; null for everyone. */
  readonly memberIds: ReadonlySet<string> | null;
}

/** The club's programme in its order. Sets without any edition are left out: there is nothing to train yet. */
export async function readProgramme(tx: Transaction, clubId: string): Promise<ProgrammeEntry[]> {
  const { programme, programmeMember, caseSet } = tables;
  const rows = await tx
    .select({
      setKey: programme.setKey,
      setName: caseSet.name,
      pinnedEdition: programme.pinnedEdition,
      limitMs: programme.limitMs,
      asksAuf: programme.asksAuf,
      forEveryone: programme.forEveryone,
      position: programme.position,
      memberId: programmeMember.memberId,
    })
    .from(programme)
    .innerJoin(caseSet, eq(caseSet.setKey, programme.setKey))
    .leftJoin(
      programmeMember,
      and(eq(programmeMember.clubId, programme.clubId), eq(programmeMember.setKey, programme.setKey)),
    )
    .where(eq(programme.clubId, clubId))
    .orderBy(asc(programme.position), asc(programme.setKey));
  const newest = await newestEditions(tx);
  const entries = new Map<string, ProgrammeEntry & { memberIds: Set<string> | null }>();
  for (const row of rows) {
    const edition = row.pinnedEdition ?? newest.get(row.setKey);
    if (edition === undefined) continue;
    const entry = entries.get(row.setKey) ?? {
      setKey: row.setKey,
      setName: row.setName,
      edition,
      pinned: row.pinnedEdition !== null,
      limitMs: row.limitMs,
      asksAuf: row.asksAuf,
      forEveryone: row.forEveryone,
      position: row.position,
      memberIds: row.forEveryone ? null : new Set<string>(),
    };
    if (row.memberId !== null) entry.memberIds?.add(row.memberId);
    entries.set(row.setKey, entry);
  }
  return [...entries.values()];
}

/** The sets one member answers for. */
export function programmeOfMember(entries: readonly ProgrammeEntry[], memberId: string): ProgrammeEntry[] {
  return entries.filter((entry) => entry.memberIds === null || entry.memberIds.has(memberId));
}
