import { COLOUR_LETTERS } from '../lastlayer/pictures/palettes.ts';

/** Words of the cube pictures' text form and of the palettes. */
export const pictureText = {
  letters: COLOUR_LETTERS,
  hidden: 'not told apart',
  places: {
    UFL: 'Front left corner',
    UF: 'Front edge',
    UFR: 'Front right corner',
    UR: 'Right edge',
    UBR: 'Back right corner',
    UB: 'Back edge',
    UBL: 'Back left corner',
    UL: 'Left edge',
  },
  sides: { top: 'top', front: 'front', right: 'right', back: 'back', left: 'left' },
  sticker: (side: string, letter: string) => `${side} ${letter}`,
  piece: (place: string, stickers: readonly string[]) => `${place}: ${stickers.join(', ')}.`,
  centres: (stickers: readonly string[]) => `Centres: ${stickers.join(', ')}.`,
  cubeFaces: { top: 'Top', front: 'Front', right: 'Right', left: 'Left' },
  cubeFace: (face: string, rows: readonly (readonly string[])[]) =>
    `${face}, row by row: ${rows.map((row) => row.join(' ')).join(', ')}.`,
  palettes: {
    standard: 'Standard',
    safe: 'Safe for colour-vision deficiency',
    stickerless: 'Stickerless',
    greys: 'Greys with letters',
    own: 'Own shades',
  },
  colours: {
    white: 'white',
    yellow: 'yellow',
    green: 'green',
    blue: 'blue',
    orange: 'orange',
    red: 'red',
  },
};
