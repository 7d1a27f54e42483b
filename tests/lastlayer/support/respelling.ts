/** The same turns written otherwise; the definitions are the trade's, written here once more and not the engine's. */
import { parseMoves } from '#shared/lastlayer/notation.ts';
import { pick } from './random.ts';

/** Common practice: a wide is the opposite face and a turn of the whole cube; M follows L, E follows D, S follows F. */
const SAME: Readonly<Record<string, string>> = {
  r: 'L x',
  l: "R x'",
  u: 'D y',
  d: "U y'",
  f: 'B z',
  b: "F z'",
  M: "x' R L'",
  E: "y' U D'",
  S: "z F' B",
  R: 'l x',
  L: "r x'",
  U: 'd y',
  D: "u y'",
  F: 'b z',
  B: "f z'",
};
/** A turn of the whole cube carries each face to the next of its cycle. Common practice: x follows R, y U, z F. */
const CARRIES: Readonly<Record<string, string>> = { x: 'FUBD', y: 'FLBR', z: 'URDL' };
const FOLLOWS: Readonly<Record<string, string>> = { M: 'L', E: 'D', S: 'F', x: 'R', y: 'U', z: 'F' };
const OPPOSITE: Readonly<Record<string, string>> = { R: 'L', L: 'R', U: 'D', D: 'U', F: 'B', B: 'F' };

const suffix = (amount: number): string => ['', '2', "'"][(amount & 3) - 1]!;
const spaced = (moves: readonly string[]): string => moves.filter((move) => move !== '').join(' ');

/** Every move with another spelling replaced by it, with the chance given: r and Rw, L x; M, x' R L'. */
export function respell(random: () => number, algorithm: string, chance: number): string {
  return spaced(
    parseMoves(algorithm).map(({ family, amount, text }) => {
      if (random() >= chance) return text;
      if (/[rludfb]/u.test(family) && random() < 0.5) return `${family.toUpperCase()}w${text.slice(1)}`;
      const same = SAME[family];
      return same ? Array(amount).fill(same).join(' ') : text;
    }),
  );
}

/** A move as it is called after a quarter turn of the whole cube about this axis. */
function renamed(family: string, amount: number, axis: string): string {
  const cycle = CARRIES[axis]!;
  const carry = (face: string): string =>
    cycle.includes(face) ? cycle[(cycle.indexOf(face) + 1) % 4]! : face;
  const followed = FOLLOWS[family];
  if (!followed) {
    const face = carry(family.toUpperCase());
    return (family === family.toUpperCase() ? face : face.toLowerCase()) + suffix(amount);
  }
  const now = carry(followed);
  const kind = 'MES'.includes(family) ? 'MES' : 'xyz';
  const same = Array.from(kind).find((name) => FOLLOWS[name] === now);
  if (same) return same + suffix(amount);
  return Array.from(kind).find((name) => FOLLOWS[name] === OPPOSITE[now])! + suffix(4 - amount);
}

/** The same algorithm with the cube turned as a whole somewhere inside, and what follows told from there. */
export function turnedInside(random: () => number, algorithm: string): string {
  const axis = pick(random, ['x', 'y', 'z']);
  const moves = parseMoves(algorithm);
  const at = Math.floor(random() * (moves.length + 1));
  return spaced([
    ...moves.slice(0, at).map(({ text }) => text),
    axis,
    ...moves.slice(at).map(({ family, amount }) => renamed(family, amount, axis)),
  ]);
}
