import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  calibrated,
  dealtFromSums,
  dealtRecall,
  dealtSums,
  interval,
  logitCalibration,
  lowerBound,
  NO_CALIBRATION,
  periodMean,
} from '#shared/standing/index.ts';
import { normal, seeded } from '#tests/memory/seeded.ts';

const cases = fc.array(
  fc.record({
    prior: fc.constantFrom(1, 2, 4, 288, 576, 1152),
    recall: fc.option(fc.double({ min: 0, max: 1, noNaN: true })),
  }),
  { minLength: 1, maxLength: 60 },
);

describe('dealt recall', () => {
  it('is the prior-weighted mean with nothing for the unmet', () => {
    const { theta, se, sumP, sumPe, sumPee } = dealtRecall(
      [
        { prior: 4, recall: 0.9 },
        { prior: 2, recall: 0.5 },
        { prior: 2, recall: null },
      ],
      NO_CALIBRATION,
    );
    // Derived: (4·.9 + 2·.5)/8 and (4·.09 + 2·.25)/8 · √(1/4 + .04).
    expect(theta).toBeCloseTo(0.575, 12);
    expect(se).toBeCloseTo(0.1075 * Math.sqrt(0.29), 12);
    expect([sumP, sumPe, sumPee]).toEqual([8, expect.closeTo(4.6, 12), expect.closeTo(0.86, 12)]);
  });

  it('applies the member’s shift on the logit scale', () => {
    // Derived: logit .9 = ln 9, shifted by −ln 9 is 0, σ(0) = ½.
    const { theta } = dealtRecall([{ prior: 1, recall: 0.9 }], { b: -Math.log(9), information: 10 });
    expect(theta).toBeCloseTo(0.5, 12);
  });

  it('comes out the same from the summed rows of groups, in any unit of the prior', () => {
    fc.assert(
      fc.property(cases, fc.double({ min: -1, max: 1, noNaN: true }), (all, b) => {
        const calibration = { b, information: 30 };
        const whole = dealtRecall(all, calibration);
        const groups = [0, 1, 2].map((g) => all.filter((_, i) => i % 3 === g));
        const rows = groups.map((group) => dealtSums(group, calibration));
        const summed = dealtFromSums(rows, calibration.information);
        expect(summed.theta).toBeCloseTo(whole.theta, 12);
        expect(summed.se).toBeCloseTo(whole.se, 12);
        const scaled = dealtRecall(
          all.map((c) => ({ ...c, prior: c.prior / 62_208 })),
          calibration,
        );
        expect(scaled.theta).toBeCloseTo(whole.theta, 12);
        expect(scaled.se).toBeCloseTo(whole.se, 12);
      }),
    );
  });

  it('never leaves 0..1 and is certain of nothing unknown', () => {
    fc.assert(
      fc.property(cases, (all) => {
        const { theta, se } = dealtRecall(all, NO_CALIBRATION);
        expect(theta).toBeGreaterThanOrEqual(0);
        expect(theta).toBeLessThanOrEqual(1);
        expect(se).toBeGreaterThanOrEqual(0);
        // Derived: e(1 − e) is at most ¼.
        expect(se).toBeLessThanOrEqual(0.25 * Math.sqrt(0.29));
      }),
    );
    expect(dealtRecall([{ prior: 1, recall: null }], NO_CALIBRATION)).toMatchObject({ theta: 0, se: 0 });
  });

  it('refuses a set of which nothing can be dealt', () => {
    expect(() => dealtRecall([], NO_CALIBRATION)).toThrow('at least one case');
    expect(() => dealtRecall([{ prior: -1, recall: 0.5 }], NO_CALIBRATION)).toThrow('prior');
    expect(() => dealtFromSums([{ sumP: 1, sumPe: 0, sumPee: 0 }], 0)).toThrow('information');
  });

  it('covers the truth at least as often as it says', () => {
    // Derived: 400 simulated members whose logits are off the model by a shift of their own (sd .5, the
    // prior) and by one case's own noise (sd .3), 40 answers each in 30 days. Wanted: 90 % of intervals.
    const random = seeded(11);
    const members = 400;
    let covered = 0;
    let bias = 0;
    for (let m = 0; m < members; m += 1) {
      const shift = 0.5 * normal(random);
      const set = Array.from({ length: 57 }, (_, i) => {
        const recall = 0.55 + 0.43 * random();
        return {
          prior: i % 10 === 0 ? 1 : 4,
          recall,
          truth: calibrated(recall, shift + 0.3 * normal(random)),
        };
      });
      const log = Array.from({ length: 40 }, () => {
        const { recall, truth } = set[Math.floor(random() * set.length)]!;
        return { recall, keys: 8, held: random() < 1 / 8 + (7 / 8) * truth };
      });
      const { theta, se } = dealtRecall(set, logitCalibration(log));
      const total = set.reduce((sum, { prior }) => sum + prior, 0);
      const truth = set.reduce((sum, c) => sum + c.prior * c.truth, 0) / total;
      const [low, high] = interval(theta, se);
      if (truth >= low && truth <= high) covered += 1;
      bias += (theta - truth) / members;
    }
    expect(covered / members).toBeGreaterThan(0.88);
    expect(Math.abs(bias)).toBeLessThan(0.01);
  });
});

describe('figures of a period', () => {
  it('are the means of the days, the error not shrunk by their number', () => {
    const days = [
      { theta: 0.6, se: 0.02 },
      { theta: 0.8, se: 0.04 },
    ];
    expect(periodMean(days)).toEqual({ theta: expect.closeTo(0.7, 12), se: expect.closeTo(0.03, 12) });
    expect(periodMean(days.slice(0, 1))).toEqual(days[0]);
    expect(() => periodMean([])).toThrow('at least one day');
  });
});

describe('intervals of a figure', () => {
  it('rank by the lower end of the 90 % interval and stay within 0..1', () => {
    expect(lowerBound(0.8, 0.02)).toBeCloseTo(0.7671, 12);
    expect(interval(0.8, 0.02)).toEqual([expect.closeTo(0.7671, 12), expect.closeTo(0.8329, 12)]);
    expect(interval(0.99, 0.05)[1]).toBe(1);
    expect(interval(0.01, 0.05)[0]).toBe(0);
    // Derived: 1.959964 standard errors.
    expect(interval(0.5, 0.1, 0.95)[0]).toBeCloseTo(0.3040036, 6);
  });
});
