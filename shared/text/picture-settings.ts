import { COLOUR_NAMES, type ColourName } from '../lastlayer/pictures/index.ts';
import type { ShadePair } from '../lastlayer/pictures/shade-warnings.ts';
import { pictureText } from './pictures.ts';

const { colours, palettes } = pictureText;

const VISIONS: Readonly<Record<ShadePair['vision'], string>> = {
  normal: '',
  protan: ', for eyes without red cones',
  deutan: ', for eyes without green cones',
  tritan: ', for eyes without blue cones',
};

/** How somebody wants cube pictures drawn. */
export const pictureSettingsText = {
  title: 'Pictures',
  lead: 'How cubes are drawn for you, on every page and every device you sign in on.',
  palette: 'Colours',
  palettes,
  hints: {
    standard: 'As on a stickered cube.',
    safe: 'Every two colours differ clearly, whichever cones are missing.',
    stickerless: 'Brighter plastic with hardly a gap.',
    greys: 'For print, and for eyes that see no colour.',
    own: 'The shades of your own cube.',
  },
  letters: 'Letters',
  lettersLabel: 'Lay each colour’s letter on its stickers',
  lettersHint: 'Greys always have them.',
  shades: 'Own shades',
  shadesHint: 'Choose each as it looks on your cube.',
  shadeOf: (colour: ColourName) => colours[colour],
  tooNear: 'Hard to tell apart',
  tooNearLead: (least: number) =>
    `You can save them all the same. Shades are told apart at a glance when they are ${least} apart (CIEDE2000).`,
  pair: ({ one, other, vision, difference }: ShadePair) =>
    `${colours[one]} and ${colours[other]}: ${Math.floor(difference)} apart${VISIONS[vision]}`,
  preview: 'Preview',
  /** The colours that training puts on top for one's cross colours. */
  seat: (tops: readonly ColourName[]) =>
    tops.length === COLOUR_NAMES.length
      ? 'As in training, any colour on top'
      : `As in training, ${tops.map((top) => colours[top]).join(' or ')} on top`,
  flat: 'As in tables, yellow on top',
  save: 'Save pictures',
  saving: 'Saving',
  saved: 'Saved. All pictures look so from now on.',
  notSaved: 'Not saved',
} as const;
