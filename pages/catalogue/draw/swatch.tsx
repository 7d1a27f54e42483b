import { usePictureLook } from '#renderer/ui/index.ts';
import type { Cell } from '#shared/lastlayer/drawing.ts';
import { COLOUR_LETTERS, letterShade } from '#shared/lastlayer/pictures/palettes.ts';

const HATCH = 'M-4 12L12 -4M-4 28L28 -4M-4 44L44 -4M12 44L44 12M28 44L44 28';
const CROSS = 'M13 13L27 27M27 13L13 27';

/** A sticker filling its key: a colour, a cross for any but the top colour, hatching for not known. */
export function Swatch({ cell }: { cell: Cell }) {
  const { palette, letters } = usePictureLook();
  const shade = cell === null || cell === 'other' ? null : palette.colours[cell];
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 40 40"
      preserveAspectRatio="xMidYMid slice"
      className="absolute inset-0 size-full"
    >
      {shade && <rect width="40" height="40" fill={shade} />}
      {cell === null && <path d={HATCH} className="flat-hatch" fill="none" strokeWidth="1.6" />}
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
