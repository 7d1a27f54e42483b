import { type KeyboardEvent, type ReactNode, useId, useRef, useState } from 'react';
import { cx } from './cx.ts';

export interface GridKey {
  readonly value: string;
  readonly label: ReactNode;
  /** How many columns the key takes. */
  readonly span?: 1 | 2;
  /** Plain keys are not names: "solved", "lost it". */
  readonly plain?: boolean;
  /** Text for typing ahead and for assistive technology, when the label is not a string. */
  readonly text?: string;
}

export interface KeyGridProps {
  readonly legend: string;
  /** On the right of the legend. */
  readonly hint?: ReactNode;
  readonly keys: readonly GridKey[];
  readonly columns: 2 | 3 | 4;
  /** The value of the chosen key; null before one is chosen. */
  readonly value: string | null;
  readonly onPick: (value: string) => void;
  readonly blocked?: boolean;
  /** Keys as tall as the thumb likes, or lower ones for long grids. */
  readonly height?: 'tall' | 'low';
}

const COLUMNS = { 2: 'grid-cols-2', 3: 'grid-cols-3', 4: 'grid-cols-4' } as const;

/**
 * Keys in fixed places, divided by ink rules. One tab stop: arrows move between keys, Home and End go to
 * the ends, letters jump to the next key that begins with them; Enter or space picks.
 */
export function KeyGrid(props: KeyGridProps) {
  const { legend, hint, keys, columns, value, onPick, blocked = false, height = 'tall' } = props;
  const id = useId();
  const buttons = useRef<(HTMLButtonElement | null)[]>([]);
  const [stop, setStop] = useState(0);

  const go = (index: number) => {
    const target = Math.max(0, Math.min(keys.length - 1, index));
    setStop(target);
    buttons.current[target]?.focus();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const step = { ArrowLeft: -1, ArrowRight: 1, ArrowUp: -columns, ArrowDown: columns }[event.key];
    if (step !== undefined) go(stop + step);
    else if (event.key === 'Home') go(0);
    else if (event.key === 'End') go(keys.length - 1);
    else if (/^[\p{L}\p{N}]$/u.test(event.key)) {
      const next = typedAhead(keys, stop, event.key);
      if (next === null) return;
      go(next);
    } else return;
    event.preventDefault();
  };

  return (
    <fieldset className="min-w-0">
      <div className="flex items-baseline justify-between gap-4 pb-2">
        <legend id={id} className="float-start font-bold">
          {legend}
        </legend>
        {hint && <span className="min-w-0 truncate text-[0.9375rem] text-ink-2">{hint}</span>}
      </div>
      <div
        role="toolbar"
        aria-labelledby={id}
        onKeyDown={onKeyDown}
        className={cx('grid border-s-[1.5px] border-t-[1.5px] border-ink', COLUMNS[columns])}
      >
        {keys.map((key, index) => (
          <button
            key={key.value}
            ref={(element) => {
              buttons.current[index] = element;
            }}
            type="button"
            tabIndex={index === stop ? 0 : -1}
            aria-pressed={value === key.value}
            aria-disabled={blocked || undefined}
            aria-label={key.text}
            onFocus={() => setStop(index)}
            onClick={blocked ? undefined : () => onPick(key.value)}
            className={cx(
              'relative flex items-center justify-center border-b-[1.5px] border-e-[1.5px] border-ink px-1 text-center leading-tight focus-visible:z-10',
              height === 'tall' ? 'min-h-16' : 'min-h-12',
              key.span === 2 && 'col-span-2',
              key.plain ? 'text-[1.0625rem]' : 'text-lg font-bold',
              value === key.value ? 'bg-ink text-paper' : 'bg-sheet text-ink active:bg-hair',
            )}
          >
            {key.label}
          </button>
        ))}
        {filler(keys, columns) > 0 && (
          <span
            className={cx(
              'border-b-[1.5px] border-e-[1.5px] border-ink bg-sheet',
              FILL[filler(keys, columns)],
            )}
          />
        )}
      </div>
    </fieldset>
  );
}

const FILL: Readonly<Record<number, string>> = { 1: 'col-span-1', 2: 'col-span-2', 3: 'col-span-3' };

/** Columns left over in the last row. */
function filler(keys: readonly GridKey[], columns: number): number {
  const used = keys.reduce((sum, key) => sum + (key.span ?? 1), 0) % columns;
  return used === 0 ? 0 : columns - used;
}

/** The next key after `from`, round the end, whose text begins with the letter; null if none does. */
export function typedAhead(keys: readonly GridKey[], from: number, letter: string): number | null {
  const wanted = letter.toLowerCase();
  for (let k = 1; k <= keys.length; k++) {
    const index = (from + k) % keys.length;
    const key = keys[index];
    const text = key?.text ?? (typeof key?.label === 'string' ? key.label : '');
    if (text.toLowerCase().startsWith(wanted)) return index;
  }
  return null;
}
