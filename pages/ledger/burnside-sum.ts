/** Fixed states of all sixteen pairs of turns together: sixteen times the number of cases. */
export function burnsideSum(fixed: readonly number[]): number {
  return fixed.reduce((sum, states) => sum + states, 0);
}

/** The same sum with equal terms gathered, the largest first: what stands in the formula. Zeros are left out. */
export function gatheredTerms(fixed: readonly number[]): { value: number; times: number }[] {
  const times = new Map<number, number>();
  for (const value of fixed) if (value > 0) times.set(value, (times.get(value) ?? 0) + 1);
  return [...times].map(([value, n]) => ({ value, times: n })).sort((a, b) => b.value - a.value);
}
