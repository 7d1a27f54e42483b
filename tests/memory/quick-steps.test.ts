import fc from 'fast-check';
import { FSRSAlgorithm, forgetting_curve, generatorParameters } from 'ts-fsrs';
import { describe, expect, it } from 'vitest';
import { DEFAULT_WEIGHTS, meanRecall, memoryModel } from '#shared/memory/index.ts';
import { quickSteps } from '#shared/memory/quick-steps.ts';

const traces = fc.record({
  stability: fc.double({ min: 0.01, max: 3000, noNaN: true }),
  difficulty: fc.double({ min: 1, max: 10, noNaN: true }),
});
const days = fc.integer({ min: 1, max: 2000 });
const weights = fc
  .array(fc.double({ min: 0.8, max: 1.2, noNaN: true }), { minLength: 21, maxLength: 21 })
  .map((factors) => DEFAULT_WEIGHTS.map((w, i) => w * factors[i]!));

describe('quick steps', () => {
  it('agree with the library within 1e-6, with any weights', () => {
    fc.assert(
      fc.property(traces, days, weights, (trace, elapsed, w) => {
        const library = new FSRSAlgorithm(generatorParameters({ w }));
        const quick = quickSteps(memoryModel(w));
        const recall = quick.recall(elapsed, trace.stability);
        expect(recall).toBeCloseTo(forgetting_curve(library.parameters.w, elapsed, trace.stability), 6);
        const heldState = library.next_state(trace, elapsed, 3);
        const missedState = library.next_state(trace, elapsed, 1);
        expect(quick.difficultyAfter(trace.difficulty, true)).toBeCloseTo(heldState.difficulty, 6);
        expect(quick.difficultyAfter(trace.difficulty, false)).toBeCloseTo(missedState.difficulty, 6);
        const pass = heldState.stability;
        const fail = library.next_state(missedState, 0, 3).stability;
        expect(quick.afterHeld(trace.stability, trace.difficulty, recall) / pass).toBeCloseTo(1, 6);
        expect(
          Math.abs(quick.afterMissAndRetest(trace.stability, trace.difficulty, recall) - fail),
        ).toBeLessThan(1e-6);
      }),
    );
  });

  it('mean recall is the integral of the forgetting curve', () => {
    const model = memoryModel();
    const quick = quickSteps(model);
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 200 }),
        fc.double({ min: 0.2, max: 500, noNaN: true }),
        (from, s) => {
          // Derived: Simpson's rule over the 60 days in 6,000 pieces.
          const pieces = 6000;
          let sum = 0;
          for (let i = 0; i <= pieces; i += 1) {
            const factor = i === 0 || i === pieces ? 1 : i % 2 === 1 ? 4 : 2;
            sum += factor * quick.recall(from + (60 * i) / pieces, s);
          }
          expect(meanRecall(model, from, 60, s)).toBeCloseTo(sum / (3 * pieces), 6);
        },
      ),
      { numRuns: 30 },
    );
  });
});
