import { default_w, FSRSAlgorithm, generatorParameters } from 'ts-fsrs';
import { describe, expect, it } from 'vitest';
import { DEFAULT_WEIGHTS, memoryModel, type Trace } from '#shared/memory/index.ts';
import { quickSteps } from '#shared/memory/quick-steps.ts';

// The vectors are those of the public repositories open-spaced-repetition/ts-fsrs (FSRS-6.test.ts,
// algorithm.test.ts), open-spaced-repetition/py-fsrs (tests/test_basic.py) and
// open-spaced-repetition/fsrs-rs (src/inference.rs, test_memory_state). Default weights unless said.

const model = memoryModel();
const library = new FSRSAlgorithm(generatorParameters({}));

describe('FSRS-6 published vectors', () => {
  it('has the published default weights', () => {
    // ts-fsrs packages/fsrs/src/constant.ts
    expect(DEFAULT_WEIGHTS).toEqual([
      0.212, 1.2931, 2.3065, 8.2956, 6.4133, 0.8334, 3.0194, 0.001, 1.8722, 0.1666, 0.796, 1.4835, 0.0614,
      0.2629, 1.6483, 0.6014, 1.8729, 0.5425, 0.0912, 0.0658, 0.1542,
    ]);
    expect(DEFAULT_WEIGHTS).toEqual([...default_w]);
    expect(model.factor).toBeCloseTo(0.98034649, 8);
    expect(model.decay).toBe(0.1542);
  });

  it('walks through the intervals of the thirteen-review history', () => {
    // ts-fsrs FSRS-6.test.ts and py-fsrs tests/test_basic.py: six held, two not held, five held, each at
    // its due day, no fuzz. An interval of 0 is a step within the same day.
    const published = [0, 2, 11, 46, 163, 498, 0, 0, 2, 4, 7, 12, 21];
    const held = [true, true, true, true, true, true, false, false, true, true, true, true, true];
    const sameDay = [0, 6, 7];
    let trace: Trace | null = null;
    let elapsed = 0;
    const intervals: number[] = [];
    for (const [i, isHeld] of held.entries()) {
      const next: Trace = model.next(trace, elapsed, isHeld);
      trace = next;
      elapsed = sameDay.includes(i) ? 0 : Math.max(1, Math.round(model.daysUntil(0.9, next.stability)));
      intervals.push(elapsed);
    }
    expect(intervals).toEqual(published);
  });

  it('ends the six-review history in the published state', () => {
    // ts-fsrs FSRS-6.test.ts, py-fsrs tests/test_basic.py and fsrs-rs test_memory_state.
    let trace: Trace | null = null;
    for (const [gap, isHeld] of [
      [0, false],
      [0, true],
      [1, true],
      [3, true],
      [8, true],
      [21, true],
    ] as const) {
      trace = model.next(trace, gap, isHeld);
    }
    expect(trace?.stability).toBeCloseTo(53.62691, 4);
    expect(trace?.difficulty).toBeCloseTo(6.3574867, 4);
  });

  it('ends it as published without same-day steps too', () => {
    // The same three sources, w17 to w19 = 0 and short-term steps off: the library alone, since the product
    // always takes the same-day step.
    const w = [...default_w];
    w.fill(0, 17, 20);
    const long = new FSRSAlgorithm(generatorParameters({ w, enable_short_term: false }));
    let state: Trace | null = null;
    for (const [gap, grade] of [
      [0, 1],
      [0, 3],
      [1, 3],
      [3, 3],
      [8, 3],
      [21, 3],
    ] as const) {
      state = long.next_state(state, gap, grade);
    }
    expect(state?.stability).toBeCloseTo(53.335106, 4);
    expect(state?.difficulty).toBeCloseTo(6.3574867, 4);
  });

  it('forgets along the published curve', () => {
    // ts-fsrs algorithm.test.ts: R after 0, 1, 2, 3 days, S = 1.
    expect([0, 1, 2, 3].map((t) => model.recall(t, 1))).toEqual([1, 0.9, 0.84588465, 0.8093881]);
  });

  it('grows stability as published', () => {
    // ts-fsrs algorithm.test.ts: S = 5, D = 1..4, R = .9, .8, .7, .6, grades 1..4.
    const published = [25.60252118, 28.22657096, 58.65599107, 127.2266925];
    const inputs = [
      [1, 0.9, 1],
      [2, 0.8, 2],
      [3, 0.7, 3],
      [4, 0.6, 4],
    ] as const;
    for (const [i, [d, r, grade]] of inputs.entries()) {
      expect(library.next_recall_stability(d, 5, r, grade)).toBeCloseTo(published[i]!, 6);
    }
    // The two without the factor of the grades that the product never gives.
    expect(quickSteps(model).afterHeld(5, 1, 0.9)).toBeCloseTo(published[0]!, 6);
    expect(quickSteps(model).afterHeld(5, 3, 0.7)).toBeCloseTo(published[2]!, 6);
  });

  it('takes the same-day step as published', () => {
    // ts-fsrs algorithm.test.ts: S = 5, grades 1..4.
    const published = [1.596818, 5, 5, 8.12960956];
    for (const [i, grade] of ([1, 2, 3, 4] as const).entries()) {
      expect(library.next_short_term_stability(5, grade)).toBeCloseTo(published[i]!, 6);
    }
    const trace = { stability: 5, difficulty: 5 };
    expect(model.next(trace, 0, false).stability).toBeCloseTo(published[0]!, 6);
    expect(model.next(trace, 0, true).stability).toBeCloseTo(published[2]!, 6);
    expect(quickSteps(model).afterRetest(5)).toBeCloseTo(published[2]!, 6);
  });

  it('gives the published intervals', () => {
    // ts-fsrs algorithm.test.ts: S = 1, wanted recall .1, .2 … 1 (fsrs-rs has 3116766 for the first, in
    // single precision).
    const published = [3116769, 34793, 2508, 387, 90, 27, 9, 3, 1, 1];
    const ours = published.map((_, i) => Math.max(1, Math.round(model.daysUntil((i + 1) / 10, 1))));
    expect(Math.abs(ours[0]! - published[0]!)).toBeLessThanOrEqual(1);
    expect(ours.slice(1)).toEqual(published.slice(1));
  });

  it('starts from the published difficulties', () => {
    // ts-fsrs algorithm.test.ts: first review of each grade; the last is clamped to 1.
    const published = [6.4133, 5.11217071, 2.11810397, 1];
    const first = ([1, 2, 3, 4] as const).map((grade) => library.next_state(null, 0, grade).difficulty);
    for (const [i, value] of published.entries()) expect(first[i]).toBeCloseTo(value, 6);
    expect(model.next(null, 0, false)).toEqual({ stability: 0.212, difficulty: first[0] });
    expect(model.next(null, 0, true)).toEqual({ stability: 2.3065, difficulty: first[2] });
  });
});
