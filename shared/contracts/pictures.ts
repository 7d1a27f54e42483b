import { z } from 'zod';

const shade = z.string().regex(/^#[0-9a-f]{6}$/iu, 'A shade looks like #3066B2.');
/** A shade for each of the six colours. */
export const ownShades = z.strictObject({
  white: shade,
  yellow: shade,
  green: shade,
  blue: shade,
  orange: shade,
  red: shade,
});
export type OwnShades = z.infer<typeof ownShades>;

/** How pictures are drawn for a person, in whichever club they are. */
export const pictureSettings = z.strictObject({
  palette: z.enum(['standard', 'safe', 'stickerless', 'greys', 'own']),
  /** Each colour's letter is laid on its stickers. */
  letters: z.boolean(),
  /** Used with the palette `own`, kept with the others; null: none chosen yet. */
  ownShades: ownShades.nullable(),
});
export type PictureSettings = z.infer<typeof pictureSettings>;

/** With `ownShades` null the shades chosen before stay. */
export const changePicturesInput = pictureSettings.refine(
  ({ palette, ownShades: shades }) => palette !== 'own' || shades !== null,
  { path: ['ownShades'], message: 'Choose a shade for each colour.' },
);
