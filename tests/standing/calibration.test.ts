import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type CalibrationAnswer,
  calibrated,
  logitCalibration,
  NO_CALIBRATION,
} from '#shared/standing/index.ts';
import { seeded } from '#tests/memory/seeded.ts';

const answers = fc.array(
  fc.record({
    recall: fc.double({ min: 0, max: 1, noNaN: true }),
    keys: fc.integer({ min: 2, max: 24 }),
    held: fc.boolean(),
  }),
  { maxLength: 60 },
);

/** Log posterior written out plainly, constants left out. */
function posterior(log: readonly CalibrationAnswer[], b: number): number {
  let height = -(b * b) / (2 * 0.25);
  for (const { recall, keys, held } of log) {
    if (recall === null) continue;
    const p = Math.min(Math.max(recall, 1e-9), 1 - 1e-9);
    const e = 1 / (1 + Math.exp(-Math.log(p / (1 - p)) - b));
    const chance = 1 / keys + (1 - 1 / keys) * e;
    height += Math.log(held ? chance : 1 - chance);
  }
  return height;
}

describe('calibration', () => {
  it('is the prior alone without answers, and first meetings say nothing', () => {
    expect(logitCalibration([])).toEqual({ b: 0, information: 4 });
    expect(logitCalibration([{ recall: null, keys: 22, held: false }])).toEqual(NO_CALIBRATION);
  });

  it('finds the highest point of the posterior', () => {
    fc.assert(
      fc.property(answers, (log) => {
        const { b } = logitCalibration(log);
        const top = posterior(log, b);
        for (let other = -4; other <= 4; other += 0.05) {
          expect(posterior(log, other)).toBeLessThanOrEqual(top + 1e-6);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('counts information as 4 + Σ e(1 − e)', () => {
    fc.assert(
      fc.property(answers, (log) => {
        const { b, information } = logitCalibration(log);
        const sum = log.reduce((total, { recall }) => {
          const e = calibrated(recall, b);
          return total + e * (1 - e);
        }, 4);
        expect(information).toBeCloseTo(sum, 10);
      }),
      { numRuns: 60 },
    );
  });

  it('does not depend on the order of the answers, not even in the last bit', () => {
    fc.assert(
      fc.property(answers, (log) => {
        expect(logitCalibration([...log].reverse())).toEqual(logitCalibration(log));
      }),
      { numRuns: 60 },
    );
  });

  it('finds a member who does better or worse than predicted', () => {
    const random = seeded(3);
    for (const truth of [-0.8, 0, 0.8]) {
      const log = Array.from({ length: 2000 }, () => {
        const recall = 0.5 + 0.45 * random();
        const chance = 1 / 8 + (7 / 8) * calibrated(recall, truth);
        return { recall, keys: 8, held: random() < chance };
      });
      // Derived: information is about 2000·.15, so the standard error is about .06.
      expect(Math.abs(logitCalibration(log).b - truth)).toBeLessThan(0.2);
    }
  });

  it('is hardly moved by repeating what is nearly certain', () => {
    // The inflater of the leaderboard simulations: 40 easy cases on each of 20 days.
    const honest = Array.from({ length: 60 }, (_, i) => ({ recall: 0.85, keys: 22, held: i % 7 > 0 }));
    const easy = Array.from({ length: 800 }, () => ({ recall: 0.999, keys: 22, held: true }));
    const plain = logitCalibration(honest);
    const inflated = logitCalibration([...honest, ...easy]);
    expect(calibrated(0.85, inflated.b) - calibrated(0.85, plain.b)).toBeLessThan(0.02);
  });

  it('is not shaken by certainties that turned out wrong', () => {
    const { b, information } = logitCalibration([
      { recall: 1, keys: 1, held: true },
      { recall: 1, keys: 8, held: false },
      { recall: 0, keys: 8, held: true },
    ]);
    expect(Number.isFinite(b)).toBe(true);
    expect(information).toBeGreaterThanOrEqual(4);
  });

  it('refuses what is no recall and no number of keys', () => {
    expect(() => logitCalibration([{ recall: 1.1, keys: 8, held: true }])).toThrow('between 0 and 1');
    expect(() => logitCalibration([{ recall: 0.5, keys: 0, held: true }])).toThrow('At least one key');
  });
});
