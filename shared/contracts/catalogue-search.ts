/** Finding cases: by words or moves, by a drawing, and by what they are mistaken for. */
import { z } from 'zod';
import { caseReference } from './catalogue-case.ts';
import { holding, picture } from './common.ts';

const auf = z.int().min(0).max(3);
const setName = z.strictObject({ setKey: z.string(), name: z.string() });

export const confusableView = z.strictObject({
  /** The name of the case asked about, as the reader's club has it. */
  name: z.string(),
  rows: z.array(
    z.strictObject({
      case: caseReference,
      /** Fewest visible stickers the two differ in, over angles, colours and holdings. */
      apart: z.int(),
      /** The other is this one's mirror. */
      mirror: z.boolean(),
      /** How the cube is held in the two views that come nearest. */
      holding,
      shown: picture,
      other: picture,
      /** Where the two differ, in words. */
      differs: z.string(),
    }),
  ),
});
export type ConfusableView = z.infer<typeof confusableView>;

export const searchInput = z.strictObject({
  /** A name, an alias, a number, or moves. */
  q: z.string().trim().min(1, 'Write what to look for.').max(300, 'That is too long to look for.'),
});
export type SearchInput = z.infer<typeof searchInput>;

/** A case found by moves. */
const hit = z.strictObject({
  case: caseReference,
  /** The catalogue's first algorithm for it; null where there is none. */
  algorithm: z.string().nullable(),
  /** AUFs before with which that algorithm solves it as it lies here; empty where there is none. */
  aufs: z.array(auf),
  /** The moves are an algorithm that the catalogue already has for it. */
  known: z.boolean(),
});
export type MovesHit = z.infer<typeof hit>;

const movesFound = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('read'),
    /** As the catalogue would write them. */
    moves: z.string(),
    counts: z.strictObject({ htm: z.int(), qtm: z.int(), stm: z.int(), etm: z.int() }),
    /** Sets of which the moves solve a case, or lead to one from a solved cube; the trade's order. */
    sets: z.array(z.strictObject({ set: setName, solves: hit.nullable(), leadsTo: hit.nullable() })),
  }),
  z.strictObject({
    kind: z.literal('first-two-layers-broken'),
    moves: z.string(),
    pieces: z.array(z.string()),
  }),
  z.strictObject({ kind: z.literal('not-a-move'), column: z.int(), token: z.string() }),
]);
export type MovesFound = z.infer<typeof movesFound>;

export const searchView = z.strictObject({
  q: z.string(),
  /** null where the words are no moves and nobody would take them for some. */
  moves: movesFound.nullable(),
  names: z.array(
    z.strictObject({
      set: setName,
      case: caseReference,
      /** The algorithm that has the words in it; null where the name has. */
      algorithm: z.string().nullable(),
    }),
  ),
  /** Cases found beyond those told. */
  more: z.int(),
});
export type SearchView = z.infer<typeof searchView>;

export const drawnInput = z.strictObject({
  /** 21 letters: see writeDrawing. */
  drawing: z.string().regex(/^[wygborx-]{21}$/, 'A drawing is written in 21 letters: w y g b o r x and -.'),
  /** Keys of the sets looked through, with commas between them. */
  sets: z.string().max(400).optional(),
});
export type DrawnInput = z.infer<typeof drawnInput>;

export const drawnView = z.strictObject({
  drawing: z.string(),
  /** Why the drawing is of no cube, and the stickers it is about. */
  problems: z.array(
    z.strictObject({
      says: z.string(),
      sites: z.array(z.strictObject({ side: z.string(), index: z.int() })),
    }),
  ),
  sets: z.array(
    z.strictObject({
      set: setName,
      /** Cases of the set beside the skip. */
      cases: z.int(),
      found: z.int(),
      /** The first of them, those of the most states first. */
      rows: z.array(
        z.strictObject({
          case: caseReference,
          /** How it lies to look like the drawing. */
          picture,
          /** The share of the case's states that look like the drawing, of the whole. */
          states: z.int(),
          of: z.int(),
        }),
      ),
    }),
  ),
});
export type DrawnView = z.infer<typeof drawnView>;
