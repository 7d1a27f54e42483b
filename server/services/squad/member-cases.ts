import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';
import type { MyCase } from '#shared/contracts/member.ts';
import { caseStateName, dueDay, type Outcome, recall } from '#shared/memory/index.ts';
import { casePicture } from '../catalogue/case-picture.ts';
import { isoDate } from '../standing/local-date.ts';
import { cardsOf, type DayCard } from '../training/cards.ts';
import type { MemberDay } from '../training/member-day.ts';

/** Every case a member answers for, those that lose most solves first: prior × (1 − recall now). */
export async function memberCases(tx: Transaction, day: MemberDay): Promise<MyCase[]> {
  const last = await lastOutcomes(tx, day);
  return cardsOf(day)
    .map((card) => ({ card, lost: lossOf(card, day.day) }))
    .sort((a, b) => b.lost - a.lost || a.card.case.number - b.card.case.number)
    .map(({ card }) => presentCase(card, day.day, last.get(card.key) ?? null));
}

function lossOf({ prior, memory }: DayCard, day: number): number {
  return prior * (1 - (memory ? recall(memory, day) : 0));
}

function presentCase(card: DayCard, day: number, lastOutcome: Outcome | null): MyCase {
  const { trained, memory, wanted } = card;
  const known = trained.content.cases.get(card.key);
  const algorithm = known?.algorithms[0]?.algorithm;
  return {
    setKey: trained.entry.setKey,
    setName: trained.entry.setName,
    key: card.key,
    name: known?.name ?? card.case.name,
    group: known?.group ?? card.case.group,
    picture: casePicture(trained.set, card.case, algorithm),
    algorithm: algorithm ?? '',
    prior: { weight: card.case.weight, total: trained.set.states },
    angles: card.case.angles,
    state: caseStateName(memory, day, wanted),
    recall: memory ? recall(memory, day) : null,
    nextDate: memory ? isoDate(dueDay(memory, wanted)) : null,
    answers: memory?.answers ?? 0,
    lastOutcome,
  };
}

async function lastOutcomes(tx: Transaction, { actor }: MemberDay): Promise<Map<string, Outcome>> {
  const { rows } = await tx.execute<{ case_key: string; outcome: Outcome }>(sql`
    select distinct on (case_key) case_key, outcome from review
    where club_id = ${actor.clubId}::uuid and member_id = ${actor.memberId}::uuid
    order by case_key, answered_at desc, review_id desc`);
  return new Map(rows.map((row) => [row.case_key, row.outcome]));
}
