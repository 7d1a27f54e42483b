import { and, eq, isNull } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { uuid } from '#shared/contracts/common.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { notFound } from '../../http/problem.ts';
import { readEditionContent } from '../catalogue/read-edition.ts';
import type { ClubActor, Ctx } from '../context.ts';
import { dayOf } from '../standing/local-date.ts';
import { programmeOfMember, readProgramme } from '../training/read-programme.ts';
import { memoryOfRow, type TrainedSet, type TrainingDay } from '../training/training-day.ts';

const NOT_HERE = 'There is no such member in your club.';

/**
 * A member's day as their captain looks at it: the same as the member's own, but nothing is held and nothing
 * is issued.
 * @throws Problem not-found for somebody who is not in the club (any more).
 */
export async function readMemberDay(
  ctx: Ctx,
  tx: Transaction,
  captain: ClubActor,
  memberId: string,
): Promise<TrainingDay> {
  const { membership, caseState } = tables;
  if (!uuid.safeParse(memberId).success) throw notFound(NOT_HERE);
  const [member] = await tx
    .select()
    .from(membership)
    .where(
      and(
        eq(membership.clubId, captain.clubId),
        eq(membership.memberId, memberId),
        isNull(membership.leftAt),
      ),
    );
  if (!member) throw notFound(NOT_HERE);
  const { accountId, role, nickname, timeZone, rolloverHour } = member;
  const actor: ClubActor = { ...captain, accountId, memberId, role, nickname, timeZone, rolloverHour };
  const sets: TrainedSet[] = [];
  for (const entry of programmeOfMember(await readProgramme(tx, captain.clubId), memberId)) {
    sets.push({
      entry,
      set: caseSet(entry.setKey),
      content: await readEditionContent(tx, entry.setKey, entry.edition),
    });
  }
  const states = await tx
    .select()
    .from(caseState)
    .where(and(eq(caseState.clubId, captain.clubId), eq(caseState.memberId, memberId)));
  return {
    actor,
    member,
    day: dayOf(ctx, actor),
    sets,
    memory: new Map(states.map((row) => [row.caseKey, memoryOfRow(row)])),
  };
}
