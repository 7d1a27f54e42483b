import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';
import type { Showing, TodayView } from '#shared/contracts/today.ts';
import { stickersOf } from '#shared/lastlayer/pictures/index.ts';
import type { Ctx } from '../context.ts';
import { isoDate } from '../standing/local-date.ts';
import { gridsOf } from './grid.ts';
import { type DayPlan, issueShowings, planRest } from './issue-showings.ts';
import { summariseDay } from './summarise-day.ts';
import type { ShowingRow, TrainingDay } from './training-day.ts';

/** The member's queue as it stands: what is issued is topped up first. */
export async function presentToday(ctx: Ctx, tx: Transaction, day: TrainingDay): Promise<TodayView> {
  const { answers, open } = day;
  const plan = planRest(day);
  const waiting = plan.queue.length - (await issueShowings(ctx, tx, day, plan));
  const answered = answers.filter((a) => a.outcome !== 'left').length;
  const empty = open.length > 0 ? null : await whyEmpty(tx, day);
  return {
    date: isoDate(day.day),
    localDay: day.day,
    serverNow: ctx.clock.now(),
    planned: answered + open.length + waiting,
    answered,
    secondsLeft: Math.round(secondsOf(open, plan, waiting)),
    holding: day.member.holding,
    sets: day.sets.map(({ entry, set, content }) => ({
      setKey: entry.setKey,
      name: entry.setName,
      edition: content.number,
      grids: gridsOf(set, content),
    })),
    showings: open.map(presentShowing),
    empty,
    summary: empty === 'done' ? await summariseDay(tx, day) : null,
  };
}

/** What goes to the member before the answer: the stickers, and nothing that names the case. */
function presentShowing(row: ShowingRow): Showing {
  return {
    id: row.showingId,
    setKey: row.setKey,
    grid: row.cluster === 0 ? 'all' : `c${row.cluster}`,
    picture: { stickers: stickersOf(row.state), colouring: row.colouring },
    limitMs: row.limitMs,
    asksAuf: row.asksAuf,
    issuedAt: row.issuedAt.getTime(),
  };
}

function secondsOf(open: readonly ShowingRow[], plan: DayPlan, waiting: number): number {
  const issued = open.reduce((sum, s) => sum + s.plannedSeconds, 0);
  const later = waiting > 0 ? plan.queue.slice(-waiting) : [];
  return issued + later.reduce((sum, card) => sum + card.seconds, 0);
}

async function whyEmpty(tx: Transaction, day: TrainingDay): Promise<NonNullable<TodayView['empty']>> {
  if (day.answers.length > 0) return 'done';
  if (day.sets.length > 0)
    return day.sets.some((s) => s.content.cases.size > 0) ? 'nothing-due' : 'no-edition';
  return (await programmeHasSets(tx, day)) ? 'no-edition' : 'no-programme';
}

/** Whether the club trains anything at all: sets without an edition do not show in the day. */
async function programmeHasSets(tx: Transaction, day: TrainingDay): Promise<boolean> {
  const { rows } = await tx.execute(
    sql`select 1 from programme p where p.club_id = ${day.actor.clubId}::uuid and (p.for_everyone or exists (
      select 1 from programme_member m where m.club_id = p.club_id and m.set_key = p.set_key and m.member_id = ${day.actor.memberId}::uuid)) limit 1`,
  );
  return rows.length > 0;
}
