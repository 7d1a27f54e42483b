import type { MyCasesView } from '#shared/contracts/member.ts';
import { asMember, type Ctx } from '../context.ts';
import { figuresNow } from '../form/figures-now.ts';
import { isoDate } from '../standing/local-date.ts';
import { cardsOf } from '../training/cards.ts';
import { readMemberDay } from '../training/member-day.ts';
import { lastOutcomes, presentCase } from './present-case.ts';
import { readShifts } from './read-shifts.ts';

/** Every case the member answers for, in the programme's order and the order of names. */
export async function readMyCases(ctx: Ctx): Promise<MyCasesView> {
  return asMember(ctx, async (tx, actor) => {
    const day = await readMemberDay(ctx, tx, actor);
    const shifts = await readShifts(tx, day);
    const figures = await figuresNow(tx, day);
    const cards = cardsOf(day);
    const outcomes = await lastOutcomes(
      tx,
      day,
      cards.map((card) => card.key),
    );
    return {
      date: isoDate(day.day),
      sets: day.sets.map(({ entry, content }) => ({
        setKey: entry.setKey,
        name: entry.setName,
        edition: content.number,
        recall: figures(entry.setKey),
      })),
      cases: cards.map((card) =>
        presentCase(day, card, shifts.get(card.trained.entry.setKey) ?? 0, outcomes.get(card.key) ?? null),
      ),
    };
  });
}
