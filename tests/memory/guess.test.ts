import { describe, expect, it } from 'vitest';
import {
  chanceOfRight,
  KNOWN_AT_FIRST,
  knownGivenRight,
  memoryModel,
  traceAfterHeld,
} from '#shared/memory/index.ts';

const model = memoryModel();
const trace = { stability: 12, difficulty: 5 };

describe('correction for luck', () => {
  it.each([
    // Derived: q = R/(R + (1 − R)/k) at R = .9.
    [2, 0.947],
    [4, 0.973],
    [8, 0.986],
  ])('with %i keys a right answer at R = .9 was known with chance %f', (keys, known) => {
    expect(knownGivenRight(0.9, keys)).toBeCloseTo(known, 3);
  });

  it('predicts right answers with the chance of guessing included', () => {
    // Derived: 1/4 + 3/4·.8.
    expect(chanceOfRight(0.8, 4)).toBeCloseTo(0.85, 12);
    expect(chanceOfRight(0, 8)).toBe(0.125);
  });

  it('leaves the mixture of both explanations at the next planned showing', () => {
    const elapsed = 12;
    const pass = model.next(trace, elapsed, true);
    const fail = model.next(trace, elapsed, false);
    const known = knownGivenRight(model.recall(elapsed, trace.stability), 8);
    const next = Math.round(pass.stability);
    const corrected = traceAfterHeld(model, trace, elapsed, 8);
    expect(model.recall(next, corrected.stability)).toBeCloseTo(
      known * model.recall(next, pass.stability) + (1 - known) * model.recall(next, fail.stability),
      6,
    );
    expect(corrected.difficulty).toBeCloseTo(known * pass.difficulty + (1 - known) * fail.difficulty, 6);
    expect(corrected.stability).toBeLessThan(pass.stability);
    expect(corrected.stability).toBeGreaterThan(fail.stability);
  });

  it('takes the first answer of all as known with even chance before it', () => {
    const first = traceAfterHeld(model, null, 0, 4);
    const known = knownGivenRight(KNOWN_AT_FIRST, 4);
    // Derived: .5/(.5 + .5/4).
    expect(known).toBeCloseTo(0.8, 12);
    // I(.9, 2.3065) = 2 days.
    expect(model.recall(2, first.stability)).toBeCloseTo(
      known * model.recall(2, 2.3065) + (1 - known) * model.recall(2, 0.212),
      6,
    );
  });

  it('corrects less the more keys there are, and not at all on the same day', () => {
    const stabilities = [2, 4, 8, 22].map((keys) => traceAfterHeld(model, trace, 12, keys).stability);
    expect(stabilities).toEqual([...stabilities].sort((a, b) => a - b));
    expect(traceAfterHeld(model, trace, 0, 2)).toEqual(model.next(trace, 0, true));
  });
});
