/** The view of one case that is hardest to tell from a picture of another. */
import { ASPECTS } from './aspects.ts';
import type { CaseOfSet, CaseSet } from './case-set.ts';
import { type Holding, type SeatCodes, seatCodes, stickersApart } from './seat-codes.ts';

const made: Partial<Record<Holding, SeatCodes>> = {};
const codesOf = (holding: Holding): SeatCodes => {
  made[holding] ??= seatCodes(ASPECTS, holding);
  return made[holding];
};
const OTHER: Readonly<Record<Holding, Holding>> = { right: 'left', left: 'right' };

/**
 * The full state of `named` whose picture in the seat view differs from that of `shown` in the fewest
 * stickers; among those the one with the fewest differences on the far side, then the smallest index.
 */
export function nearestView(
  set: CaseSet,
  shown: number,
  named: CaseOfSet,
  holding: Holding = 'right',
): number {
  const near = codesOf(holding);
  const far = codesOf(OTHER[holding]);
  const [top, sides, farSides] = [near.top(shown), near.sides(shown), far.sides(shown)];
  const states = set.statesOf(named);
  let best = named.canonical;
  let least = Number.POSITIVE_INFINITY;
  for (let at = 0; at < states.length; at++) {
    const state = states[at]!;
    const visible = stickersApart(top, near.top(state)) + stickersApart(sides, near.sides(state));
    if (visible * 16 > least) continue;
    const cost = visible * 16 + stickersApart(farSides, far.sides(state));
    if (cost >= least) continue;
    least = cost;
    best = state;
  }
  return best;
}
