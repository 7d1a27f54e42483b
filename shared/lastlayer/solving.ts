/** What an algorithm does for the cases of a set, and the AUFs that go with it. */
import { AUFS, type Auf, act, inverse, PERMUTATION_ACT, product } from './action.ts';
import { type Aspect, fixedBy, isEntryState, isSolvedIn } from './aspects.ts';
import type { CaseOfSet, CaseSet } from './case-set.ts';
import { type Expander, parseMoves } from './notation.ts';
import { type Reading, readAlgorithm, stateSolved } from './reading.ts';
import { cornerRank, edgeRank, flipOf, indexOf, PARITY, requireStateIndex, twistOf } from './state.ts';

export type Solves =
  | { readonly kind: 'case' | 'skip'; readonly case: CaseOfSet; readonly normalised: string }
  | {
      readonly kind: 'not-in-set';
      /** Aspects done on entry that the algorithm undoes; none if its case is one the set has left out. */
      readonly undoes: readonly Aspect[];
      readonly normalised: string;
    }
  | Exclude<Reading, { kind: 'state' }>;

/** A permutation of this parity that counts as done: the identity, or one quarter turn of the top. */
const doneWith = (rank: number): number => (PARITY[rank] === 0 ? 0 : PERMUTATION_ACT[1]!);

/**
 * The state with the aspects that are done on entry, and that the set's algorithms need not keep, taken as
 * done: an algorithm may do with them what it likes. A permutation so freed is turned as the other one is if that
 * is done too, and else as the other one's parity asks.
 */
function withEntryDone(set: CaseSet, state: number): number {
  const { entry, solved } = set.definition;
  const done = fixedBy(entry);
  const isFree = (aspect: Aspect) => done.includes(aspect) && !solved.includes(aspect);
  let [corners, edges] = [cornerRank(state), edgeRank(state)];
  if (isFree('cp') && isFree('ep')) [corners, edges] = [0, 0];
  else if (isFree('cp')) corners = done.includes('ep') ? edges : doneWith(edges);
  else if (isFree('ep')) edges = done.includes('cp') ? corners : doneWith(corners);
  return indexOf(corners, isFree('co') ? 0 : twistOf(state), edges, isFree('eo') ? 0 : flipOf(state));
}

/** The aspects done on entry that a state does not have done; of two that are turned apart, the edges'. */
function undoneBy(set: CaseSet, state: number): readonly Aspect[] {
  const { entry, solved } = set.definition;
  if (isEntryState(entry, state)) return [];
  const undone = fixedBy(entry).filter((aspect) => solved.includes(aspect) && !isSolvedIn(state, [aspect]));
  return undone.length > 0 ? undone : ['ep'];
}

/**
 * The case of the set that an algorithm solves: from every state of that case, after some AUF before, the
 * set's solved aspects are solved up to AUF after, with the first two layers intact. Each aspect of the
 * result depends on the same aspect of the start alone, and a set solves nothing it does not see; so this is
 * the case of the one state the algorithm solves outright, if that state reaches the step at all.
 */
export function solvesCase(set: CaseSet, text: string, expand?: Expander): Solves {
  const reading = readAlgorithm(text, expand);
  if (reading.kind !== 'state') return reading;
  const { normalised } = reading;
  const state = withEntryDone(set, reading.state);
  const solved = set.caseOfState(state);
  if (solved) return { kind: solved.skip ? 'skip' : 'case', case: solved, normalised };
  return { kind: 'not-in-set', undoes: undoneBy(set, state), normalised };
}

/**
 * What an algorithm does to the last layer as a state, or null if it breaks the first two layers.
 * @throws AlgorithmSyntaxError if the algorithm cannot be read.
 */
export function effectOf(algorithm: string): number | null {
  const state = stateSolved(parseMoves(algorithm));
  return state === null ? null : inverse(state);
}

/**
 * Every AUF before with which the algorithm solves the shown state, up to AUF after: 4/m of the four for a
 * case with m angles, none if the algorithm does not solve its case.
 * @throws AlgorithmSyntaxError if the algorithm cannot be read; RangeError if there is no such state.
 */
export function rightAufsBefore(set: CaseSet, algorithm: string, state: number): readonly Auf[] {
  requireStateIndex(state);
  const effect = effectOf(algorithm);
  if (effect === null) return [];
  return AUFS.filter((auf) => isSolvedIn(product(act(state, auf, 0), effect), set.definition.solved));
}

/**
 * Every AUF after that finishes the set's solved aspects once `before` and the algorithm are done: one, or
 * all four where no permutation is solved; none if the algorithm does not solve the state so.
 * @throws AlgorithmSyntaxError if the algorithm cannot be read; RangeError if there is no such state.
 */
export function rightAufsAfter(set: CaseSet, algorithm: string, state: number, before: Auf): readonly Auf[] {
  requireStateIndex(state);
  const effect = effectOf(algorithm);
  if (effect === null) return [];
  const { solved } = set.definition;
  const left = product(act(state, before, 0), effect);
  if (!isSolvedIn(left, solved)) return [];
  return AUFS.filter((auf) => {
    const end = act(left, auf, 0);
    return (
      (!solved.includes('cp') || cornerRank(end) === 0) && (!solved.includes('ep') || edgeRank(end) === 0)
    );
  });
}
