import type { DrawingProblem } from '../lastlayer/index.ts';
import { pictureText } from './pictures.ts';

type PieceProblem = Extract<DrawingProblem, { piece: unknown }>['kind'];

const PIECES: Readonly<Record<PieceProblem, string>> = {
  'bottom-colour': 'the colour opposite the top is on no piece of the last layer',
  'same-twice': 'no piece has one colour twice',
  opposite: 'opposite colours are on no piece together',
  'no-top-colour': 'each piece has the top colour on one side',
  'wrong-way-round': 'no corner has these colours in this order',
};

/** What is wrong with a drawing, in one sentence. */
function says(problem: DrawingProblem): string {
  const { places, colours } = pictureText;
  switch (problem.kind) {
    case 'too-many':
      return `There are ${problem.count} ${colours[problem.colour]} stickers; the last layer has ${problem.most}.`;
    case 'piece-twice': {
      const [one, other] = problem.pieces.map((piece) => places[piece]);
      return `${one} and ${other?.toLowerCase()} are the same piece.`;
    }
    case 'do-not-go-together':
      return `These ${problem.of} are never together on one cube.`;
    case 'corner-twisted':
      return 'One corner is twisted: no turns lead there.';
    case 'edge-flipped':
      return 'One edge is flipped: no turns lead there.';
    case 'two-swapped':
      return 'Two pieces are swapped: no turns lead there.';
    default:
      return `${places[problem.piece]}: ${PIECES[problem.kind]}.`;
  }
}

/** Words of the page where a case is drawn. */
export const drawingText = {
  title: 'Find by drawing',
  lead: 'Paint as much as you know. Cases that look like it are found as you paint.',
  toDrawing: 'Find by drawing',
  says,
  colour: 'Colour',
  paints: {
    other: 'any but the top colour',
    unknown: 'not known',
  },
  paintHint: 'Letters W Y G B O R paint too, X any but the top colour, 0 takes the colour off.',
  layer: 'The last layer from above, front below',
  cell: (piece: string, side: string, colour: string) => `${piece}, ${side}: ${colour}`,
  centre: (colour: string) => `Top centre: ${colour}`,
  keys: 'Arrow keys move, Enter paints.',
  clear: 'Start again',
  sets: 'Look in',
  wrong: 'There is no such cube',
  found: (found: number, of: number) => (found === 1 ? `1 case of ${of}` : `${found} of ${of} cases`),
  foundIn: (set: string, found: number, of: number) => `${set}: ${found} of ${of}`,
  none: 'No case of this set looks like it.',
  more: (n: number) => `and ${n} more; paint more to tell them apart`,
  share: (states: number, of: number) => (states === of ? 'all of its states' : `${states} of ${of} states`),
  noSet: 'Choose a set to look in.',
} as const;
