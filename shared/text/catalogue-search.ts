import { aufText } from './auf.ts';
import { numberText } from './numbers.ts';

const listed = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;

/** Words of the Catalogue's search, and of what cases are mistaken for. */
export const catalogueSearchText = {
  label: 'Find a case',
  hint: 'name, number, alias, algorithm or scramble',
  find: 'Find',
  title: (q: string) => `Found for “${q}”`,
  back: 'All sets',
  nothing: 'Nothing is called so, and it is no algorithm.',
  names: 'By name or algorithm',
  more: (n: number) => `and ${numberText.whole(n)} more; write more to tell them apart`,
  moves: 'As moves',
  /** `8 moves STM, 9 ETM` */
  counts: ({ htm, qtm, stm, etm }: { htm: number; qtm: number; stm: number; etm: number }) =>
    `${htm} HTM, ${qtm} QTM, ${stm} STM, ${etm} ETM`,
  nothingDone: 'It leaves the last layer as it is, but for an AUF.',
  columns: { set: 'set', solves: 'solves', leadsTo: 'as a scramble, leads to' },
  caption: 'What the moves solve and lead to, by set',
  skip: 'the skip',
  none: '–',
  auf: (aufs: readonly number[], algorithm: string) =>
    aufs.length === 1 && aufs[0] === 0
      ? `no AUF, then ${algorithm}`
      : `AUF ${aufText.anyOf(aufs)}, then ${algorithm}`,
  noAlgorithm: 'the catalogue has no algorithm for it',
  known: 'in the catalogue already',
  broken: (pieces: readonly string[]) =>
    pieces.length > 5
      ? `It breaks the first two layers: ${pieces.slice(0, 4).join(', ')} and ${pieces.length - 4} more are out of place.`
      : `It breaks the first two layers: ${listed(pieces)} ${pieces.length === 1 ? 'is' : 'are'} out of place.`,
  notAMove: (token: string, column: number) =>
    token === ''
      ? `It cannot be read as moves from character ${column} on.`
      : `It cannot be read as moves: “${token}” at character ${column} is not a move.`,

  confusable: {
    title: 'Mistaken for',
    note: 'Held so that they look most alike. Rings mark where they differ.',
    apart: (n: number) =>
      n === 0 ? 'no visible sticker apart' : `${n} ${n === 1 ? 'sticker' : 'stickers'} apart`,
    mirror: 'its mirror',
    held: { right: 'right side in view', left: 'left side in view' },
    missing: 'What it is mistaken for could not be worked out.',
    loading: 'Comparing cases',
  },

  steps: {
    title: 'Step by step',
    algorithm: 'Algorithm',
    moves: 'Moves',
    start: 'Start',
    back: 'Back',
    next: 'Next',
    end: 'End',
    atStart: (of: number) => `Before the first of ${of} moves.`,
    at: (n: number, of: number, move: string) => `After move ${n} of ${of}: ${move}.`,
    keys: 'Left and right arrow keys step. From one of these keys, Home and End go to the ends.',
    /** The moves button at the beginning. */
    before: 'start',
    holding: 'Side in view',
    sides: { right: 'right', left: 'left' },
  },
} as const;
