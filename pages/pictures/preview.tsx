import { FlatView, type PictureLook, SeatView } from '#renderer/ui/index.ts';
import { colouringWith, stickersOf, TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';
import { pictureSettingsText as text } from '#shared/text/picture-settings.ts';

/** A last layer with stickers of every side in sight from the seat; the two tops bring in all six colours. */
const STICKERS = stickersOf(17_360);
const WHITE_ON_TOP = colouringWith('white', 'green');

/** Both views of a cube in a look that need not be saved yet. */
export function Preview({ look: { palette, letters } }: { look: PictureLook }) {
  return (
    <div className="flex flex-wrap items-start gap-x-8 gap-y-4">
      <figure className="w-44">
        <SeatView
          stickers={STICKERS}
          colouring={WHITE_ON_TOP}
          holding="right"
          palette={palette}
          letters={letters}
          alt="hidden"
        />
        <figcaption className="mt-2 text-sm text-ink-2">{text.seat}</figcaption>
      </figure>
      <figure className="w-32">
        <FlatView
          stickers={STICKERS}
          colouring={TABLE_COLOURING}
          palette={palette}
          letters={letters}
          className="w-full"
        />
        <figcaption className="mt-2 text-sm text-ink-2">{text.flat}</figcaption>
      </figure>
    </div>
  );
}
