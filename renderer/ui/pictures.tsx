import { useMemo } from 'react';
import {
  type Colouring,
  describeStickers,
  FLAT_VIEW_BOX,
  flatViewInner,
  type Holding,
  type Palette,
  type PictureWords,
  SEAT_VIEW_BOX,
  type Site,
  type Stickers,
  seatViewInner,
  TABLE_COLOURING,
} from '#shared/lastlayer/pictures/index.ts';
import { pictureText } from '#shared/text/pictures.ts';
import { usePictureLook } from './picture-look.tsx';

interface PictureProps {
  readonly stickers: Stickers;
  /** As the person wants it unless given. */
  readonly palette?: Palette;
  readonly letters?: boolean;
  /** Stickers to be ringed. */
  readonly marks?: readonly Site[];
  /**
   * `describe`: a text form of the stickers, naming pieces and letters and never the case.
   * `hidden`: the words beside the picture say it already. Otherwise the text itself.
   */
  readonly alt?: 'describe' | 'hidden' | { readonly text: string };
  readonly className?: string;
}

const WORDS: PictureWords = pictureText;

function named(alt: PictureProps['alt'], describe: () => string) {
  if (alt === 'hidden') return { 'aria-hidden': true } as const;
  const text = typeof alt === 'object' ? alt.text : describe();
  return { role: 'img', 'aria-label': text } as const;
}

export interface SeatViewProps extends PictureProps {
  readonly colouring: Colouring;
  readonly holding: Holding;
}

/** The picture of a showing. Described by its stickers unless told otherwise. */
export function SeatView(props: SeatViewProps) {
  const look = usePictureLook();
  const { palette = look.palette, letters = look.letters } = props;
  const { stickers, colouring, holding, marks, alt = 'describe', className } = props;
  // Our own markup, made of face letters and checked shades only.
  const html = useMemo(
    () => ({ __html: seatViewInner({ stickers, colouring, holding, palette, letters, marks }) }),
    [stickers, colouring, holding, palette, letters, marks],
  );
  const describe = () =>
    describeStickers({ stickers, colouring, view: { kind: 'seat', holding }, words: WORDS });
  return (
    <svg
      {...named(alt, describe)}
      viewBox={SEAT_VIEW_BOX}
      focusable="false"
      className={`seat-view ${className ?? 'w-full'}`}
      dangerouslySetInnerHTML={html}
    />
  );
}

export interface FlatViewProps extends PictureProps {
  /** Yellow on top and green in front unless given. */
  readonly colouring?: Colouring;
}

/** The picture of a case in tables and on sheets. Hidden from assistive technology unless told otherwise. */
export function FlatView(props: FlatViewProps) {
  const look = usePictureLook();
  const { palette = look.palette, letters = look.letters } = props;
  const { stickers, colouring = TABLE_COLOURING, marks, alt = 'hidden', className } = props;
  const html = useMemo(
    () => ({ __html: flatViewInner({ stickers, colouring, palette, letters, marks }) }),
    [stickers, colouring, palette, letters, marks],
  );
  const describe = () => describeStickers({ stickers, colouring, view: { kind: 'flat' }, words: WORDS });
  return (
    <svg
      {...named(alt, describe)}
      viewBox={FLAT_VIEW_BOX}
      focusable="false"
      className={`flat-view ${className ?? 'w-14'}`}
      dangerouslySetInnerHTML={html}
    />
  );
}
