/** Random algorithms: any turns at all, and long ones that keep the first two layers. */
import { OLL_NAMES } from '#shared/lastlayer/names-oll.ts';
import { PLL_NAMES } from '#shared/lastlayer/names-pll.ts';
import { pick } from './random.ts';

const FAMILIES = [...'ULFRBDulfrbdMESxyz', ...['Uw', 'Lw', 'Fw', 'Rw', 'Bw', 'Dw']];
const SUFFIXES = ['', '2', "'"];
const ROTATIONS = ['', 'x', "x'", 'x2', 'y', "y'", 'y2', 'z', "z'", 'z2', "x y'", 'z2 y'];

/** The table's algorithms that end as the cube was held: others can only come last. */
const KNOWN = [
  ...OLL_NAMES.map(([, , algorithm]) => algorithm),
  ...PLL_NAMES.map(([, algorithm]) => algorithm),
];
const CLOSED = KNOWN.filter((algorithm) => /^[ULFRBD'2 ]+$/u.test(algorithm));

export const anyTurns = (random: () => number, length: number): string =>
  Array.from({ length }, () => pick(random, FAMILIES) + pick(random, SUFFIXES)).join(' ');

/** The same turns spelled otherwise: a face as the wide opposite it and a turn of the whole cube. */
function respelled(random: () => number, algorithm: string): string {
  const other: Record<string, readonly [string, string, boolean]> = {
    R: ['l', 'x', false],
    L: ['r', 'x', true],
    U: ['d', 'y', false],
    D: ['u', 'y', true],
    F: ['b', 'z', false],
    B: ['f', 'z', true],
  };
  const inverted = (suffix: string): string => (suffix === "'" ? '' : suffix === '' ? "'" : '2');
  return algorithm
    .split(' ')
    .map((move) => {
      const spelling = other[move[0]!];
      if (!spelling || random() < 0.7) return move;
      const suffix = move.slice(1);
      const [wide, rotation, against] = spelling;
      return `${wide}${suffix} ${rotation}${against ? inverted(suffix) : suffix}`;
    })
    .join(' ');
}

/** One to four known algorithms with turns of the top and of the whole cube between and behind them. */
export function lastLayerAlgorithm(random: () => number): string {
  const parts: string[] = [];
  const count = Math.floor(random() * 4);
  for (let part = 0; part < count; part++)
    parts.push(
      pick(random, ['', 'y', "y'", 'y2']),
      pick(random, ['', 'U', 'U2', "U'"]),
      pick(random, CLOSED),
    );
  parts.push(pick(random, ['', 'y', "y'", 'y2']), pick(random, KNOWN), pick(random, ROTATIONS));
  const algorithm = parts.filter((part) => part !== '').join(' ');
  return respelled(random, algorithm);
}
