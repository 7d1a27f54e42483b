/** What stands on each contact sheet: every case in every view, and pictures of the kinds that are rarer. */
import {
  caseSet,
  confusableWith,
  parseAlgorithm,
  playAlgorithm,
  readAlgorithm,
  seenThrough,
} from '#shared/lastlayer/index.ts';
import { cubeSeatViewSvg } from '#shared/lastlayer/pictures/cube-view.ts';
import {
  COLOUR_NAMES,
  colouringWith,
  flatViewSvg,
  type Holding,
  maskStickers,
  oppositeColour,
  PALETTE_KEYS,
  PALETTES,
  type Palette,
  type Stickers,
  seatViewSvg,
  sitesApart,
  stickersOf,
  TABLE_COLOURING,
} from '#shared/lastlayer/pictures/index.ts';
import { seeded } from '#tests/lastlayer/support/random.ts';

export interface Picture {
  readonly svg: string;
  readonly caption: string;
}
export interface Sheet {
  readonly name: string;
  readonly sections: readonly { readonly title: string; readonly pictures: readonly Picture[] }[];
}

/** Colours as they are painted: the palette, and whether letters are laid on it. */
interface Paint {
  readonly palette: Palette;
  readonly letters: boolean;
}
const HOLDINGS: readonly Holding[] = ['right', 'left'];
const TRADE = ['pll', 'oll'].map((key) => caseSet(key));

const seenBy = (set: (typeof TRADE)[number]) => seenThrough(set.definition.entry, set.definition.toldApart);

/** All 21 and 57 cases: from above and from both holdings, as tables have them and as showings draw them. */
function casesSheet(paint: Paint): Sheet {
  const random = seeded(16);
  const colouring = TABLE_COLOURING;
  const sections = TRADE.flatMap((set) => {
    const { name } = set.definition;
    const drawn = (one: (typeof set.cases)[number]) => stickersOf(set.drawState(one, random));
    const all = (picture: (one: (typeof set.cases)[number]) => string) =>
      set.cases.map((one) => ({ svg: picture(one), caption: `${name} ${one.name}` }));
    return [
      {
        title: `${name} from above`,
        pictures: all((one) =>
          flatViewSvg({
            ...paint,
            colouring,
            stickers: maskStickers(stickersOf(one.canonical), seenBy(set)),
          }),
        ),
      },
      ...HOLDINGS.map((holding) => ({
        title: `${name} from the seat, held ${holding}-front`,
        pictures: all((one) => seatViewSvg({ ...paint, colouring, holding, stickers: drawn(one) })),
      })),
    ];
  });
  return { name: `cases ${paint.palette.key}${paint.letters ? ' letters' : ''}`, sections };
}

/** Every colour on top, what is not told apart from the seat, and marks. */
function coloursSheet(paint: Paint): Sheet {
  const pll = caseSet('pll');
  const oll = caseSet('oll');
  const t = stickersOf(pll.byName('T')!.canonical);
  const knight = maskStickers(stickersOf(oll.byName('13')!.canonical), ['co', 'eo']);
  const held = COLOUR_NAMES.flatMap((top) =>
    COLOUR_NAMES.filter((front) => front !== top && front !== oppositeColour(top))
      .slice(0, 2)
      .map((front) => ({ caption: `${top}, ${front}`, colouring: colouringWith(top, front) })),
  );
  const views = (stickers: Stickers) =>
    held.flatMap(({ caption, colouring }, at) => [
      {
        caption,
        svg: seatViewSvg({ ...paint, stickers, colouring, holding: at % 2 === 0 ? 'right' : 'left' }),
      },
      { caption, svg: flatViewSvg({ ...paint, stickers, colouring }) },
    ]);
  const pairs = [pll, oll].flatMap((set) =>
    set.cases.slice(3, 8).flatMap((one) => {
      const [near] = confusableWith(set, one, { count: 1 });
      if (!near) return [];
      const [a, b] = [near.shown, near.other].map((state) => maskStickers(stickersOf(state), seenBy(set)));
      const seat = sitesApart(a!, b!, { kind: 'seat', holding: near.holding });
      const flat = sitesApart(a!, b!, { kind: 'flat' });
      const options = { ...paint, colouring: TABLE_COLOURING, holding: near.holding };
      return [
        { caption: one.name, svg: seatViewSvg({ ...options, stickers: a!, marks: seat }) },
        { caption: near.case.name, svg: seatViewSvg({ ...options, stickers: b!, marks: seat }) },
        { caption: one.name, svg: flatViewSvg({ ...options, stickers: a!, marks: flat }) },
        { caption: near.case.name, svg: flatViewSvg({ ...options, stickers: b!, marks: flat }) },
      ];
    }),
  );
  return {
    name: `colours ${paint.palette.key}${paint.letters ? ' letters' : ''}`,
    sections: [
      { title: 'Every colour on top', pictures: views(t) },
      { title: 'Orientation only', pictures: views(knight) },
      { title: 'Where two differ', pictures: pairs },
    ],
  };
}

/** Algorithms with rotations, slices and wides, step by step on the whole cube. */
function stepsSheet(paint: Paint): Sheet {
  // Common practice: J, an edge cycle by slices, and an OLL with wides.
  const texts = ["x R2 F R F' R U2 r' U r U2 x'", "M2 U M U2 M' U M2", "r U R' U R U2 r'"];
  return {
    name: `steps ${paint.palette.key}${paint.letters ? ' letters' : ''}`,
    sections: texts.flatMap((text, at) => {
      const { moves } = parseAlgorithm(text);
      const holding = HOLDINGS[at % 2]!;
      const reading = readAlgorithm(text);
      if (reading.kind !== 'state') throw new Error(`${text} solves no last layer.`);
      const full = stickersOf(reading.state);
      const frames = playAlgorithm(at === 2 ? maskStickers(full, ['co', 'eo']) : full, moves);
      return [
        {
          title: `${text}, held ${holding}-front`,
          pictures: frames.map(({ move, facelets }) => ({
            svg: cubeSeatViewSvg({ ...paint, facelets, colouring: TABLE_COLOURING, holding }),
            caption: move?.text ?? 'start',
          })),
        },
      ];
    }),
  };
}

/** Every sheet: all cases, colours and steps in each palette, with and without letters. */
export function contactSheets(): readonly Sheet[] {
  const paints = PALETTE_KEYS.flatMap((key) =>
    [false, true].map((letters): Paint => ({ palette: PALETTES[key], letters })),
  );
  return paints
    .filter(({ palette, letters }) => letters || !palette.lettered)
    .flatMap((paint) => [casesSheet(paint), coloursSheet(paint), stepsSheet(paint)]);
}
