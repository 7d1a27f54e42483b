import { COLOUR_NAMES, type Palette } from '#shared/lastlayer/pictures/index.ts';

/** The six shades of a palette in a row. The words beside it say which palette it is. */
export function PaletteSwatch({ palette }: { palette: Palette }) {
  return (
    <svg viewBox="0 0 118 18" aria-hidden="true" focusable="false" className="mt-1 block h-4.5 w-[7.375rem]">
      {COLOUR_NAMES.map((name, k) => (
        <rect
          key={name}
          x={k * 20 + 0.75}
          y="0.75"
          width="16.5"
          height="16.5"
          strokeWidth="1.5"
          fill={palette.colours[name]}
          className="stroke-ink"
        />
      ))}
    </svg>
  );
}
