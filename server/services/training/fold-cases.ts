import { and, eq, gte, inArray } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { type CaseMemory, foldCase, type LogRow } from '#shared/memory/index.ts';
import type { ClubActor } from '../context.ts';
import { groupBy } from '../group-by.ts';
import { type LoggedAnswer, logOfCases } from './day-counts.ts';

/** A row of the log as the fold takes it. */
export function logRow(row: LoggedAnswer, misTaps: ReadonlySet<string>): LogRow {
  return {
    id: row.reviewId,
    answeredAt: row.answeredAt.getTime(),
    localDay: row.localDay,
    outcome: row.outcome,
    scored: row.scored,
    keysOffered: row.keysOffered,
    misTapped: misTaps.has(row.reviewId),
  };
}

/**
 * Folds the whole log of these cases anew and writes what follows from it: the cases' memory and their first
 * answers of each day. The same code serves an answer, a late answer, a mis-tap and a rebuild.
 *
 * @param fromDay the earliest local day whose answers changed: first answers of earlier days cannot have, and stay
 */
export async function foldCases(
  tx: Transaction,
  actor: Pick<ClubActor, 'clubId' | 'memberId'>,
  caseKeys: readonly string[],
  fromDay = 0,
): Promise<Map<string, CaseMemory>> {
  const { caseState, firstAnswer } = tables;
  const folded = new Map<string, CaseMemory>();
  if (caseKeys.length === 0) return folded;
  const { rows, misTaps } = await logOfCases(tx, actor, caseKeys);
  const byCase = groupBy(rows, (row) => row.caseKey);
  const states: (typeof caseState.$inferInsert)[] = [];
  const firsts: (typeof firstAnswer.$inferInsert)[] = [];
  for (const [caseKey, log] of byCase) {
    // A case can have been answered through a subset first and its parent later: each row says which.
    const answers = new Map(log.map((row) => [row.reviewId, row]));
    const fold = foldCase(log.map((row) => logRow(row, misTaps)));
    if (fold.memory) {
      folded.set(caseKey, fold.memory);
      const { lastId, ...memory } = fold.memory;
      states.push({
        clubId: actor.clubId,
        memberId: actor.memberId,
        caseKey,
        setKey: answers.get(lastId)?.setKey ?? '',
        ...memory,
        lastReviewId: lastId,
      });
    }
    for (const first of fold.firsts) {
      if (first.localDay < fromDay) continue;
      const answer = answers.get(first.id);
      firsts.push({
        clubId: actor.clubId,
        memberId: actor.memberId,
        caseKey,
        setKey: answer?.setKey ?? '',
        localDay: first.localDay,
        reviewId: first.id,
        recallBefore: first.recallBefore,
        keysOffered: first.keysOffered,
        held: first.held,
        onBoards: answer?.onBoards === true && !answer.carried,
      });
    }
  }
  const mine = (table: typeof caseState | typeof firstAnswer) =>
    and(
      eq(table.clubId, actor.clubId),
      eq(table.memberId, actor.memberId),
      inArray(table.caseKey, [...caseKeys]),
    );
  await tx.delete(caseState).where(mine(caseState));
  await tx.delete(firstAnswer).where(and(mine(firstAnswer), gte(firstAnswer.localDay, fromDay)));
  if (states.length > 0) await tx.insert(caseState).values(states);
  if (firsts.length > 0) await tx.insert(firstAnswer).values(firsts);
  return folded;
}
