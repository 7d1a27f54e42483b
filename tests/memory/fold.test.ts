import fc from 'fast-check';
import { FSRSAlgorithm, generatorParameters } from 'ts-fsrs';
import { describe, expect, it, vi } from 'vitest';
import {
  DEFAULT_WEIGHTS,
  foldCase,
  type LogRow,
  memoryModel,
  type Outcome,
  startFold,
} from '#shared/memory/index.ts';
import { row } from './rows.ts';

const library = new FSRSAlgorithm(generatorParameters({}));
/** So many keys that a guess is as good as impossible: the correction for luck vanishes. */
const noLuck = { keysOffered: 1e15 };

describe('fold of a case', () => {
  it('is the library, step by step, on the member’s own day numbers', () => {
    const log = [
      row(100, 0, { ...noLuck, outcome: 'missed' }),
      row(100, 1, noLuck),
      row(101, 0, noLuck),
      row(104, 0, noLuck),
      row(112, 0, { ...noLuck, outcome: 'late' }),
      row(112, 1, { ...noLuck, outcome: 'missed' }),
      row(113, 0, noLuck),
    ];
    let state = library.next_state(null, 0, 1);
    for (const [gap, grade] of [
      [0, 3],
      [1, 3],
      [3, 3],
      [8, 1],
      [0, 1],
      [1, 3],
    ] as const) {
      state = library.next_state(state, gap, grade);
    }
    const { memory } = foldCase(log);
    expect(memory?.stability).toBeCloseTo(state.stability, 6);
    expect(memory?.difficulty).toBeCloseTo(state.difficulty, 6);
    expect(memory).toMatchObject({ firstDay: 100, lastDay: 113, answers: 7, lapses: 2, lastId: log[6]!.id });
  });

  it('moves memory by a day’s first answer and by the retest after a miss, nothing else', () => {
    const day = [
      row(10, 0, { outcome: 'missed' }),
      row(10, 1),
      row(10, 2, { outcome: 'missed' }),
      row(10, 3),
    ];
    const { kinds, firsts, memory } = foldCase(day);
    expect([...kinds.values()]).toEqual(['first', 'retest', 'repeat', 'repeat']);
    expect(firsts).toEqual([
      { id: day[0]!.id, localDay: 10, recallBefore: null, held: false, keysOffered: 22 },
    ]);
    expect(memory).toEqual({ ...foldCase(day.slice(0, 2)).memory, answers: 4 });
    expect(memory?.lastId).toBe(day[1]!.id);
  });

  it('takes no retest step after a day’s first answer that was held', () => {
    const held = [row(10, 0), row(10, 1, { outcome: 'missed' })];
    expect([...foldCase(held).kinds.values()]).toEqual(['first', 'repeat']);
    expect(foldCase(held).memory?.stability).toBe(foldCase(held.slice(0, 1)).memory?.stability);
  });

  it('lets only one retest a day move memory, held or not', () => {
    const missedAgain = [row(10, 0, { outcome: 'missed' }), row(10, 1, { outcome: 'late' }), row(10, 2)];
    expect([...foldCase(missedAgain).kinds.values()]).toEqual(['first', 'retest', 'repeat']);
    const stability = library.next_state(library.next_state(null, 0, 1), 0, 1).stability;
    expect(foldCase(missedAgain).memory?.stability).toBe(stability);
  });

  it('is moved by nothing that is unscored or abandoned', () => {
    const log = [
      row(10, 0, { scored: false }),
      row(10, 1, { outcome: 'left', scored: false }),
      row(10, 2, { outcome: 'left', scored: true }),
    ];
    expect(foldCase(log)).toMatchObject({ memory: null, firsts: [] });
    const { kinds, firsts } = foldCase([...log, row(10, 3)]);
    expect([...kinds.values()]).toEqual(['unscored', 'unscored', 'unscored', 'first']);
    expect(firsts.map(({ id }) => id)).toEqual([row(10, 3).id]);
  });

  it('keeps an unscored showing between a miss and its retest out of the way', () => {
    const log = [row(10, 0, { outcome: 'missed' }), row(10, 1, { scored: false }), row(10, 2)];
    expect([...foldCase(log).kinds.values()]).toEqual(['first', 'unscored', 'retest']);
  });

  it('treats late as not held', () => {
    const late = foldCase([row(10, 0), row(20, 0, { outcome: 'late' })]);
    const missed = foldCase([row(10, 0), row(20, 0, { outcome: 'missed' })]);
    expect(late.memory).toEqual(missed.memory);
    expect(late.firsts[1]?.held).toBe(false);
  });

  it('reports recall before each first answer', () => {
    const { firsts } = foldCase([row(10, 0, noLuck), row(13, 0, noLuck), row(13, 1, noLuck)]);
    expect(firsts.map(({ recallBefore }) => recallBefore)).toEqual([
      null,
      library.forgetting_curve(3, library.next_state(null, 0, 3).stability),
    ]);
  });

  it('uses the weights it is given', () => {
    const weights = DEFAULT_WEIGHTS.map((w, i) => (i === 0 ? 0.7 : w));
    expect(foldCase([row(1, 0, { outcome: 'missed' })], weights).memory?.stability).toBe(0.7);
    expect(() => foldCase([], [1, 2, 3])).toThrow('21 finite weights');
    expect(() => foldCase([], DEFAULT_WEIGHTS.with(3, Number.NaN))).toThrow(RangeError);
  });

  it('refuses malformed rows and one id with two bodies', () => {
    expect(() => foldCase([row(1, 0, { keysOffered: 0 })])).toThrow('at least one key');
    expect(() => foldCase([row(1, 0, { localDay: 1.5 })])).toThrow('whole number');
    expect(() => foldCase([row(1, 0, { answeredAt: Number.NaN })])).toThrow('no moment');
    expect(() => foldCase([row(1, 0), row(1, 0, { outcome: 'missed' })])).toThrow('twice with different');
    expect(() => foldCase([row(1, 0), row(2, 0, { id: row(1, 0).id })])).toThrow('twice with different');
    const fold = startFold();
    fold.push(row(2, 0));
    expect(() => fold.push(row(1, 0))).toThrow('order of the log');
  });
});

describe('mis-taps', () => {
  const before = [row(10, 0), row(12, 0)];
  const slip = row(20, 0, { outcome: 'missed', misTapped: true });
  const after = row(20, 1, { outcome: 'held' });

  it('leave memory as if the answer had never been', () => {
    const withSlip = foldCase([...before, slip, after]);
    expect(withSlip.memory).toEqual(foldCase([...before, after]).memory);
    expect(withSlip.kinds.get(slip.id)).toBe('mis-tap');
    expect(withSlip.kinds.get(after.id)).toBe('first');
  });

  it('keep the day’s first outcome for boards and calibration', () => {
    const { firsts } = foldCase([...before, slip, after]);
    const unslipped = foldCase([...before, { ...slip, misTapped: false }, after]);
    expect(firsts).toEqual(unslipped.firsts);
    expect(firsts.at(-1)).toMatchObject({ id: slip.id, held: false });
  });

  it('do not stand in for a retest', () => {
    const log = [
      row(10, 0, { outcome: 'missed' }),
      row(10, 1, { outcome: 'missed', misTapped: true }),
      row(10, 2),
    ];
    expect([...foldCase(log).kinds.values()]).toEqual(['first', 'mis-tap', 'retest']);
  });

  it('leave a case unmet when there is nothing else', () => {
    expect(foldCase([slip])).toMatchObject({ memory: null, firsts: [{ recallBefore: null, held: false }] });
  });
});

describe('any order, twice, late', () => {
  const outcomes: Outcome[] = ['held', 'late', 'missed', 'left'];
  const logs = fc
    .array(
      fc.record({
        gap: fc.integer({ min: 0, max: 9 }),
        outcome: fc.constantFrom(...outcomes),
        scored: fc.boolean(),
        misTapped: fc.boolean(),
        keysOffered: fc.integer({ min: 2, max: 24 }),
        west: fc.boolean(),
        sameMoment: fc.boolean(),
      }),
      { maxLength: 25 },
    )
    .map((steps) => {
      let day = 1000;
      return steps.map(({ gap, west, sameMoment, ...over }, i): LogRow => {
        day += gap;
        const answeredAt = (sameMoment ? day : day + i / 1000) * 1000;
        return row(day, i, { ...over, answeredAt, localDay: west ? day - 1 : day });
      });
    });

  it('folds every permutation with repeats to the very same numbers', () => {
    fc.assert(
      fc.property(logs, fc.infiniteStream(fc.nat()), (log, noise) => {
        const doubled = [...log, ...log.filter((_, i) => i % 3 === 0)];
        const shuffled = doubled
          .map((entry) => ({ entry, key: noise.next().value as number }))
          .sort((a, b) => a.key - b.key)
          .map(({ entry }) => entry);
        const straight = foldCase(log);
        const mixed = foldCase(shuffled);
        expect(mixed).toEqual(straight);
        expect([...mixed.kinds]).toEqual([...straight.kinds]);
      }),
    );
  });

  it('gives the same whether rows come one by one or all at once, and after a round trip through text', () => {
    fc.assert(
      fc.property(logs, (log) => {
        const fold = startFold();
        const sorted = [...log].sort((a, b) => a.answeredAt - b.answeredAt || (a.id < b.id ? -1 : 1));
        for (const entry of sorted) fold.push(entry);
        const { memory } = foldCase(log);
        expect(fold.result().memory).toEqual(memory);
        expect(JSON.parse(JSON.stringify(memory))).toEqual(memory);
      }),
    );
  });

  it('never has two first answers on one day, nor memory outside its bounds', () => {
    fc.assert(
      fc.property(logs, (log) => {
        const { memory, firsts } = foldCase(log);
        const days = firsts.map(({ localDay }) => localDay);
        expect(days).toEqual([...new Set(days)].sort((a, b) => a - b));
        if (!memory) return;
        expect(memory.stability).toBeGreaterThanOrEqual(0.001);
        expect(memory.stability).toBeLessThanOrEqual(36500);
        expect(memory.difficulty).toBeGreaterThanOrEqual(1);
        expect(memory.difficulty).toBeLessThanOrEqual(10);
      }),
    );
  });

  it('never asks what time it is: the fold works without a clock', () => {
    const log = [row(10, 0, { outcome: 'missed' }), row(10, 1), row(14, 0), row(30, 0)];
    const expected = foldCase(log);
    vi.stubGlobal(
      'Date',
      class {
        constructor() {
          throw new Error('The fold asked for a Date.');
        }
        static now(): number {
          throw new Error('The fold asked what time it is.');
        }
      },
    );
    try {
      expect(foldCase(log)).toEqual(expected);
      expect(memoryModel(DEFAULT_WEIGHTS.with(0, 0.3)).recall(3, 5)).toBe(memoryModel().recall(3, 5));
    } finally {
      vi.unstubAllGlobals();
    }
  });
});
