import { describe, expect, it } from 'vitest';
import {
  DEFAULT_COSTS,
  foldCase,
  forecastSeconds,
  memoryModel,
  newCaseCap,
  planQueue,
  type QueueCard,
  solveBeta,
  wantedRecall,
} from '#shared/memory/index.ts';
import { row } from './rows.ts';
import { seeded } from './seeded.ts';

const DAY = 1000;

/** Scenario A of the policy simulations, small: 10, 30, 60 % of cases of multiplicity 1, 2, 4. */
function programme(cases: number, unmet: number): QueueCard[] {
  const random = seeded(7);
  const weights = Array.from({ length: cases }, (_, i) => (i % 10 < 1 ? 1 : i % 10 < 4 ? 2 : 4));
  const total = weights.reduce((sum, w) => sum + w, 0);
  return weights.map((weight, i) => {
    const first = DAY - 40 - Math.floor(random() * 30);
    const log = [row(first, i), row(first + 2, i), row(first + 9 + Math.floor(random() * 9), i)];
    const { memory } = foldCase(log);
    return { key: `c${i}`, prior: weight / total, memory: i < unmet ? null : memory };
  });
}

describe('forecast load', () => {
  const cards = programme(120, 20);
  const request = { cards, day: DAY, newPerDay: 3, costs: DEFAULT_COSTS };

  it('falls as β rises, in the range that is used', () => {
    const loads = [0, 0.03, 0.07, 0.11, 0.15, 0.2].map((beta) => forecastSeconds(request, beta));
    expect(loads).toEqual([...loads].sort((a, b) => b - a));
    expect(loads[0]).toBeGreaterThan(2 * loads[5]!);
  });

  it('counts each new case once and none under a freeze', () => {
    const fresh = programme(50, 50);
    expect(forecastSeconds({ ...request, cards: fresh, newPerDay: 0 }, 0.07)).toBe(0);
    // Derived: one day ahead, five new cases of 12 s and nothing due yet.
    expect(forecastSeconds({ ...request, cards: fresh, newPerDay: 5, horizon: 1 }, 0.07)).toBe(60);
  });

  it('is near what simulated members really spend', () => {
    // Derived: members whose memory is the model's own, answering the queue for 60 days with time to spare.
    const model = memoryModel();
    const beta = 0.1;
    const members = 12;
    let spent = 0;
    for (let seed = 1; seed <= members; seed += 1) {
      const random = seeded(seed);
      let now = cards;
      for (let day = DAY; day < DAY + 60; day += 1) {
        const queue = planQueue({ cards: now, day, beta, seconds: 1e6, newCap: 3, costs: DEFAULT_COSTS });
        const asked = new Set(queue.map(({ key }) => key));
        now = now.map((card) => {
          if (!asked.has(card.key)) return card;
          const { memory } = card;
          const elapsed = memory ? day - memory.lastDay : 0;
          const held = random() < (memory ? model.recall(elapsed, memory.stability) : 0.5);
          spent += memory
            ? held
              ? DEFAULT_COSTS.held
              : DEFAULT_COSTS.missed + DEFAULT_COSTS.retest
            : DEFAULT_COSTS.fresh;
          let trace = model.next(memory, elapsed, held);
          if (!held) trace = model.next(trace, 0, true);
          return {
            ...card,
            memory: { ...trace, firstDay: day, lastDay: day, answers: 1, lapses: 0, lastId: 'a' },
          };
        });
      }
    }
    const simulated = spent / members / 60;
    expect(forecastSeconds({ ...request, newPerDay: 3 }, beta) / simulated).toBeGreaterThan(0.93);
    expect(forecastSeconds({ ...request, newPerDay: 3 }, beta) / simulated).toBeLessThan(1.07);
  });
});

describe('solving for β', () => {
  const cards = programme(200, 0);
  const request = { cards, day: DAY, newPerDay: 0, costs: DEFAULT_COSTS };

  it.each([0.03, 0.07, 0.14])('finds the β that a load was made with: %f', (beta) => {
    const seconds = forecastSeconds(request, beta);
    const solved = solveBeta({ ...request, seconds });
    expect(forecastSeconds(request, solved)).toBeLessThan(seconds * 1.01);
    expect(forecastSeconds(request, solved)).toBeGreaterThan(seconds * 0.97);
    expect(Math.abs(solved - beta)).toBeLessThan(0.01);
  });

  it('wants all it can when there is time for it, and the least when there is none', () => {
    expect(solveBeta({ ...request, seconds: 1e5 })).toBe(0);
    const unmet = programme(50, 50);
    const tight = solveBeta({ ...request, cards: unmet, newPerDay: 2, seconds: 1 });
    for (const { prior } of unmet) expect(wantedRecall(prior, unmet.length, tight)).toBe(0.7);
  });

  it('has an answer for an empty programme and refuses no time at all', () => {
    expect(solveBeta({ ...request, cards: [], seconds: 60 })).toBe(0);
    expect(() => solveBeta({ ...request, seconds: 0 })).toThrow('some seconds');
  });

  it('gives a member of six minutes a day a β in the range of the simulations', () => {
    const member = programme(472, 400);
    const seconds = 360;
    const beta = solveBeta({
      cards: member,
      day: DAY,
      newPerDay: newCaseCap(seconds, DEFAULT_COSTS),
      costs: DEFAULT_COSTS,
      seconds,
    });
    expect(beta).toBeGreaterThanOrEqual(0);
    expect(beta).toBeLessThan(0.6);
  });
});
