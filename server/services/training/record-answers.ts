import { and, eq, inArray, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { AnswerInput, AnswersInput, AnswersResult } from '#shared/contracts/today.ts';
import { Problem } from '../../http/problem.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { readEditionContent } from '../catalogue/read-edition.ts';
import { asMember, type Ctx } from '../context.ts';
import { bodyHash } from './body-hash.ts';
import type { ReviewRow } from './day-counts.ts';
import { followAnswers } from './follow-answers.ts';
import { gradeShowing, wrongChoice } from './grade-showing.ts';
import { presentToday } from './present-today.ts';
import { presentVerdicts } from './present-verdict.ts';
import { readTrainingDay, type TrainingDay } from './training-day.ts';

/** An id made longer ago, or further ahead, than this is refused: the client makes a new one. */
const OLDEST_ID_MS = 400 * 86_400_000;
const NEWEST_ID_MS = 48 * 3_600_000;

interface Refusal {
  readonly id: string;
  readonly detail: string;
}

/**
 * Stores answers, each id once: a resent one is answered as before, the same id with another body is refused.
 * Memory, first answers and rollups follow in the same transaction.
 * @throws Problem cannot-take when every answer is refused.
 */
export async function recordAnswers(ctx: Ctx, input: AnswersInput): Promise<AnswersResult> {
  return asMember(ctx, async (tx, actor) => {
    const day = await readTrainingDay(ctx, tx, actor);
    const sorted = await sortAnswers(ctx, tx, day, input.answers);
    if (sorted.refused.length === input.answers.length) {
      throw new Problem('cannot-take', sorted.refused[0]?.detail ?? 'No answer could be taken.', {
        errors: sorted.refused.map(({ id, detail }) => ({
          pointer: `/answers/${input.answers.findIndex((a) => a.id === id)}`,
          detail,
        })),
      });
    }
    const stored = await storeAnswers(tx, day, sorted.fresh);
    const follow = await followAnswers(ctx, tx, day, stored);
    const verdicts = await presentVerdicts(tx, day, [
      ...stored.map((row) => ({
        row,
        status: 'stored' as const,
        returns: follow.returning.has(row.caseKey),
      })),
      ...sorted.already.map((row) => ({ row, status: 'already' as const, returns: false })),
    ]);
    return { verdicts, refused: sorted.refused, today: await presentToday(ctx, tx, day) };
  });
}

interface Sorted {
  fresh: { answer: AnswerInput; row: typeof tables.review.$inferInsert }[];
  already: ReviewRow[];
  refused: Refusal[];
}

async function sortAnswers(
  ctx: Ctx,
  tx: Transaction,
  day: TrainingDay,
  answers: readonly AnswerInput[],
): Promise<Sorted> {
  const { review, showing } = tables;
  const mine = and(eq(review.clubId, day.actor.clubId), eq(review.memberId, day.actor.memberId));
  const known = new Map(
    (
      await tx
        .select()
        .from(review)
        .where(
          and(
            mine,
            inArray(
              review.reviewId,
              answers.map((a) => a.id),
            ),
          ),
        )
    ).map((row) => [row.reviewId, row]),
  );
  const showings = new Map(
    (
      await tx
        .select()
        .from(showing)
        .where(
          and(
            eq(showing.clubId, day.actor.clubId),
            eq(showing.memberId, day.actor.memberId),
            inArray(
              showing.showingId,
              answers.map((a) => a.showingId),
            ),
          ),
        )
    ).map((row) => [row.showingId, row]),
  );
  const now = ctx.clock.now();
  const sorted: Sorted = { fresh: [], already: [], refused: [] };
  const taken = new Map<string, string>();
  const hashes = new Map<string, Buffer>();
  for (const answer of answers) {
    const refuse = (detail: string) => sorted.refused.push({ id: answer.id, detail });
    const stored = known.get(answer.id);
    const hash = bodyHash(answer);
    if (stored) {
      if (hash.equals(stored.bodyHash)) sorted.already.push(stored);
      else refuse('This id was stored with another answer.');
      continue;
    }
    const twin = hashes.get(answer.id);
    if (twin) {
      // Twice in one request: the same body is a resend, another body is not this answer.
      if (!twin.equals(hash)) refuse('This id came with two answers.');
      continue;
    }
    const shown = showings.get(answer.showingId);
    const idAt = Number.parseInt(answer.id.replaceAll('-', '').slice(0, 12), 16);
    if (answer.id[14] !== '7' || idAt < now - OLDEST_ID_MS || idAt > now + NEWEST_ID_MS) {
      refuse('The id was not made at a time that can be. Make a new one.');
    } else if (!shown) {
      refuse('This showing was not issued to you.');
    } else if (shown.reviewId !== null || taken.has(shown.showingId)) {
      refuse('This showing was answered before, here or on another device. The first answer stands.');
    } else {
      const content = await readEditionContent(tx, shown.setKey, shown.editionNumber);
      const set = await loadCaseSet(tx, shown.setKey);
      const wrong = wrongChoice(shown, set, content, answer);
      if (wrong) {
        refuse(wrong);
        continue;
      }
      try {
        sorted.fresh.push({ answer, row: gradeShowing(day, shown, { set, content }, answer, now) });
        taken.set(shown.showingId, answer.id);
        hashes.set(answer.id, hash);
      } catch (error) {
        if (!(error instanceof Problem)) throw error;
        refuse(error.detail);
      }
    }
  }
  return sorted;
}

async function storeAnswers(tx: Transaction, day: TrainingDay, fresh: Sorted['fresh']): Promise<ReviewRow[]> {
  if (fresh.length === 0) return [];
  const { review, showing } = tables;
  const rows = await tx
    .insert(review)
    .values(fresh.map(({ row }) => row))
    .returning();
  const pairs = sql.join(
    rows.map((row) => sql`(${row.showingId}::uuid, ${row.reviewId}::uuid)`),
    sql`, `,
  );
  const marked = await tx.execute(sql`
    update ${showing} set review_id = answer.review_id
    from (values ${pairs}) as answer (showing_id, review_id)
    where ${showing.clubId} = ${day.actor.clubId}::uuid and ${showing.memberId} = ${day.actor.memberId}::uuid
      and ${showing.showingId} = answer.showing_id and ${showing.reviewId} is null`);
  // The membership row is held, so nobody can have come in between; if somebody did, nothing is stored.
  if (marked.rowCount !== rows.length) {
    throw new Problem('conflict', 'This showing was answered meanwhile. Try again.');
  }
  const answered = new Set(rows.map((row) => row.showingId));
  for (const s of day.open) if (answered.has(s.showingId)) day.answered.set(s.showingId, s);
  const left = day.open.filter((s) => !answered.has(s.showingId));
  day.open.splice(0, day.open.length, ...left);
  return rows;
}
