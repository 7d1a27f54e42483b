/** The memory model: today's queue, folding logs, solving β, calendar. */
import {
  type CaseMemory,
  DEFAULT_COSTS,
  foldCase,
  forecastSeconds,
  type LogRow,
  localDay,
  newCaseCap,
  planQueue,
  type QueueCard,
  solveBeta,
} from '#shared/memory/index.ts';
import { logitCalibration } from '#shared/standing/index.ts';
import { seeded } from '#tests/memory/seeded.ts';
import { type Figure, milliseconds, ratesOf } from './bench.ts';

const DAY = 1000;

/** Cases of multiplicity 1, 2, 4 (10, 30, 60 %), one in ten unmet, the rest with a plausible memory. */
function programme(cases: number): QueueCard[] {
  const random = seeded(1);
  const weights = Array.from({ length: cases }, (_, i) => (i % 10 < 1 ? 1 : i % 10 < 4 ? 2 : 4));
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return weights.map((weight, i) => {
    const lastDay = DAY - 1 - Math.floor(random() * 60);
    const memory: CaseMemory = {
      stability: Math.exp(5 * random()),
      difficulty: 1 + 9 * random(),
      firstDay: lastDay - 30,
      lastDay,
      answers: 6,
      lapses: 1,
      lastId: 'a',
    };
    return { key: `c${i}`, prior: weight / total, memory: i % 10 === 9 ? null : memory };
  });
}

function log(rows: number): LogRow[] {
  return Array.from({ length: rows }, (_, i) => ({
    id: String(i).padStart(9, '0'),
    answeredAt: i,
    localDay: 3 * i,
    outcome: i % 8 === 0 ? 'missed' : 'held',
    scored: true,
    keysOffered: 22,
    misTapped: false,
  }));
}

/** Median milliseconds of eleven runs, after five that are not counted. */
function median(work: () => void): number {
  for (let i = 0; i < 5; i++) work();
  const times = Array.from({ length: 11 }, () => milliseconds(work)).sort((a, b) => a - b);
  return times[5]!;
}

export function bench(): Figure[] {
  const costs = DEFAULT_COSTS;
  const [large, usual] = [programme(4000), programme(472)];
  const plan = (cards: readonly QueueCard[]) =>
    planQueue({ cards, day: DAY, beta: 0.07, seconds: 360, newCap: newCaseCap(360, costs), costs });
  const load = { day: DAY, newPerDay: 7, costs };
  const twenty = log(20);
  const random = seeded(2);
  const answers = Array.from({ length: 900 }, () => ({
    recall: 0.5 + 0.5 * random(),
    keys: 22,
    held: random() < 0.85,
  }));
  let instant = Date.UTC(2024, 0, 1);
  const [folds, days] = ratesOf([
    () => foldCase(twenty),
    () => {
      instant += 7_000_000;
      localDay(instant, 'Europe/London', 4);
    },
  ]) as [number, number];
  return [
    { name: 'queue of 4,000 cases', value: median(() => plan(large)), unit: 'ms' },
    { name: 'queue of 472 cases', value: median(() => plan(usual)), unit: 'ms' },
    { name: 'fold', value: folds * twenty.length, unit: 'rows/s' },
    {
      name: 'load of 60 days, 472 cases',
      value: median(() => forecastSeconds({ ...load, cards: usual }, 0.07)),
      unit: 'ms',
    },
    {
      name: 'β for 472 cases',
      value: median(() => solveBeta({ ...load, cards: usual, seconds: 360 })),
      unit: 'ms',
    },
    {
      name: 'β for 4,000 cases',
      value: milliseconds(() => solveBeta({ ...load, cards: large, seconds: 1800 })),
      unit: 'ms',
    },
    { name: 'calibration of 900 answers', value: median(() => logitCalibration(answers)), unit: 'ms' },
    { name: 'training day of an instant', value: days, unit: '1/s' },
  ];
}
