/**
 * A cube as 54 coloured stickers in space (x right, y up, z towards the holder), turned by rotating the
 * stickers of a layer. It knows nothing of pieces or orientations, so it checks code that does.
 */
type Vector = readonly [number, number, number];

interface Facelet {
  at: Vector;
  normal: Vector;
  readonly home: string;
}

const NORMALS: Readonly<Record<string, Vector>> = {
  R: [1, 0, 0],
  L: [-1, 0, 0],
  U: [0, 1, 0],
  D: [0, -1, 0],
  F: [0, 0, 1],
  B: [0, 0, -1],
};

function dot(a: Vector, b: Vector): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

/** A quarter turn clockwise as seen from the tip of the axis. */
function turn(v: Vector, axis: Vector): Vector {
  const along = dot(v, axis);
  return [
    v[1] * axis[2] - v[2] * axis[1] + axis[0] * along,
    v[2] * axis[0] - v[0] * axis[2] + axis[1] * along,
    v[0] * axis[1] - v[1] * axis[0] + axis[2] * along,
  ];
}

export class FaceletCube {
  private readonly facelets: Facelet[] = [];

  constructor() {
    const range = [-1, 0, 1];
    for (const [home, normal] of Object.entries(NORMALS))
      for (const x of range)
        for (const y of range)
          for (const z of range)
            if (dot([x, y, z], normal) === 1) this.facelets.push({ at: [x, y, z], normal, home });
  }

  /** Applies face turns such as `R U2 F'`. */
  apply(algorithm: string): this {
    for (const move of algorithm.split(' ').filter(Boolean)) {
      const axis = NORMALS[move[0] ?? ''];
      if (!axis) throw new Error(`not a face turn: ${move}`);
      const times = move.endsWith('2') ? 2 : move.endsWith("'") ? 3 : 1;
      for (let k = 0; k < times; k++) {
        for (const facelet of this.facelets) {
          if (dot(facelet.at, axis) !== 1) continue;
          facelet.at = turn(facelet.at, axis);
          facelet.normal = turn(facelet.normal, axis);
        }
      }
    }
    return this;
  }

  /** The home face of the sticker that lies on a face at a place. */
  at(face: string, place: Vector): string {
    const normal = NORMALS[face];
    const found = this.facelets.find(
      (facelet) =>
        normal && dot(facelet.normal, normal) === 1 && facelet.at.every((value, k) => value === place[k]),
    );
    if (!found) throw new Error(`no sticker on ${face} at ${place.join(' ')}`);
    return found.home;
  }

  /** The last layer's stickers in the order of the pictures. */
  lastLayer() {
    const row = [-1, 0, 1];
    const back = [1, 0, -1];
    return {
      top: row.flatMap((z) => row.map((x) => this.at('U', [x, 1, z]))).join(''),
      front: row.map((x) => this.at('F', [x, 1, 1])).join(''),
      right: back.map((z) => this.at('R', [1, 1, z])).join(''),
      back: row.map((x) => this.at('B', [x, 1, -1])).join(''),
      left: row.map((z) => this.at('L', [-1, 1, z])).join(''),
    };
  }
}
