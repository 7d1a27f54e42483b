/** σ(x) = 1/(1 + e^(−x)). */
export function logistic(x: number): number {
  return x >= 0 ? 1 / (1 + Math.exp(-x)) : Math.exp(x) / (1 + Math.exp(x));
}

/** ln(p/(1 − p)), p held within 1e-9 of both ends so that certainty stays finite. */
export function logit(p: number): number {
  const inside = Math.min(Math.max(p, 1e-9), 1 - 1e-9);
  return Math.log(inside / (1 - inside));
}

/** Standard normal distribution function, by the series ½ + φ(x)·(x + x³/3 + x⁵/(3·5) + …). */
export function normalCdf(x: number): number {
  if (x < -8) return 0;
  if (x > 8) return 1;
  let term = x;
  let sum = x;
  for (let odd = 3; Math.abs(term) > 1e-17 * Math.abs(sum); odd += 2) {
    term *= (x * x) / odd;
    sum += term;
  }
  return 0.5 + (sum * Math.exp(-0.5 * x * x)) / Math.sqrt(2 * Math.PI);
}

/** The x with Φ(x) = p, 0 < p < 1, to about 1e-12 for the confidences in use. */
export function normalQuantile(p: number): number {
  if (!(p > 0 && p < 1)) throw new RangeError('A quantile is asked of a chance between 0 and 1.');
  return bisect((x) => normalCdf(x) - p, -8, 8);
}

/** ln Γ(x), x > 0: Lanczos' approximation (g = 7, nine terms), about 1e-15 relative. */
export function lnGamma(x: number): number {
  const coefficients = [
    0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059,
    12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
  ];
  const shifted = x - 1;
  const base = shifted + 7.5;
  let sum = coefficients[0]!;
  for (let i = 1; i < coefficients.length; i += 1) sum += coefficients[i]! / (shifted + i);
  return 0.5 * Math.log(2 * Math.PI) + (shifted + 0.5) * Math.log(base) - base + Math.log(sum);
}

/**
 * Distribution function of Beta(a, b) at x: the regularised incomplete beta function by its continued
 * fraction (modified Lentz), on the side where it converges quickly.
 */
export function betaCdf(x: number, a: number, b: number): number {
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  const front = Math.exp(lnGamma(a + b) - lnGamma(a) - lnGamma(b) + a * Math.log(x) + b * Math.log1p(-x));
  return x < (a + 1) / (a + b + 2)
    ? (front * betaFraction(x, a, b)) / a
    : 1 - (front * betaFraction(1 - x, b, a)) / b;
}

function betaFraction(x: number, a: number, b: number): number {
  const tiny = 1e-300;
  const away = (value: number) => (Math.abs(value) < tiny ? tiny : value);
  let c = 1;
  let d = 1 / away(1 - ((a + b) * x) / (a + 1));
  let value = d;
  for (let m = 1; m <= 1000; m += 1) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / away(1 + even * d);
    c = away(1 + even / c);
    value *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / away(1 + odd * d);
    c = away(1 + odd / c);
    const step = d * c;
    value *= step;
    if (Math.abs(step - 1) < 1e-15) break;
  }
  return value;
}

/** The x with P(Beta(a, b) ≤ x) = p. */
export function betaQuantile(p: number, a: number, b: number): number {
  if (!(p > 0 && p < 1)) throw new RangeError('A quantile is asked of a chance between 0 and 1.');
  return bisect((x) => betaCdf(x, a, b) - p, 0, 1);
}

/** Zero of a rising function between two points, to the last bit that halving can reach. */
function bisect(rising: (x: number) => number, from: number, to: number): number {
  let low = from;
  let high = to;
  for (;;) {
    const middle = (low + high) / 2;
    if (middle <= low || middle >= high) return middle;
    if (rising(middle) < 0) low = middle;
    else high = middle;
  }
}
