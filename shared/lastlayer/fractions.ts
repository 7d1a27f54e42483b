/** Exact fractions of whole numbers. */

export interface Fraction {
  readonly numerator: number;
  readonly denominator: number;
}

export const greatestDivisor = (one: number, other: number): number =>
  other === 0 ? one : greatestDivisor(other, one % other);

/** The fraction in lowest terms. Both are whole numbers from 1. */
export function fraction(numerator: number, denominator: number): Fraction {
  const divisor = greatestDivisor(numerator, denominator);
  return { numerator: numerator / divisor, denominator: denominator / divisor };
}
