import { and, desc, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { Picture } from '#shared/contracts/common.ts';
import type { MyCaseView } from '#shared/contracts/member.ts';
import { AUFS, act, readAlgorithm } from '#shared/lastlayer/index.ts';
import { TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';
import { notFound } from '../../http/problem.ts';
import { casePicture, seenStickers } from '../catalogue/case-picture.ts';
import { asMember, type Ctx } from '../context.ts';
import { isoDate } from '../standing/local-date.ts';
import { cardsOf, type DayCard } from '../training/cards.ts';
import { logOfCases } from '../training/day-counts.ts';
import type { MemberDay } from '../training/member-day.ts';
import { readMemberDay } from '../training/member-day.ts';
import { presentCase } from './present-case.ts';
import { readShifts } from './read-shifts.ts';

const LATEST = 20;

/**
 * One case of the member's programme with its angles, algorithms, mirror partner and latest answers.
 * @throws Problem not-found for a case that is not on it.
 */
export async function readMyCase(ctx: Ctx, { key }: { key: string }): Promise<MyCaseView> {
  return asMember(ctx, async (tx, actor) => {
    const day = await readMemberDay(ctx, tx, actor);
    const card = cardsOf(day).find((one) => one.key === key);
    if (!card) throw notFound('There is no such case on your programme.');
    const shift = (await readShifts(tx, day)).get(card.trained.entry.setKey) ?? 0;
    const answers = await latestAnswers(tx, day, card);
    return {
      date: isoDate(day.day),
      case: presentCase(day, card, shift, answers[0]?.outcome ?? null),
      angles: anglesOf(card),
      algorithms: [...(card.trained.content.cases.get(key)?.algorithms ?? [])],
      mirror: mirrorOf(card),
      answers,
    };
  });
}

/** One picture per really different angle, the one that needs no AUF before the first algorithm first. */
function anglesOf({ trained, case: c }: DayCard): Picture[] {
  const algorithm = trained.content.cases.get(c.key)?.algorithms[0]?.algorithm;
  const reading = algorithm === undefined ? null : readAlgorithm(algorithm);
  const front =
    reading?.kind === 'state' && trained.set.caseOfState(reading.state)?.key === c.key
      ? reading.state
      : c.canonical;
  return AUFS.slice(0, c.angles).map((turns) => ({
    stickers: seenStickers(trained.set, act(front, turns, 0)),
    colouring: TABLE_COLOURING,
  }));
}

function mirrorOf({ trained, case: c }: DayCard): MyCaseView['mirror'] {
  const partner = trained.set.mirrorOf(c);
  const edition = trained.content.cases.get(partner.key);
  if (!edition || partner.key === c.key) return null;
  return {
    key: partner.key,
    name: edition.name,
    picture: casePicture(trained.set, partner, edition.algorithms[0]?.algorithm),
  };
}

async function latestAnswers(
  tx: Transaction,
  day: MemberDay,
  { key, trained }: DayCard,
): Promise<MyCaseView['answers']> {
  const { review } = tables;
  const { clubId, memberId } = day.actor;
  const rows = await tx
    .select()
    .from(review)
    .where(and(eq(review.clubId, clubId), eq(review.memberId, memberId), eq(review.caseKey, key)))
    .orderBy(desc(review.answeredAt), desc(review.reviewId))
    .limit(LATEST);
  const { misTaps } = await logOfCases(tx, day.actor, [key]);
  return rows.map((row) => ({
    id: row.reviewId,
    at: row.answeredAt.getTime(),
    outcome: row.outcome,
    named: trained.content.cases.get(row.named)?.name ?? row.named,
    recognitionMs: row.recognitionMs,
    lostBy: row.lostBy,
    scored: row.scored,
    misTapped: misTaps.has(row.reviewId),
  }));
}
