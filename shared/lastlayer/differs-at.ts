/** Where two pictures differ, in the words of someone who holds the cube. */
import { ASPECTS, type Aspect } from './aspects.ts';
import { maskStickers } from './pictures/mask.ts';
import { type Stickers, stickersOf } from './pictures/stickers.ts';
import type { Holding } from './seat-codes.ts';

/** Three stickers left to right: which of them are of one colour. */
export type Run = 'alike' | 'starts-alike' | 'ends-alike' | 'outer-alike' | 'different';
/**
 * How the colours of a run lie to each other round the cube: the odd one and the pair, or in a run of three
 * different colours the two that face each other.
 */
export type Relation =
  | 'none'
  | 'opposite'
  | 'neighbour'
  | 'outer-opposite'
  | 'first-opposite'
  | 'last-opposite';

export type Difference =
  /** Pieces that show the top colour upwards in only one of the two; places 0..8 row by row from the back left. */
  | {
      readonly face: 'top';
      readonly kind: 'up';
      readonly shown: readonly number[];
      readonly other: readonly number[];
    }
  /** The same pieces face up, but at these places of the top other colours do; 0..8 row by row from the back left. */
  | { readonly face: 'top'; readonly kind: 'places'; readonly places: readonly number[] }
  /** Places 0..2, left to right, that carry the top colour on a side. */
  | {
      readonly face: SideFace;
      readonly kind: 'top-colour';
      readonly shown: readonly number[];
      readonly other: readonly number[];
    }
  | { readonly face: SideFace; readonly kind: 'run'; readonly shown: Run; readonly other: Run }
  | {
      readonly face: SideFace;
      readonly kind: 'relation';
      readonly run: Run;
      readonly shown: Relation;
      readonly other: Relation;
    }
  /** The same pattern in other colours. */
  | { readonly face: SideFace; readonly kind: 'colours' };
export type SideFace = 'front' | 'right' | 'left';

const OPPOSITE: Readonly<Record<string, string>> = { F: 'B', B: 'F', R: 'L', L: 'R' };

const placesOf = (letters: string, wanted: string): number[] =>
  Array.from(letters).flatMap((letter, place) => (letter === wanted ? [place] : []));

function runOf(letters: string): Run {
  const [a, b, c] = letters;
  if (a === b && b === c) return 'alike';
  if (a === b) return 'starts-alike';
  if (b === c) return 'ends-alike';
  return a === c ? 'outer-alike' : 'different';
}

function relationOf(letters: string): Relation {
  const [a = '', b = '', c = ''] = letters;
  switch (runOf(letters)) {
    case 'alike':
      return 'none';
    case 'different':
      if (OPPOSITE[a] === c) return 'outer-opposite';
      if (OPPOSITE[a] === b) return 'first-opposite';
      return OPPOSITE[b] === c ? 'last-opposite' : 'none';
    case 'starts-alike':
      return OPPOSITE[a] === c ? 'opposite' : 'neighbour';
    default:
      return OPPOSITE[a] === b ? 'opposite' : 'neighbour';
  }
}

const same = (one: readonly number[], other: readonly number[]): boolean => one.join() === other.join();

/** The plainest difference of one side, or null. */
function sideDifference(face: SideFace, shown: string, other: string): Difference | null {
  if (shown === other) return null;
  const [shownTop, otherTop] = [placesOf(shown, 'U'), placesOf(other, 'U')];
  if (!same(shownTop, otherTop)) return { face, kind: 'top-colour', shown: shownTop, other: otherTop };
  const [shownRun, otherRun] = [runOf(shown), runOf(other)];
  if (shownRun !== otherRun) return { face, kind: 'run', shown: shownRun, other: otherRun };
  const [shownRelation, otherRelation] = [relationOf(shown), relationOf(other)];
  if (shownRelation !== otherRelation)
    return { face, kind: 'relation', run: shownRun, shown: shownRelation, other: otherRelation };
  return { face, kind: 'colours' };
}

/** Plainer first: what can be said without naming a colour. */
const PLAINNESS: readonly Difference['kind'][] = ['up', 'top-colour', 'run', 'relation', 'places', 'colours'];

/**
 * The plainest visible difference of two full states in the seat view: on top if other stickers face up,
 * else on the side that can be told most simply, the front before the turned side, else by the colours of stickers
 * on top. Only what `seen` tells apart is compared. null if nothing in view differs.
 * @throws RangeError unless both states are 0..62207.
 */
export function differsAt(
  shown: number,
  other: number,
  holding: Holding = 'right',
  seen: readonly Aspect[] = ASPECTS,
): Difference | null {
  const [one, two]: Stickers[] = [stickersOf(shown), stickersOf(other)].map((all) => maskStickers(all, seen));
  const [up, upOther] = [placesOf(one!.top, 'U'), placesOf(two!.top, 'U')];
  if (!same(up, upOther)) {
    return {
      face: 'top',
      kind: 'up',
      shown: up.filter((place) => !upOther.includes(place)),
      other: upOther.filter((place) => !up.includes(place)),
    };
  }
  const sides = (['front', holding] as const).flatMap((face) => {
    const found = sideDifference(face, one![face], two![face]);
    return found ? [found] : [];
  });
  const places = Array.from(one!.top, (_, place) => place).filter(
    (place) => one!.top[place] !== two!.top[place],
  );
  if (places.length > 0) sides.push({ face: 'top', kind: 'places', places });
  sides.sort((a, b) => PLAINNESS.indexOf(a.kind) - PLAINNESS.indexOf(b.kind));
  return sides[0] ?? null;
}
