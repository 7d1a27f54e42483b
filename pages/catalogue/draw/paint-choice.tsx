import type { Cell } from '#shared/lastlayer/drawing.ts';
import { drawingText } from '#shared/text/drawing.ts';
import { cellName, PAINTS } from './paints.ts';
import { Swatch } from './swatch.tsx';

/** The colour that the next sticker gets. */
export function PaintChoice({ value, onChange }: { value: Cell; onChange: (cell: Cell) => void }) {
  return (
    <fieldset className="min-w-0">
      <legend className="pb-1 text-[0.9375rem] text-ink-2">{drawingText.colour}</legend>
      <div className="grid max-w-[21rem] grid-cols-2 gap-px overflow-hidden border-[1.5px] border-ink bg-ink">
        {PAINTS.map((cell) => (
          <label
            key={cellName(cell)}
            className="relative flex min-h-12 items-center gap-2 bg-sheet px-2 leading-tight has-checked:font-bold has-focus-visible:outline-2 has-focus-visible:-outline-offset-2 has-focus-visible:outline-link"
          >
            <input
              type="radio"
              name="paint"
              value={cell ?? 'unknown'}
              checked={value === cell}
              onChange={() => onChange(cell)}
              className="choice rounded-full"
            />
            <span className="relative size-5 shrink-0 overflow-hidden border-[1.5px] border-ink bg-sheet">
              <Swatch cell={cell} />
            </span>
            {cellName(cell)}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
