/** The trade's case sets as data: entry condition, aspects told apart, aspects solved. */
import { ASPECTS, type Aspect, type Entry, inOrder, seenThrough } from './aspects.ts';

export interface CaseSetDefinition {
  /** Lower case, for addresses and storage: `pll`. */
  readonly key: string;
  /** As the trade writes it: `PLL`. */
  readonly name: string;
  readonly entry: Entry;
  readonly toldApart: readonly Aspect[];
  readonly solved: readonly Aspect[];
}

const define = (
  name: string,
  entry: Entry,
  toldApart: readonly Aspect[],
  solved: readonly Aspect[],
): CaseSetDefinition => ({ key: name.toLowerCase(), name, entry, toldApart, solved });

/** Common practice. CLL here is the 3×3 step: corners only, edges as they fall. */
export const CASE_SETS: readonly CaseSetDefinition[] = [
  define('OLL', 'any', ['co', 'eo'], ['co', 'eo']),
  define('PLL', 'co+eo', ['cp', 'ep'], ASPECTS),
  define('OCLL', 'eo', ['co'], ['co', 'eo']),
  define('EOLL', 'any', ['eo'], ['eo']),
  define('CPLL', 'co+eo', ['cp'], ['co', 'eo', 'cp']),
  define('EPLL', 'corners+eo', ['ep'], ASPECTS),
  define('COLL', 'eo', ['co', 'cp'], ['co', 'eo', 'cp']),
  define('CLL', 'any', ['co', 'cp'], ['co', 'cp']),
  define('ELL', 'corners', ['eo', 'ep'], ASPECTS),
  define('ZBLL', 'eo', ['co', 'cp', 'ep'], ASPECTS),
  define('OLLCP', 'any', ['co', 'eo', 'cp'], ['co', 'eo', 'cp']),
  define('1LLL', 'any', ASPECTS, ASPECTS),
];

const joined = (aspects: readonly Aspect[]): string =>
  aspects.length === ASPECTS.length ? 'all' : inOrder(aspects).join('-') || 'none';

/**
 * Key of a case, the same wherever the case turns up: entry, told apart, solved, smallest state in base 36,
 * as `co-eo.cp-ep.all.2s`. Letters, digits, dots and hyphens only. A subset's case has its parent's key.
 */
export function caseKey(set: CaseSetDefinition, canonical: number): string {
  return [
    set.entry.replace('+', '-'),
    joined(set.toldApart),
    joined(set.solved),
    canonical.toString(36),
  ].join('.');
}

/**
 * Refuses a set whose algorithms could not be said to solve one case of it.
 * @throws RangeError if an aspect is to be solved that is neither told apart nor fixed by the entry, or is
 *   told apart without being solved.
 */
export function requireSolvable(set: CaseSetDefinition): void {
  const seen = seenThrough(set.entry, set.toldApart);
  const unseen = set.solved.find((aspect) => !seen.includes(aspect));
  if (unseen)
    throw new RangeError(`${set.name} solves ${unseen}, which is neither told apart nor done on entry.`);
  const unsolved = set.toldApart.find((aspect) => !set.solved.includes(aspect));
  if (unsolved) throw new RangeError(`${set.name} tells ${unsolved} apart but does not solve it.`);
}
