import { describe, expect, it } from 'vitest';
import { jeffreys, wilson } from '#shared/standing/index.ts';

describe('Wilson', () => {
  it.each([
    // Newcombe, "Two-sided confidence intervals for the single proportion", Statistics in Medicine 17
    // (1998), table I, method 3, 95 %; cited from memory.
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [0, 20, 0, 0.1611],
    [1, 29, 0.0061, 0.1718],
  ])('%i of %i', (x, n, low, high) => {
    const ours = wilson(x, n, 0.95);
    expect(ours[0]).toBeCloseTo(low, 4);
    expect(ours[1]).toBeCloseTo(high, 4);
  });
});

describe('Jeffreys', () => {
  it.each([
    // Brown, Cai and DasGupta, "Interval Estimation for a Binomial Proportion", Statistical Science 16
    // (2001), table 5, 95 %; cited from memory.
    [0, 7, 0, 0.292],
    [1, 7, 0.016, 0.501],
    [2, 7, 0.065, 0.648],
    [3, 7, 0.139, 0.766],
    [0, 8, 0, 0.262],
    [1, 8, 0.014, 0.454],
    [2, 8, 0.056, 0.592],
    [4, 8, 0.199, 0.801],
  ])('%i of %i', (x, n, low, high) => {
    const ours = jeffreys(x, n, 0.95);
    expect(Math.abs(ours[0] - low)).toBeLessThan(0.00051);
    expect(Math.abs(ours[1] - high)).toBeLessThan(0.00051);
  });

  it('agrees with SciPy', () => {
    // Derived: scipy.stats.beta.ppf of SciPy 1.17.1, a = x + ½, b = n − x + ½.
    expect(jeffreys(1, 7, 0.95)).toEqual([
      expect.closeTo(0.0158765242127468, 12),
      expect.closeTo(0.5007974616190776, 12),
    ]);
    expect(jeffreys(300, 320, 0.9)[1]).toBeCloseTo(0.956905121542133, 12);
    expect(jeffreys(5000, 5003, 0.9)[0]).toBeCloseTo(0.9985947663319585, 12);
  });
});
