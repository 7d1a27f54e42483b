/** How far apart cases look from the seat: packed pictures of all sixteen images of each case, compared. */
import { AUFS, act } from './action.ts';
import type { Aspect } from './aspects.ts';
import { type Holding, seatCodes, stickersApart } from './seat-codes.ts';

/**
 * The packed pictures of a list of states: those of state number n from n·16 on, at after·4 + before
 * within them.
 */
export interface ViewCodes {
  readonly tops: Int32Array;
  readonly sides: Int32Array;
  /** How many of a state's sixteen look different: all where a permutation is seen, else the first four. */
  readonly turns: 4 | 16;
}

/** The pictures, with everything hatched that `seen` does not tell apart, of states 0..62207. */
export function viewCodes(seen: readonly Aspect[], states: readonly number[], holding: Holding): ViewCodes {
  const codes = seatCodes(seen, holding);
  const tops = new Int32Array(states.length * 16);
  const sides = new Int32Array(states.length * 16);
  states.forEach((state, at) => {
    for (const before of AUFS)
      for (const after of AUFS) {
        const image = act(state, before, after);
        tops[at * 16 + after * 4 + before] = codes.top(image);
        sides[at * 16 + after * 4 + before] = codes.sides(image);
      }
  });
  return { tops, sides, turns: seen.includes('cp') || seen.includes('ep') ? 16 : 4 };
}

/**
 * Fewest visible stickers, 0..14, in which pictures of two of the states differ. One of the two is turned in
 * its places only: turning the pieces of both changes the colours of both alike.
 */
export function leastApart({ tops, sides, turns }: ViewCodes, one: number, other: number): number {
  let least = 15;
  for (let a = one * 16; a < one * 16 + 4; a++)
    for (let b = other * 16; b < other * 16 + turns; b++) {
      const apart = stickersApart(tops[a]!, tops[b]!) + stickersApart(sides[a]!, sides[b]!);
      if (apart < least) least = apart;
    }
  return least;
}
