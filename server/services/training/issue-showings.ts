import { and, eq, max } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { colouringsFor } from '#shared/lastlayer/pictures/index.ts';
import { DEFAULT_COSTS, newCaseCap, planQueue, type QueueItem } from '#shared/memory/index.ts';
import type { Ctx } from '../context.ts';
import { newId } from '../new-id.ts';
import { betaOf, cardsOf, type DayCard } from './cards.ts';
import { gridOf, gridsOf } from './grid.ts';
import type { TrainedSet } from './member-day.ts';
import type { ShowingRow, TrainingDay } from './training-day.ts';

/** Seconds a showing is reckoned to take until a member's own are learned. */
export const COSTS = DEFAULT_COSTS;

/** This many showings are issued ahead of their answers. */
const AHEAD = 12;

/** Places between two showings of the queue, so that a missed case can come back in between. */
export const STEP = 100;

export interface DayPlan {
  readonly cards: readonly DayCard[];
  /** What is still to be issued after the open showings, in order. */
  readonly queue: readonly QueueItem[];
}

/** What the rest of the member's minutes go to, given the day's answers and the showings already issued. */
export function planRest(day: TrainingDay): DayPlan {
  const cards = cardsOf(day);
  const metToday = cards.filter((card) => card.memory?.firstDay === day.day).length;
  const seconds = day.member.minutesPerDay * 60;
  const issued = new Set(day.open.map((s) => s.caseKey));
  // The plan is made over all cases each time, the issued ones among them: their share of the minutes is theirs.
  const queue = planQueue({
    cards,
    day: day.day,
    beta: betaOf(day),
    seconds: Math.max(0, seconds - secondsUsed(day)),
    newCap: Math.max(0, newCaseCap(seconds, COSTS) - metToday),
    costs: COSTS,
  }).filter(({ key }) => !issued.has(key));
  return { cards, queue };
}

/**
 * What the day's answers were reckoned to take. Not what they took: quick answers would bring new showings, and the
 * end of the sitting would move away from those who do well. Returns of missed cases come on top of the minutes.
 */
function secondsUsed(day: TrainingDay): number {
  return day.answers.reduce((sum, answer) => {
    const showing = day.answered.get(answer.showingId);
    return answer.scored && showing && showing.reason !== 'retest' ? sum + showing.plannedSeconds : sum;
  }, 0);
}

/** Issues the next showings of the plan, up to what is kept ahead; says how many. */
export async function issueShowings(
  ctx: Ctx,
  tx: Transaction,
  day: TrainingDay,
  plan: DayPlan,
): Promise<number> {
  const wanted = plan.queue.slice(0, Math.max(0, AHEAD - day.open.length));
  if (wanted.length === 0) return 0;
  const byKey = new Map(plan.cards.map((card) => [card.key, card]));
  let position = await lastPosition(tx, day);
  const rows = wanted.flatMap(({ key, kind, seconds }) => {
    const card = byKey.get(key);
    if (!card) return [];
    position += STEP;
    return [
      makeShowing(ctx, day, card.trained, { caseKey: key, reason: kind, plannedSeconds: seconds, position }),
    ];
  });
  day.open.push(...(await tx.insert(tables.showing).values(rows).returning()));
  day.open.sort((a, b) => a.position - b.position);
  return rows.length;
}

/** Position of the day's last showing, answered or not; 0 before the first. */
export async function lastPosition(tx: Transaction, day: TrainingDay): Promise<number> {
  const { showing } = tables;
  const [row] = await tx
    .select({ last: max(showing.position) })
    .from(showing)
    .where(
      and(
        eq(showing.clubId, day.actor.clubId),
        eq(showing.memberId, day.actor.memberId),
        eq(showing.localDay, day.day),
      ),
    );
  return row?.last ?? 0;
}

/** A showing of a case: a full state drawn uniformly from its weight, a colouring from the member's colours. */
export function makeShowing(
  ctx: Ctx,
  day: TrainingDay,
  trained: TrainedSet,
  {
    caseKey,
    reason,
    plannedSeconds,
    position,
  }: Pick<ShowingRow, 'caseKey' | 'reason' | 'plannedSeconds' | 'position'>,
): typeof tables.showing.$inferInsert {
  const { entry, set, content } = trained;
  const c = set.byKey(caseKey);
  if (!c) throw new RangeError(`${caseKey} is no case of ${set.definition.name}.`);
  const colourings = colouringsFor(day.member.crossColours);
  const now = ctx.clock.now();
  return {
    clubId: day.actor.clubId,
    memberId: day.actor.memberId,
    showingId: newId(ctx),
    setKey: entry.setKey,
    caseKey,
    editionNumber: entry.edition,
    state: set.drawState(c, ctx.random),
    colouring: colourings[Math.floor(ctx.random() * colourings.length)] ?? 0,
    cluster: c.cluster,
    keysOffered: gridsOf(set, content)[gridOf(c)]?.length ?? 1,
    limitMs: entry.limitMs,
    asksAuf: entry.asksAuf,
    reason,
    localDay: day.day,
    plannedSeconds,
    position,
    issuedAt: new Date(now),
  };
}
