/** The trade's case sets as data: entry condition, aspects told apart, aspects solved. */
import { ASPECTS, type Aspect, type Entry, fixedBy, inOrder, seenThrough } from './aspects.ts';
import type { EntryShare } from './mix.ts';

export interface CaseSetDefinition {
  /** Lower case, for addresses and storage: `pll`. */
  readonly key: string;
  /** As the trade writes it: `PLL`. */
  readonly name: string;
  /** What is done on arrival; for a mix what all its entries have in common. */
  readonly entry: Entry;
  readonly toldApart: readonly Aspect[];
  readonly solved: readonly Aspect[];
  /** The entries of a solver who arrives now one way, now another; empty for a single entry. */
  readonly mix: readonly EntryShare[];
}

const define = (
  name: string,
  entry: Entry,
  toldApart: readonly Aspect[],
  solved: readonly Aspect[],
): CaseSetDefinition => ({ key: name.toLowerCase(), name, entry, toldApart, solved, mix: [] });

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

/** The aspects a set tells apart that are not done on arrival anyway: those its cases differ in. */
export const openIn = ({ entry, toldApart }: Pick<CaseSetDefinition, 'entry' | 'toldApart'>) =>
  inOrder(toldApart).filter((aspect) => !fixedBy(entry).includes(aspect));

const joined = (aspects: readonly Aspect[]): string =>
  aspects.length === ASPECTS.length ? 'all' : inOrder(aspects).join('-') || 'none';

/**
 * Key of a case, the same wherever the case turns up: entry, told apart, solved, smallest state in base 36,
 * as `co-eo.cp-ep.all.2s`. Letters, digits, dots and hyphens only. A subset's case has its parent's key.
 */
export function caseKey(set: CaseSetDefinition, canonical: number): string {
  return [set.entry.replace('+', '-'), joined(openIn(set)), joined(set.solved), canonical.toString(36)].join(
    '.',
  );
}

const sameAspects = (one: readonly Aspect[], other: readonly Aspect[]): boolean =>
  inOrder(one).join() === inOrder(other).join();

/** What decides which cases a set has; without `solved`, whatever its algorithms solve. */
export type Structure = Pick<CaseSetDefinition, 'entry' | 'toldApart'> &
  Partial<Pick<CaseSetDefinition, 'solved' | 'mix'>>;

/**
 * The trade's set with the same cases, or undefined. A mix has all the cases of what its entries have in common
 * only if that is one of them. Where `solved` is given it must agree too: then the case keys are the same.
 */
export function tradeSetLike({
  entry,
  toldApart,
  solved,
  mix = [],
}: Structure): CaseSetDefinition | undefined {
  if (mix.length > 0 && !mix.some((share) => share.entry === entry)) return undefined;
  return CASE_SETS.find(
    (set) =>
      set.entry === entry &&
      sameAspects(seenThrough(set.entry, set.toldApart), seenThrough(entry, toldApart)) &&
      (solved === undefined || sameAspects(set.solved, solved)),
  );
}
