import { usePictureLook } from '#renderer/ui/index.ts';
import type { Cell } from '#shared/lastlayer/drawing.ts';
import { COLOUR_LETTERS, letterShade } from '#shared/lastlayer/pictures/palettes.ts';

const HATCH = 'M-2 7L7 -2M-2 17L17 -2M-2 27L27 -2M-2 37L37 -2M3 42L42 3M13 42L42 13M23 42L42 23M33 42L42 33';
const CROSS = 'M13 13L27 27M27 13L13 27';

/** A sticker filling its key: a colour, a cross for any but the top colour, hatching for not known. */
export function Swatch({
  cell,
  framed = false,
}: {
  cell: Cell /** A strip of the key is left free round it. */;
  framed?: boolean;
}) {
  const { palette, letters } = usePictureLook();
  const shade = cell === null || cell === 'other' ? null : palette.colours[cell];
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 40 40"
      preserveAspectRatio="xMidYMid slice"
      className={framed ? 'absolute inset-[3px] size-[calc(100%-6px)]' : 'absolute inset-0 size-full'}
    >
      {shade && <rect width="40" height="40" fill={shade} />}
      {cell === null && <path d={HATCH} className="flat-hatch" fill="none" strokeWidth="1.2" />}
      {cell === 'other' && <path d={CROSS} stroke="currentColor" strokeWidth="2.4" fill="none" />}
      {shade && cell && cell !== 'other' && (letters || palette.lettered) && (
        <text
          x="20"
          y="26"
          fontSize="17"
          textAnchor="middle"
          className="picture-letter"
          fill={letterShade(shade)}
        >
          {COLOUR_LETTERS[cell]}
        </text>
      )}
    </svg>
  );
}
