import type { Transaction } from '#database/client.ts';
import type { MyCase } from '#shared/contracts/member.ts';
import { lastOutcomes, presentCase } from '../cases/present-case.ts';
import { readShifts } from '../cases/read-shifts.ts';
import { cardsOf } from '../training/cards.ts';
import type { MemberDay } from '../training/member-day.ts';

/** Every case a member answers for, those that lose most solves first: prior × (1 − recall now). */
export async function memberCases(tx: Transaction, day: MemberDay): Promise<MyCase[]> {
  const cards = cardsOf(day);
  const shifts = await readShifts(tx, day);
  const outcomes = await lastOutcomes(
    tx,
    day,
    cards.map((card) => card.key),
  );
  return cards
    .map((card) =>
      presentCase(day, card, shifts.get(card.trained.entry.setKey) ?? 0, outcomes.get(card.key) ?? null),
    )
    .sort((a, b) => lossOf(b) - lossOf(a) || a.name.localeCompare(b.name, 'en', { numeric: true }));
}

function lossOf({ prior, recall }: MyCase): number {
  return (prior.weight / prior.total) * (1 - (recall ?? 0));
}
