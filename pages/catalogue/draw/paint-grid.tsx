import { type KeyboardEvent, useRef, useState } from 'react';
import { cx } from '#renderer/ui/index.ts';
import { type Cell, type Drawing, topColour } from '#shared/lastlayer/drawing.ts';
import type { Side, Site } from '#shared/lastlayer/pictures/index.ts';
import { drawingText } from '#shared/text/drawing.ts';
import { pictureText } from '#shared/text/pictures.ts';
import { GRID, type GridCell, type Spot, spotAfter } from './cells.ts';
import { cellName, paintOfKey } from './paints.ts';
import { Swatch } from './swatch.tsx';

const text = drawingText;

export interface PaintGridProps {
  readonly drawing: Drawing;
  /** Stickers that are wrong. */
  readonly wrong: readonly Site[];
  /** Paints a sticker: with this, or with the colour that is chosen. */
  readonly onPaint: (site: Site, cell?: Cell) => void;
}

/** The layer from above, a key for every sticker. One tab stop: arrows move, Enter paints, letters paint their colour. */
export function PaintGrid({ drawing, wrong, onPaint }: PaintGridProps) {
  const grid = useRef<HTMLDivElement>(null);
  const [stop, setStop] = useState<Spot>({ row: 3, column: 1 });
  const onKeyDown = (event: KeyboardEvent<HTMLButtonElement>, site: Site, spot: Spot) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const to = spotAfter(event.key, spot);
    const paint = paintOfKey(event.key);
    if (to) {
      setStop(to);
      grid.current?.querySelector<HTMLButtonElement>(`[data-spot="${to.row} ${to.column}"]`)?.focus();
    } else if (paint !== undefined) onPaint(site, paint);
    else return;
    event.preventDefault();
  };
  return (
    <div
      ref={grid}
      role="toolbar"
      aria-label={text.layer}
      className="grid w-max grid-cols-[3rem_repeat(3,3.75rem)_3rem] gap-1"
    >
      {GRID.flatMap((line, row) =>
        line.flatMap((one, column) => {
          if (!one) return [];
          const spot = { row, column };
          const [side, index] = one.site;
          const cell = drawing[side][index] ?? null;
          const shown = one.piece === null ? topColour(drawing) : cell;
          const isWrong = isAt(wrong, side, index);
          return (
            <button
              key={`${side} ${index}`}
              type="button"
              data-spot={`${row} ${column}`}
              tabIndex={stop.row === row && stop.column === column ? 0 : -1}
              aria-label={nameOf(one, shown)}
              onFocus={() => setStop(spot)}
              onClick={() => onPaint(one.site)}
              onKeyDown={(event) => onKeyDown(event, one.site, spot)}
              className={cx(
                'relative overflow-hidden rounded-key bg-sheet focus-visible:z-10',
                side === 'top' ? 'min-h-15' : 'min-h-12',
                // The corners of the square are no stickers, so each row says where it begins.
                side === 'left' && 'col-start-1',
                (side === 'back' || side === 'front') && index === 0 && 'col-start-2',
                isWrong ? 'border-[3px] border-rose' : 'border-[1.5px] border-ink',
              )}
            >
              <Swatch cell={shown} framed={isWrong} />
            </button>
          );
        }),
      )}
    </div>
  );
}

const isAt = (sites: readonly Site[], side: Side, index: number): boolean =>
  sites.some(([onSide, at]) => onSide === side && at === index);

function nameOf({ site: [side], piece }: GridCell, cell: Cell): string {
  if (piece === null) return text.centre(cellName(cell));
  return text.cell(pictureText.places[piece], pictureText.sides[side], cellName(cell));
}
