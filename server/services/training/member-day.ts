import { and, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import type { CaseMemory } from '#shared/memory/index.ts';
import { withAliases } from '../aliases/with-aliases.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { readAliases } from '../catalogue/read-aliases.ts';
import { type EditionContent, readEditionContent } from '../catalogue/read-edition.ts';
import type { ClubActor, Ctx } from '../context.ts';
import { dayOf } from '../standing/local-date.ts';
import { type ProgrammeEntry, programmeOfMember, readProgramme } from './read-programme.ts';

export type MembershipRow = typeof tables.membership.$inferSelect;

/** A set on the member's programme, with its cases. */
export interface TrainedSet {
  readonly entry: ProgrammeEntry;
  readonly set: CaseSet;
  readonly content: EditionContent;
}

/** What a member answers for on a local day, and their memory of it. */
export interface MemberDay {
  readonly actor: ClubActor;
  readonly member: MembershipRow;
  readonly day: number;
  readonly sets: readonly TrainedSet[];
  readonly memory: Map<string, CaseMemory>;
  /** What the club calls cases, by case key. */
  readonly aliases: ReadonlyMap<string, string>;
}

/**
 * Reads a member's day. With `hold`, their membership row is held until the transaction ends: two devices of one
 * member take turns, nobody else waits. Pages that change nothing read without.
 */
export async function readMemberDay(
  ctx: Pick<Ctx, 'clock'>,
  tx: Transaction,
  actor: ClubActor,
  { hold = false } = {},
): Promise<MemberDay> {
  const { membership } = tables;
  const query = tx
    .select()
    .from(membership)
    .where(and(eq(membership.clubId, actor.clubId), eq(membership.memberId, actor.memberId)));
  const [member] = await (hold ? query.for('no key update') : query);
  if (!member) throw new Error('A session was opened for a membership that is not there.');
  const aliases = await readAliases(tx, actor);
  const sets: TrainedSet[] = [];
  for (const entry of programmeOfMember(await readProgramme(tx, actor.clubId), actor.memberId)) {
    sets.push({
      entry,
      set: await loadCaseSet(tx, entry.setKey),
      content: withAliases(await readEditionContent(tx, entry.setKey, entry.edition), aliases),
    });
  }
  return { actor, member, day: dayOf(ctx, actor), sets, memory: await readMemory(tx, actor), aliases };
}

async function readMemory(tx: Transaction, actor: ClubActor): Promise<Map<string, CaseMemory>> {
  const { caseState } = tables;
  const rows = await tx
    .select()
    .from(caseState)
    .where(and(eq(caseState.clubId, actor.clubId), eq(caseState.memberId, actor.memberId)));
  return new Map(rows.map((row) => [row.caseKey, memoryOfRow(row)]));
}

export function memoryOfRow(row: typeof tables.caseState.$inferSelect): CaseMemory {
  const { stability, difficulty, firstDay, lastDay, answers, lapses, lastReviewId } = row;
  return { stability, difficulty, firstDay, lastDay, answers, lapses, lastId: lastReviewId };
}
