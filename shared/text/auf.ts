/** AUFs as they are printed, by quarter turns of the top: 0..3. */
const names = ['none', 'U', 'U2', 'U′'] as const;
const spoken = ['none', 'U', 'U two', 'U prime'] as const;

export const aufText = {
  names,
  /** One AUF as it is read aloud. */
  spoken: (turns: number): string => spoken[turns] ?? '–',
  /** One AUF; a number outside 0..3 is a dash. */
  name: (turns: number): string => names[turns] ?? '–',
  /** All that are right, as one phrase. */
  anyOf: (turns: readonly number[]): string => {
    const words = turns.map((turn) => names[turn] ?? '–');
    if (words.length < 2) return words.join('');
    return words.length === names.length ? 'any' : `${words.slice(0, -1).join(', ')} or ${words.at(-1)}`;
  },
} as const;
