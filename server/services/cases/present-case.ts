import { and, desc, eq, inArray } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { MyCase } from '#shared/contracts/member.ts';
import { caseStateName, dueDay, recall } from '#shared/memory/index.ts';
import { calibrated } from '#shared/standing/index.ts';
import { casePicture } from '../catalogue/case-picture.ts';
import { isoDate } from '../standing/local-date.ts';
import { type DayCard, tellingDay } from '../training/cards.ts';
import type { MemberDay } from '../training/member-day.ts';

type LastOutcome = NonNullable<MyCase['lastOutcome']>;

/** A case as its member sees it today. `shift` is the calibration of its set. */
export function presentCase(
  day: MemberDay,
  card: DayCard,
  shift: number,
  lastOutcome: LastOutcome | null,
): MyCase {
  const { trained, case: c, memory, wanted, slipsBelow } = card;
  const { entry, set, content } = trained;
  const told = memory ? tellingDay(day.day, memory) : day.day;
  const edition = content.cases.get(c.key);
  const algorithm = edition?.algorithms[0]?.algorithm;
  return {
    setKey: entry.setKey,
    setName: entry.setName,
    key: c.key,
    name: edition?.name ?? c.name,
    tradeName: edition?.tradeName ?? null,
    group: edition?.group ?? '',
    picture: casePicture(set, c, algorithm),
    algorithm: algorithm ?? '',
    prior: { weight: c.weight, total: set.total },
    angles: c.angles,
    state: caseStateName(memory, told, slipsBelow),
    recall: memory ? calibrated(recall(memory, told), shift) : null,
    nextDate: memory ? isoDate(Math.max(day.day, dueDay(memory, wanted))) : null,
    answers: memory?.answers ?? 0,
    lastOutcome,
  };
}

/** The outcome of each case's latest answer, whatever it was. */
export async function lastOutcomes(
  tx: Transaction,
  day: MemberDay,
  caseKeys: readonly string[],
): Promise<Map<string, LastOutcome>> {
  if (caseKeys.length === 0) return new Map();
  const { review } = tables;
  const rows = await tx
    .selectDistinctOn([review.caseKey], { caseKey: review.caseKey, outcome: review.outcome })
    .from(review)
    .where(
      and(
        eq(review.clubId, day.actor.clubId),
        eq(review.memberId, day.actor.memberId),
        inArray(review.caseKey, [...caseKeys]),
      ),
    )
    .orderBy(review.caseKey, desc(review.answeredAt), desc(review.reviewId));
  return new Map(rows.map((row) => [row.caseKey, row.outcome]));
}
