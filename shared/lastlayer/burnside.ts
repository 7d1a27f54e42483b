/**
 * The Cauchy–Frobenius lemma (Burnside's) for any step: the number of cases is the mean number of states that
 * the sixteen turns leave as they are. States are counted as seen, piece by piece, without listing cases: a count
 * of its own to hold the other one against.
 */
import { AUFS, type Auf, FLIP_ACT, PERMUTATION_ACT, TWIST_ACT } from './action.ts';
import { type Aspect, type Entry, fixedBy, isTurnOfTop, seenThrough } from './aspects.ts';
import { FLIPS, PARITY, PERMUTATIONS, TWISTS } from './state.ts';

export interface FixedStates {
  readonly before: Auf;
  readonly after: Auf;
  /** States that this element of the sixteen-fold action leaves as they are. */
  readonly fixed: number;
}

const EVERY_RANK = Array.from({ length: PERMUTATIONS }, (_, rank) => rank);

/** Codes of one orientation that U^before leaves as they are, of those that may be seen. */
function fixedCodes(act: Uint8Array, codes: number, before: Auf): number {
  let fixed = 0;
  for (let code = 0; code < codes; code++) if (act[code * 4 + before] === code) fixed++;
  return fixed;
}

/**
 * Burnside's table of a step, its 16 rows in the order before · 4 + after. The row (0, 0) counts all the states as
 * seen: everything that is neither told apart nor done on arrival counts as one.
 */
export function burnsideOf(entry: Entry, aspects: readonly Aspect[]): readonly FixedStates[] {
  const fixed = fixedBy(entry);
  const seen = seenThrough(entry, aspects);
  const ranks = (aspect: 'cp' | 'ep'): readonly number[] => {
    if (!seen.includes(aspect)) return [0];
    return fixed.includes(aspect) ? EVERY_RANK.filter(isTurnOfTop) : EVERY_RANK;
  };
  const open = (aspect: 'co' | 'eo'): boolean => seen.includes(aspect) && !fixed.includes(aspect);
  const together = fixed.includes('cp') && fixed.includes('ep');
  const [cornersSeen, edgesSeen] = [seen.includes('cp'), seen.includes('ep')];
  const pairs = ranks('cp').flatMap((corners) =>
    ranks('ep')
      .filter((edges) => !(cornersSeen && edgesSeen) || PARITY[corners] === PARITY[edges])
      .filter((edges) => !together || corners === edges)
      .map((edges) => [corners, edges] as const),
  );
  const stays = (rank: number, turn: number): boolean => PERMUTATION_ACT[rank * 16 + turn] === rank;

  return AUFS.flatMap((before) => {
    const twists = open('co') ? fixedCodes(TWIST_ACT, TWISTS, before) : 1;
    const flips = open('eo') ? fixedCodes(FLIP_ACT, FLIPS, before) : 1;
    return AUFS.map((after) => {
      const turn = before * 4 + after;
      const permutations = pairs.filter(
        ([corners, edges]) => (!cornersSeen || stays(corners, turn)) && (!edgesSeen || stays(edges, turn)),
      ).length;
      return { before, after, fixed: permutations * twists * flips };
    });
  });
}
