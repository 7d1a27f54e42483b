import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { jeffreys, wilson } from '#shared/standing/index.ts';
import {
  betaCdf,
  betaQuantile,
  lnGamma,
  logistic,
  logit,
  normalCdf,
  normalQuantile,
} from '#shared/standing/special.ts';

describe('special functions', () => {
  it.each([
    // Derived: scipy.stats.norm.ppf of SciPy 1.17.1.
    [0.05, -1.6448536269514729],
    [0.95, 1.6448536269514722],
    [0.975, 1.959963984540054],
    [0.995, 2.5758293035489004],
  ])('normal quantile of %f', (p, x) => {
    expect(normalQuantile(p)).toBeCloseTo(x, 11);
    expect(normalCdf(x)).toBeCloseTo(p, 14);
  });

  it.each([
    // Derived: scipy.stats.beta.cdf of SciPy 1.17.1.
    [0.3, 2.5, 4.5, 0.40653901668245934],
    [0.99, 120, 3, 0.8759870249798819],
    [0.0001, 0.5, 8, 0.0314135682140519],
  ])('beta distribution at %f for %f, %f', (x, a, b, p) => {
    expect(betaCdf(x, a, b)).toBeCloseTo(p, 12);
  });

  it('have their textbook values at the edges', () => {
    // Derived: Γ(5) = 24, Γ(½) = √π; Beta(½, ½) is symmetric.
    expect(lnGamma(5)).toBeCloseTo(Math.log(24), 13);
    expect(lnGamma(0.5)).toBeCloseTo(Math.log(Math.PI) / 2, 13);
    expect(betaQuantile(0.5, 0.5, 0.5)).toBeCloseTo(0.5, 12);
    expect([normalCdf(-9), normalCdf(0), normalCdf(9)]).toEqual([0, 0.5, 1]);
    expect([betaCdf(0, 2, 3), betaCdf(1, 2, 3)]).toEqual([0, 1]);
    expect([logistic(0), logistic(-800), logistic(800)]).toEqual([0.5, 0, 1]);
    expect(Number.isFinite(logit(0)) && Number.isFinite(logit(1))).toBe(true);
    expect(() => normalQuantile(1)).toThrow('between 0 and 1');
    expect(() => betaQuantile(0, 1, 1)).toThrow('between 0 and 1');
  });

  it('quantiles undo distributions', () => {
    const shape = fc.double({ min: 0.5, max: 400, noNaN: true });
    fc.assert(
      fc.property(shape, shape, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (a, b, p) => {
        expect(betaCdf(betaQuantile(p, a, b), a, b)).toBeCloseTo(p, 9);
      }),
    );
  });
});

describe('intervals of a share', () => {
  const counts = fc
    .tuple(fc.integer({ min: 1, max: 400 }), fc.double({ min: 0, max: 1, noNaN: true }))
    .map(([n, share]) => [Math.round(share * n), n] as const);

  it('hold the share, mirror each other and widen with confidence', () => {
    fc.assert(
      fc.property(counts, ([x, n]) => {
        for (const intervalOf of [wilson, jeffreys]) {
          const [low, high] = intervalOf(x, n);
          expect(low).toBeLessThanOrEqual(x / n);
          expect(high).toBeGreaterThanOrEqual(x / n);
          const mirrored = intervalOf(n - x, n);
          expect(1 - mirrored[1]).toBeCloseTo(low, 9);
          expect(intervalOf(x, n, 0.99)[0]).toBeLessThanOrEqual(low);
        }
      }),
    );
  });

  it('know nothing without answers', () => {
    expect(wilson(0, 0)).toEqual([0, 1]);
    expect(jeffreys(0, 0)).toEqual([0, 1]);
  });

  it('refuse what is no count and no confidence', () => {
    for (const intervalOf of [wilson, jeffreys]) {
      expect(() => intervalOf(3, 2)).toThrow('at least as many trials');
      expect(() => intervalOf(0.5, 2)).toThrow('whole number');
      expect(() => intervalOf(1, 2, 1)).toThrow('confidence');
    }
  });
});
