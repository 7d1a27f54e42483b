import type { FormView } from '#shared/contracts/member.ts';
import { caseStateName } from '#shared/memory/index.ts';
import { asMember, type Ctx } from '../context.ts';
import { groupBy } from '../group-by.ts';
import { isoDate } from '../standing/local-date.ts';
import { type DayFigure, dayFigures, presentFigure } from '../standing/read-figures.ts';
import { cardsOf, tellingDay } from '../training/cards.ts';
import { readMemberDay } from '../training/member-day.ts';
import { figuresNow } from './figures-now.ts';

/** How far a set's course goes back, and how far outcomes and minutes do. */
export const TREND_DAYS = 90;
export const OUTCOME_DAYS = 28;

/** A member's form: each set's dealt recall now and over time, outcomes, minutes, and how many cases hold. */
export async function readForm(ctx: Ctx): Promise<FormView> {
  return asMember(ctx, async (tx, actor) => {
    const day = await readMemberDay(ctx, tx, actor);
    const { clubId, memberId } = actor;
    const rows = await dayFigures(tx, {
      clubId,
      memberId,
      fromDay: day.day - TREND_DAYS + 1,
      toDay: day.day,
    });
    const figures = await figuresNow(tx, day);
    const rowsOf = groupBy(rows, (row) => row.setKey);
    const cardsOfSet = groupBy(cardsOf(day), (card) => card.trained.entry.setKey);
    const recent = rows.filter((row) => row.day > day.day - OUTCOME_DAYS);
    return {
      sets: day.sets.map(({ entry, content }) => {
        const states = { unmet: 0, settling: 0, holding: 0, slipping: 0 };
        for (const card of cardsOfSet.get(entry.setKey) ?? []) {
          states[
            caseStateName(
              card.memory,
              card.memory ? tellingDay(day.day, card.memory) : day.day,
              card.slipsBelow,
            )
          ] += 1;
        }
        return {
          setKey: entry.setKey,
          name: entry.setName,
          edition: content.number,
          now: figures(entry.setKey),
          days: (rowsOf.get(entry.setKey) ?? []).map(presentDay),
          states,
        };
      }),
      outcomes: {
        held: sum(recent, (row) => row.held),
        late: sum(recent, (row) => row.late),
        missed: sum(recent, (row) => row.missed),
        left: sum(recent, (row) => row.left),
        misTaps: sum(recent, (row) => row.misTaps),
      },
      minutesPerDay: minutesByDay(recent, day.day),
    };
  });
}

function presentDay(row: DayFigure): FormView['sets'][number]['days'][number] {
  const { value, low, high, answers } = presentFigure(row, row.answers);
  return { date: isoDate(row.day), value, low, high, answers };
}

/** Every day of the span, those without training too. */
function minutesByDay(rows: readonly DayFigure[], today: number): FormView['minutesPerDay'] {
  const spent = groupBy(rows, (row) => row.day);
  return Array.from({ length: OUTCOME_DAYS }, (_, k) => today - OUTCOME_DAYS + 1 + k).map((day) => ({
    date: isoDate(day),
    minutes: sum(spent.get(day) ?? [], (row) => row.spentMs) / 60_000,
  }));
}

function sum<T>(items: readonly T[], of: (item: T) => number): number {
  return items.reduce((total, item) => total + of(item), 0);
}
