/**
 * Answers that depend on nothing but their question, made once and kept: the `most` asked for last.
 * What is kept is shared between callers, so it must not be changed.
 */
export function keeping<T>(most: number): (question: string, make: () => T) => T {
  const kept = new Map<string, T>();
  return (question, make) => {
    const known = kept.get(question);
    const answer = known ?? make();
    // Taken out and put in again, it is the newest.
    kept.delete(question);
    kept.set(question, answer);
    if (kept.size > most) kept.delete(kept.keys().next().value ?? '');
    return answer;
  };
}
