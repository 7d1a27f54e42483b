import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expandAlgorithm } from '#server/services/intake/expand-algorithm.ts';
import {
  AlgorithmSyntaxError,
  parseAlgorithm,
  readAlgorithm,
  sameAlgorithm,
} from '#shared/lastlayer/index.ts';

function errorOf(text: string, expand = false): AlgorithmSyntaxError {
  try {
    parseAlgorithm(text, expand ? expandAlgorithm : undefined);
  } catch (error) {
    if (error instanceof AlgorithmSyntaxError) return error;
    throw error;
  }
  throw new Error(`${text} was read`);
}

describe('reading notation', () => {
  it.each([
    ["R U R' U'", "R U R' U'"],
    ["RUR'U'", "R U R' U'"],
    ['  R\tU2\u00a0F ', 'R U2 F'],
    ["Rw Uw' Fw2 Lw Dw Bw", "r u' f2 l d b"],
    ['R’ U′ F` D´ M‘', "R' U' F' D' M'"],
    ["R2' U2’", 'R2 U2'],
    ["(R U R') (U')", "R U R' U'"],
    ['((R))', 'R'],
    ["x y' z2 M E' S2", "x y' z2 M E' S2"],
    ['', ''],
  ])('%j is %j', (text, normalised) => {
    expect(parseAlgorithm(text).text).toBe(normalised);
  });

  it.each([
    ["R U R' Q U'", 8, 'Q'],
    ["R U R'' U'", 7, "R''"],
    ["R U R'2", 7, "R'2"],
    ['R U3', 4, 'U3'],
    ['R4', 2, 'R4'],
    ['R22', 3, 'R22'],
    ['R 2', 3, '2'],
    ['rw', 2, 'rw'],
    ['Mw2', 2, 'Mw2'],
    ['xw', 2, 'xw'],
    ['X', 1, 'X'],
    ['m', 1, 'm'],
    ['R U"', 4, '"'],
    ['R, U', 2, ','],
    ['R💥 U', 2, '💥'],
    ['(R U', 1, '('],
    ['R U)', 4, ')'],
    ['(R [U)', 6, ')'],
    ['R\u200bU', 2, '\u200bU'],
    ["RUR'Q", 5, 'Q'],
    ['[R U]', 5, ']'],
    ['[R, U, F]', 6, ','],
    ['(R)0', 4, ')0'],
  ])('%j is wrong at character %i: %s', (text, column, token) => {
    expect(errorOf(text, true)).toMatchObject({ column, token });
  });

  it.each([
    ["(R U R' U')3", "R U R' U' R U R' U' R U R' U'"],
    ["(R U)'", "U' R'"],
    ["(R U)2'", "U' R' U' R'"],
    ['[R, U]', "R U R' U'"],
    ['[F: [R, U]]', "F R U R' U' F'"],
    ["[r U R' : U2]2", "r U R' U2 R U' r' r U R' U2 R U' r'"],
  ])('%j is written out as %j where there is an expander, and refused where not', (text, normalised) => {
    expect(parseAlgorithm(text, expandAlgorithm).text).toBe(normalised);
    expect(errorOf(text).reason).toBe('needs-expanding');
  });

  it('does not let repetitions grow without bound', () => {
    expect(errorOf('(R)999', true).reason).toBe('too-long');
    expect(errorOf('((((R U)99)99)99)99', true).reason).toBe('too-long');
    expect(errorOf('[[[[[[[[[R,U],F],R],U],F],R],U],F],R]', true).reason).toBe('too-long');
    expect(errorOf('R '.repeat(501)).reason).toBe('too-long');
    expect(parseAlgorithm('R '.repeat(500)).moves).toHaveLength(500);
  });

  it('reads any text in time and either gives moves or a column inside it', () => {
    const unit = fc.constantFrom(..."RUrMxw2'()[],: 39", '💥', '\0', '\u200b', '\u00a0', '\ud800', '’', 'é');
    const text = fc.string({ unit, maxLength: 40 });
    fc.assert(
      fc.property(text, (hostile) => {
        const read = readAlgorithm(hostile, expandAlgorithm);
        if (read.kind !== 'not-a-move') return;
        expect(read.column).toBeGreaterThanOrEqual(1);
        expect(read.column).toBeLessThanOrEqual(Math.max(1, hostile.length));
      }),
      { seed: 16, numRuns: 200 },
    );
  });

  it('reads its own writing back', () => {
    const word = fc
      .tuple(fc.constantFrom(...'ULFRBDulfrbdMESxyz'), fc.constantFrom('', '2', "'"))
      .map((pair) => pair.join(''));
    fc.assert(
      fc.property(fc.array(word, { maxLength: 30 }), (words) => {
        expect(parseAlgorithm(words.join('')).text).toBe(words.join(' '));
        expect(parseAlgorithm(parseAlgorithm(words.join(' ')).text).text).toBe(words.join(' '));
      }),
      { seed: 16 },
    );
  });
});

describe('the same algorithm', () => {
  it.each([
    ['R U', '(R) U'],
    ['Rw U', 'r U'],
    ['R L', 'L R'],
    ['R U U R', 'R U2 R'],
    ["R U U' R", 'R2'],
    ["M'", "R' r"],
    ['r', 'L x'],
    ['x', "R M' L'"],
    ['S', "f F'"],
    ['E', "U y' D'"],
    ["R2'", 'R2'],
  ])('%j and %j', (one, other) => {
    expect(sameAlgorithm(one, other)).toBe(true);
  });

  it.each([
    ['R U', 'U R'],
    ['R', "R'"],
    ['R', 'R x'],
    ['y R', 'R y'],
    ['R U R', 'R U2 R'],
  ])('is not %j and %j', (one, other) => {
    expect(sameAlgorithm(one, other)).toBe(false);
  });

  it('never calls two that end differently the same', () => {
    const word = fc.constantFrom('R', "R'", 'L', 'r', 'M', 'x', 'U', 'u', 'E', 'y', 'F', 'S');
    const list = fc.array(word, { maxLength: 6 });
    fc.assert(
      fc.property(list, list, (one, other) => {
        if (!sameAlgorithm(one.join(' '), other.join(' '))) return;
        expect(readAlgorithm(one.join(' '))).toMatchObject(
          ((read) => (read.kind === 'state' ? { kind: 'state', state: read.state } : { kind: read.kind }))(
            readAlgorithm(other.join(' ')),
          ),
        );
      }),
      { seed: 16, numRuns: 1000 },
    );
  });
});
