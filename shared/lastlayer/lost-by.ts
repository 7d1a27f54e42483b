/** What tells a shown case apart from the one that was named for it. */
import { AUFS, act } from './action.ts';
import { ASPECTS, type Aspect, seenThrough } from './aspects.ts';
import type { CaseOfSet, CaseSet } from './case-set.ts';
import { type LastLayerState, stateAt } from './state.ts';

export type LostBy =
  | 'corner orientation'
  | 'edge orientation'
  | 'corner permutation'
  | 'edge permutation'
  | 'mirror';

const WORDS: Readonly<Record<Aspect, LostBy>> = {
  co: 'corner orientation',
  eo: 'edge orientation',
  cp: 'corner permutation',
  ep: 'edge permutation',
};

/** Places, 0..4, at which two states differ in one aspect. */
const placesApart = (one: LastLayerState, other: LastLayerState, aspect: Aspect): number =>
  one[aspect].filter((value, place) => value !== other[aspect][place]).length;

/**
 * What a showing of the full state `shown` was lost by when `named` was said: "mirror" if that is the mirror
 * case; otherwise the two are laid over each other from the angle and AUF at which they differ in the fewest
 * aspects, then in the fewest places, and the first aspect that still differs is told, orientation before
 * permutation and corners before edges. null if `named` is the case shown.
 * @throws RangeError if `shown` is no state.
 */
export function lostBy(set: CaseSet, shown: number, named: CaseOfSet): LostBy | null {
  const was = set.caseOfState(shown);
  if (was && was.number === named.number) return null;
  if (was && set.mirrorOf(was).number === named.number) return 'mirror';
  const seen = seenThrough(set.definition.entry, set.definition.toldApart);
  const state = stateAt(shown);
  let least = Number.POSITIVE_INFINITY;
  let lost: LostBy | null = null;
  for (const before of AUFS)
    for (const after of AUFS) {
      const other = stateAt(act(named.canonical, before, after));
      const apart = ASPECTS.filter((aspect) => seen.includes(aspect)).map((aspect) => ({
        aspect,
        places: placesApart(state, other, aspect),
      }));
      const differing = apart.filter(({ places }) => places > 0);
      const places = differing.reduce((sum, one) => sum + one.places, 0);
      const first = differing[0] ? ASPECTS.indexOf(differing[0].aspect) : 0;
      const cost = differing.length * 1000 + places * 10 + first;
      if (cost >= least || differing.length === 0) continue;
      least = cost;
      lost = WORDS[differing[0]!.aspect];
    }
  return lost;
}
