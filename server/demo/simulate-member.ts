import { inArray } from 'drizzle-orm';
import { type Database, tables } from '#database/client.ts';
import type { Showing, TodayView } from '#shared/contracts/today.ts';
import { caseSet, rightAufsBefore } from '#shared/lastlayer/index.ts';
import { dayStart } from '#shared/memory/index.ts';
import type { Claims, Ctx } from '../services/context.ts';
import { newId } from '../services/new-id.ts';
import { readToday } from '../services/training/read-today.ts';
import { recordAnswers } from '../services/training/record-answers.ts';
import type { Learner } from './learner.ts';
import type { DemoPerson } from './people.ts';

const MINUTE = 60_000;
/** A sitting ends after this many showings, whatever is left. */
const MOST_SHOWINGS = 60;

export interface Simulation {
  /** The application's own connection: the history goes in through the same walls as everyone's. */
  readonly db: Database;
  /** The owner's, to look up what a showing really was. */
  readonly owner: Database;
  readonly person: DemoPerson;
  readonly claims: Claims;
  readonly timeZone: string;
  readonly learner: Learner;
  readonly random: () => number;
}

/** Trains one member through one local day, by the services that a real member's phone calls. */
export async function simulateDay(sim: Simulation, day: number): Promise<number> {
  const { random, person } = sim;
  let now = dayStart(day, sim.timeZone, 4) + (11 + 6 * random()) * 60 * MINUTE;
  const clock = { now: () => now };
  const ctx: Ctx = { db: sim.db, clock, random, claims: sim.claims, requestId: 'demonstration' };
  let today = await readToday(ctx);
  let given = 0;
  const until = now + person.minutesPerDay * 2 * MINUTE;
  while (today.showings.length > 0 && given < MOST_SHOWINGS && now < until) {
    const batch: Parameters<typeof recordAnswers>[1]['answers'] = [];
    for (const { showing, caseKey, state, algorithm } of await lookUp(sim, today)) {
      const set = caseSet(showing.setKey);
      const keys = gridKeys(today, showing);
      const aufs = rightAufsBefore(set, algorithm, state);
      const reaction = sim.learner.react(set, caseKey, keys, aufs, day);
      now += Math.round(1200 + 800 * random()) + (reaction.recognitionMs ?? 4000) + (reaction.namingMs ?? 0);
      batch.push({ id: newId(ctx), showingId: showing.id, answeredAt: now, ...reaction });
    }
    now += 500;
    given += batch.length;
    today = (await recordAnswers(ctx, { answers: batch })).today;
  }
  return given;
}

function gridKeys(today: TodayView, showing: Showing): string[] {
  const set = today.sets.find((s) => s.setKey === showing.setKey);
  return (set?.grids[showing.grid] ?? []).map(({ key }) => key).filter((key) => key !== 'solved');
}

async function lookUp(sim: Simulation, today: TodayView) {
  const { showing } = tables;
  const rows = await sim.owner
    .select({ id: showing.showingId, caseKey: showing.caseKey, state: showing.state })
    .from(showing)
    .where(
      inArray(
        showing.showingId,
        today.showings.map((s) => s.id),
      ),
    );
  const byId = new Map(rows.map((row) => [row.id, row]));
  return today.showings.flatMap((one) => {
    const row = byId.get(one.id);
    const key = today.sets
      .find((s) => s.setKey === one.setKey)
      ?.grids[one.grid]?.find((k) => k.key === row?.caseKey);
    return row && key
      ? [{ showing: one, caseKey: row.caseKey, state: row.state, algorithm: key.algorithm }]
      : [];
  });
}
