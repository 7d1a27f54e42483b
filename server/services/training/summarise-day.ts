import type { Transaction } from '#database/client.ts';
import type { SittingSummary } from '#shared/contracts/today.ts';
import { newCaseCap, planQueue } from '#shared/memory/index.ts';
import { casePicture } from '../catalogue/case-picture.ts';
import { dayFigures } from '../standing/read-figures.ts';
import { betaOf, cardsOf } from './cards.ts';
import { type ReviewRow, spentMs } from './day-counts.ts';
import { COSTS } from './issue-showings.ts';
import type { TrainingDay } from './training-day.ts';

/** What a day's training moved, what it lost, and what tomorrow brings. */
export async function summariseDay(tx: Transaction, day: TrainingDay): Promise<SittingSummary> {
  const { answers } = day;
  const scored = answers.filter((a) => a.scored);
  const count = (outcome: ReviewRow['outcome']) =>
    answers.filter((a) => a.outcome === outcome && (a.scored || outcome === 'left')).length;
  const times = scored.flatMap((a) => (a.caseRight && a.recognitionMs !== null ? [a.recognitionMs] : []));
  return {
    answered: answers.filter((a) => a.outcome !== 'left').length,
    held: count('held'),
    late: count('late'),
    missed: count('missed'),
    left: count('left'),
    newCases: [...day.memory.values()].filter((m) => m.firstDay === day.day).length,
    minutes: answers.reduce((sum, a) => sum + spentMs(a), 0) / 60_000,
    medianRecognitionMs: median(times),
    moved: await moved(tx, day),
    lostCases: lostCases(day, scored),
    tomorrow: tomorrow(day),
  };
}

function median(values: readonly number[]): number | null {
  if (values.length === 0) return null;
  const sorted = [...values].sort((a, b) => a - b);
  const upper = sorted[Math.floor(sorted.length / 2)] ?? 0;
  const lower = sorted[Math.floor((sorted.length - 1) / 2)] ?? 0;
  return Math.round((upper + lower) / 2);
}

async function moved(tx: Transaction, day: TrainingDay): Promise<SittingSummary['moved']> {
  const { clubId, memberId } = day.actor;
  const rows = await dayFigures(tx, { clubId, memberId, fromDay: day.day - 1, toDay: day.day });
  return day.sets.flatMap(({ entry }) => {
    const at = (d: number) => rows.find((row) => row.setKey === entry.setKey && row.day === d)?.theta;
    const now = at(day.day);
    return now === undefined
      ? []
      : [{ setKey: entry.setKey, name: entry.setName, before: at(day.day - 1) ?? 0, now }];
  });
}

function lostCases(day: TrainingDay, scored: readonly ReviewRow[]): SittingSummary['lostCases'] {
  const keys = new Set(
    scored.filter((a) => a.outcome === 'missed' || a.outcome === 'late').map((a) => a.caseKey),
  );
  return day.sets.flatMap(({ entry, set, content }) =>
    [...content.cases.values()].flatMap(({ key, name, group, algorithms }) => {
      const c = set.byKey(key);
      if (!c || !keys.has(key)) return [];
      const picture = casePicture(set, c, algorithms[0]?.algorithm);
      return [{ setKey: entry.setKey, setName: entry.setName, key, name, group, picture }];
    }),
  );
}

function tomorrow(day: TrainingDay): SittingSummary['tomorrow'] {
  const seconds = day.member.minutesPerDay * 60;
  const queue = planQueue({
    cards: cardsOf(day),
    day: day.day + 1,
    beta: betaOf(day),
    seconds,
    newCap: newCaseCap(seconds, COSTS),
    costs: COSTS,
  });
  return {
    due: queue.filter((card) => card.kind === 'due').length,
    fresh: queue.filter((card) => card.kind === 'new').length,
    minutes: queue.reduce((sum, card) => sum + card.seconds, 0) / 60,
  };
}
