/** When two written algorithms are the same entry: equal after cancelling and normalising notation. */
import { type Axis, type Face, type Family, type Move, PARTS } from './moves.ts';
import { type Expander, parseMoves } from './notation.ts';

const AXES: readonly Axis[] = ['x', 'y', 'z'];
/** The face each rotation follows and the one opposite it: the outer layers of its axis. */
const OUTER: Readonly<Record<Axis, readonly [Face, Face]>> = { x: ['R', 'L'], y: ['U', 'D'], z: ['F', 'B'] };

/** Quarter turns of the three layers of one axis, each along the rotation's sense, mod 4. */
type Layers = readonly [near: number, middle: number, far: number];

function axisOf(family: Family): Axis {
  const { turns, rotation } = PARTS[family];
  if (rotation) return rotation[0];
  return AXES.find((axis) => OUTER[axis].includes(turns[0]![0]))!;
}

function layersOf({ family, amount }: Move): Layers {
  const { turns, rotation } = PARTS[family];
  const [near] = OUTER[axisOf(family)];
  // A turn of the whole cube moves every layer; the face turns beside it undo it for their own layer.
  const layers: [number, number, number] = rotation ? [rotation[1], rotation[1], rotation[1]] : [0, 0, 0];
  for (const [face, quarters] of turns) layers[face === near ? 0 : 2] += face === near ? quarters : -quarters;
  return layers.map((quarters) => (quarters * amount) & 3) as unknown as Layers;
}

/**
 * A text that is equal for two move sequences exactly if they turn the same layers in the same order after
 * cancelling: `R L` and `L R`, `r` and `Rw`, `M'` and `r R'`, `R U U' R` and `R2` agree. A rotation in front or behind,
 * or another angle, makes another algorithm: the hands do something else.
 */
export function cancelledKey(moves: readonly Move[]): string {
  const runs: { axis: Axis; layers: [number, number, number] }[] = [];
  for (const move of moves) {
    const axis = axisOf(move.family);
    const layers = layersOf(move);
    const last = runs.at(-1);
    if (last?.axis === axis) {
      for (let layer = 0; layer < 3; layer++) last.layers[layer] = (last.layers[layer]! + layers[layer]!) & 3;
      if (last.layers.every((quarters) => quarters === 0)) runs.pop();
    } else {
      runs.push({ axis, layers: [...layers] });
    }
  }
  return runs.map(({ axis, layers }) => axis + layers.join('')).join('');
}

/**
 * Whether two texts are the same algorithm.
 * @throws AlgorithmSyntaxError if either cannot be read.
 */
export function sameAlgorithm(one: string, other: string, expand?: Expander): boolean {
  return cancelledKey(parseMoves(one, expand)) === cancelledKey(parseMoves(other, expand));
}
