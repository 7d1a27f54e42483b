/** What of a last layer is looked at or already done: aspects, entry conditions, and seeing through them. */
import { FLIP_ACT, PERMUTATION_ACT, TWIST_ACT } from './action.ts';
import { cornerRank, edgeRank, FLIPS, flipOf, TWISTS, twistOf } from './state.ts';

/** Corner orientation, edge orientation, corner permutation, edge permutation. */
export type Aspect = 'co' | 'eo' | 'cp' | 'ep';
export const ASPECTS: readonly Aspect[] = ['co', 'eo', 'cp', 'ep'];

/**
 * Which states reach a step: what is done on arrival. "corners" are permuted and oriented, "edges" likewise. A
 * permutation counts as done up to AUF, both permutations together up to one AUF.
 */
export type Entry =
  | 'any'
  | 'eo'
  | 'co'
  | 'co+eo'
  | 'corners'
  | 'corners+eo'
  | 'cp'
  | 'cp+eo'
  | 'ep'
  | 'co+ep'
  | 'edges'
  | 'co+edges'
  | 'cp+ep'
  | 'corners+ep'
  | 'cp+edges';
/** The entries that the trade's own sets begin from. */
export const ENTRIES: readonly Entry[] = ['any', 'eo', 'co', 'co+eo', 'corners', 'corners+eo'];

const FIXED: Readonly<Record<Entry, readonly Aspect[]>> = {
  any: [],
  eo: ['eo'],
  co: ['co'],
  'co+eo': ['co', 'eo'],
  corners: ['co', 'cp'],
  'corners+eo': ['co', 'eo', 'cp'],
  cp: ['cp'],
  'cp+eo': ['eo', 'cp'],
  ep: ['ep'],
  'co+ep': ['co', 'ep'],
  edges: ['eo', 'ep'],
  'co+edges': ['co', 'eo', 'ep'],
  'cp+ep': ['cp', 'ep'],
  'corners+ep': ['co', 'cp', 'ep'],
  'cp+edges': ['eo', 'cp', 'ep'],
};
/** All fifteen: every choice of aspects but all four, which would leave nothing to do. */
export const EVERY_ENTRY: readonly Entry[] = Object.keys(FIXED) as Entry[];

export const isEntry = (word: string): word is Entry => (EVERY_ENTRY as readonly string[]).includes(word);
export const isAspect = (word: string): word is Aspect => (ASPECTS as readonly string[]).includes(word);

/** The aspects an entry condition has already solved, permutations up to AUF. */
export const fixedBy = (entry: Entry): readonly Aspect[] => FIXED[entry];

/** The entry that has exactly these aspects done; null for all four, which is a solved last layer. */
export const entryFixing = (aspects: readonly Aspect[]): Entry | null => {
  const wanted = inOrder(aspects).join();
  return EVERY_ENTRY.find((entry) => FIXED[entry].join() === wanted) ?? null;
};

/** Aspects in the order co, eo, cp, ep, each once. */
export const inOrder = (aspects: Iterable<Aspect>): readonly Aspect[] => {
  const wanted = new Set(aspects);
  return ASPECTS.filter((aspect) => wanted.has(aspect));
};

/** What a case of a set is seen through: the aspects told apart together with those the entry fixes. */
export const seenThrough = (entry: Entry, toldApart: readonly Aspect[]): readonly Aspect[] =>
  inOrder([...FIXED[entry], ...toldApart]);

/** Solved up to AUF: whether a permutation rank is one of the four turns of the top. */
export const isTurnOfTop = (rank: number): boolean =>
  [0, 1, 2, 3].some((turn) => PERMUTATION_ACT[turn * 4] === rank);

/** Whether a state reaches the step with this entry condition. `index` 0..62207. */
export const isEntryState = (entry: Entry, index: number): boolean => isSolvedIn(index, FIXED[entry]);

/** Whether these aspects of a state are solved, permutations together up to one AUF after. */
export function isSolvedIn(index: number, aspects: readonly Aspect[]): boolean {
  if (aspects.includes('co') && twistOf(index) !== 0) return false;
  if (aspects.includes('eo') && flipOf(index) !== 0) return false;
  const corners = aspects.includes('cp');
  const edges = aspects.includes('ep');
  if (!corners && !edges) return true;
  for (let turn = 0; turn < 4; turn++) {
    const solved = PERMUTATION_ACT[turn * 4];
    if ((!corners || cornerRank(index) === solved) && (!edges || edgeRank(index) === solved)) return true;
  }
  return false;
}

/** A state seen through some aspects only, as one number below 124,416; the rest counts as solved. */
export type View = number;
export const VIEWS = 24 * 24 * TWISTS * FLIPS;

/** What of a state is seen. `index` 0..62207. */
export const viewOf = (index: number, aspects: readonly Aspect[]): View => {
  const sees = (aspect: Aspect, value: number): number => (aspects.includes(aspect) ? value : 0);
  const permutations = sees('cp', cornerRank(index)) * 24 + sees('ep', edgeRank(index));
  return (permutations * TWISTS + sees('co', twistOf(index))) * FLIPS + sees('eo', flipOf(index));
};

/**
 * The sixteen images of views through these aspects, as `(view, turn) => view` with turn = before·4 + after.
 * An aspect not looked at stays solved.
 */
export function viewTurner(aspects: readonly Aspect[]): (view: View, turn: number) => View {
  const cp = aspects.includes('cp');
  const ep = aspects.includes('ep');
  return (view, turn) => {
    const permutations = Math.floor(view / 216);
    const before = turn >> 2;
    const corners = Math.floor(permutations / 24);
    const edges = permutations % 24;
    return (
      (((cp ? PERMUTATION_ACT[corners * 16 + turn]! : 0) * 24 +
        (ep ? PERMUTATION_ACT[edges * 16 + turn]! : 0)) *
        TWISTS +
        TWIST_ACT[(Math.floor(view / FLIPS) % TWISTS) * 4 + before]!) *
        FLIPS +
      FLIP_ACT[(view % FLIPS) * 4 + before]!
    );
  };
}
