import type { Cell } from '#shared/lastlayer/drawing.ts';
import { COLOUR_NAMES } from '#shared/lastlayer/pictures/colours.ts';
import { COLOUR_LETTERS } from '#shared/lastlayer/pictures/palettes.ts';
import { drawingText } from '#shared/text/drawing.ts';
import { pictureText } from '#shared/text/pictures.ts';

/** What can be painted: the six colours, any but the top's, and nothing. */
export const PAINTS: readonly Cell[] = [...COLOUR_NAMES, 'other', null];

export function cellName(cell: Cell): string {
  if (cell === null) return drawingText.paints.unknown;
  return cell === 'other' ? drawingText.paints.other : pictureText.colours[cell];
}

/** The paint of a key on the keyboard; undefined for keys that paint nothing. */
export function paintOfKey(key: string): Cell | undefined {
  if (key === '0' || key === 'Backspace' || key === 'Delete') return null;
  const letter = key.toUpperCase();
  if (letter === 'X') return 'other';
  return COLOUR_NAMES.find((name) => COLOUR_LETTERS[name] === letter);
}
