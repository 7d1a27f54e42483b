import { Alg } from 'cubing/alg';
import { describe, expect, it } from 'vitest';
import { FACELET_FACES, faceletsOf, SOLVED_FACELETS } from '#shared/lastlayer/facelets.ts';
import {
  faceletsAfter,
  parseAlgorithm,
  playAlgorithm,
  readAlgorithm,
  STATES,
  stateAt,
} from '#shared/lastlayer/index.ts';
import { OLL_NAMES } from '#shared/lastlayer/names-oll.ts';
import { PLL_NAMES } from '#shared/lastlayer/names-pll.ts';
import { maskStickers, stickersOf } from '#shared/lastlayer/pictures/index.ts';
import { anyTurns } from './support/algorithms.ts';
import { puzzleIn } from './support/puzzle.ts';
import { puzzleAfter, puzzleFacelets } from './support/puzzle-facelets.ts';
import { seeded } from './support/random.ts';

const KNOWN = [...OLL_NAMES.map(([, , text]) => text), ...PLL_NAMES.map(([, text]) => text)];
const oneColourFaces = (facelets: string) =>
  FACELET_FACES.every((_, face) => new Set(facelets.slice(face * 9, face * 9 + 9)).size === 1);

describe('the stickers of a whole cube', () => {
  it('begin solved', () => {
    expect(faceletsAfter([])).toBe(SOLVED_FACELETS);
    expect(puzzleFacelets(puzzleAfter(''))).toBe(SOLVED_FACELETS);
  });

  it.each(['R', 'l', 'Fw', 'M', 'E', 'S', 'x', 'y', 'z', 'D', 'u', 'Bw', "M'", 'z2'])(
    'after %s are those of the cubing puzzle model',
    (move) => {
      expect(faceletsAfter(parseAlgorithm(move).moves)).toBe(puzzleFacelets(puzzleAfter(move)));
    },
  );

  it('after any turns are those of the cubing puzzle model, with the cube held as the hands hold it', () => {
    const random = seeded(41);
    for (let run = 0; run < 300; run++) {
      const text = anyTurns(random, 1 + Math.floor(random() * 40));
      expect(faceletsAfter(parseAlgorithm(text).moves), text).toBe(puzzleFacelets(puzzleAfter(text)));
    }
  });

  it('of a last-layer state are those of the model put into it', () => {
    for (let state = 0; state < STATES; state += 487)
      expect(faceletsOf(stickersOf(state))).toBe(puzzleFacelets(puzzleIn(stateAt(state))));
  });
});

describe('playing an algorithm', () => {
  it.each(KNOWN)('%s ends in a solved cube from the state it solves', (text) => {
    const { moves } = parseAlgorithm(text);
    const reading = readAlgorithm(text);
    if (reading.kind !== 'state') throw new Error(text);
    const frames = playAlgorithm(reading.state, moves);
    expect(frames).toHaveLength(moves.length + 1);
    expect(frames[0]).toEqual({ step: 0, move: null, facelets: faceletsOf(stickersOf(reading.state)) });
    expect(frames.slice(1).map(({ move }) => move!.text)).toEqual(moves.map((move) => move.text));
    expect(oneColourFaces(frames.at(-1)!.facelets)).toBe(true);
  });

  it('shows every step as the cubing puzzle model has it', () => {
    const random = seeded(42);
    for (let run = 0; run < 40; run++) {
      const state = Math.floor(random() * STATES);
      const { moves } = parseAlgorithm(anyTurns(random, 12));
      let pattern = puzzleIn(stateAt(state));
      for (const { move, facelets } of playAlgorithm(state, moves)) {
        if (move) pattern = pattern.applyAlg(new Alg(move.text));
        expect(facelets).toBe(puzzleFacelets(pattern));
      }
    }
  });

  it('carries what is not told apart along', () => {
    const reading = readAlgorithm("F R U R' U' F'");
    if (reading.kind !== 'state') throw new Error('cannot be read');
    const masked = maskStickers(stickersOf(reading.state), ['co', 'eo']);
    const last = playAlgorithm(masked, parseAlgorithm("F R U R' U' F'").moves).at(-1)!.facelets;
    // Derived: an OLL leaves the top whole and says nothing of the twelve stickers round it.
    expect(last.slice(0, 9)).toBe('UUUUUUUUU');
    expect(last.match(/\?/g)).toHaveLength(12);
  });
});
