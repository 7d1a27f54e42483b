import { FlatView, type PictureLook, SeatView } from '#renderer/ui/index.ts';
import { type CrossColours, stickersOf, TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';
import { pictureSettingsText as text } from '#shared/text/picture-settings.ts';
import { trainingTop } from './training-top.ts';

/** A last layer with stickers of every side in sight from the seat. */
const STICKERS = stickersOf(17_360);

/** Both views of a cube in a look that need not be saved yet. */
export function Preview({ look: { palette, letters }, cross }: { look: PictureLook; cross: CrossColours }) {
  const { tops, colouring } = trainingTop(cross);
  return (
    <div className="flex flex-wrap items-start gap-x-8 gap-y-4">
      <figure className="w-44">
        <SeatView
          stickers={STICKERS}
          colouring={colouring}
          holding="right"
          palette={palette}
          letters={letters}
          alt="hidden"
        />
        <figcaption className="mt-2 text-sm text-ink-2">{text.seat(tops)}</figcaption>
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
