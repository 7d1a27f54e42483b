import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { type CaseSet, caseSet } from '#shared/lastlayer/index.ts';
import type { CaseMemory } from '#shared/memory/index.ts';
import { type EditionContent, readEditionContent } from '../catalogue/read-edition.ts';
import type { ClubActor, Ctx } from '../context.ts';
import { dayOf } from '../standing/local-date.ts';
import { type ProgrammeEntry, programmeOfMember, readProgramme } from './read-programme.ts';

export type MembershipRow = typeof tables.membership.$inferSelect;
export type ShowingRow = typeof tables.showing.$inferSelect;

/** A set on the member's programme, with its cases and their memory. */
export interface TrainedSet {
  readonly entry: ProgrammeEntry;
  readonly set: CaseSet;
  readonly content: EditionContent;
}

/** All that a member's queue of one local day is made from. Memory changes as answers are folded in. */
export interface TrainingDay {
  readonly actor: ClubActor;
  readonly member: MembershipRow;
  readonly day: number;
  readonly sets: readonly TrainedSet[];
  readonly memory: Map<string, CaseMemory>;
}

/**
 * Reads a member's day and holds their membership row until the transaction ends: two devices of one member
 * take turns, nobody else waits.
 */
export async function readTrainingDay(ctx: Ctx, tx: Transaction, actor: ClubActor): Promise<TrainingDay> {
  const { membership } = tables;
  const [member] = await tx
    .select()
    .from(membership)
    .where(and(eq(membership.clubId, actor.clubId), eq(membership.memberId, actor.memberId)))
    .for('no key update');
  if (!member) throw new Error('A session was opened for a membership that is not there.');
  const entries = programmeOfMember(await readProgramme(tx, actor.clubId), actor.memberId);
  const sets: TrainedSet[] = [];
  for (const entry of entries) {
    sets.push({
      entry,
      set: caseSet(entry.setKey),
      content: await readEditionContent(tx, entry.setKey, entry.edition),
    });
  }
  return { actor, member, day: dayOf(ctx, actor), sets, memory: await readMemory(tx, actor) };
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

/** Showings issued and not yet answered, in the order they are to be shown. */
export async function openShowings(tx: Transaction, day: TrainingDay): Promise<ShowingRow[]> {
  const { showing } = tables;
  const setKeys = day.sets.map(({ entry }) => entry.setKey);
  if (setKeys.length === 0) return [];
  const rows = await tx
    .select()
    .from(showing)
    .where(
      and(
        eq(showing.clubId, day.actor.clubId),
        eq(showing.memberId, day.actor.memberId),
        eq(showing.localDay, day.day),
        isNull(showing.reviewId),
        inArray(showing.setKey, setKeys),
      ),
    )
    .orderBy(asc(showing.position));
  // An edition published since may have dropped the case, or the club may have pinned another one.
  return rows.filter((row) =>
    day.sets.some((s) => s.entry.setKey === row.setKey && s.content.cases.has(row.caseKey)),
  );
}
