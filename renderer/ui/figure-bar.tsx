import { cx } from './cx.ts';

export interface FigureBarProps {
  /** The figure and its interval as shares, 0..1. Null: no answers yet. */
  readonly figure: { readonly value: number; readonly low: number; readonly high: number } | null;
  /** The figure as printed. */
  readonly text: string;
  /** Figure, interval and what it rests on, in words, for assistive technology. */
  readonly label: string;
  /** Few answers: the interval is drawn hollow. */
  readonly hollow?: boolean;
  readonly strong?: boolean;
  /** Change, on the right of the number. */
  readonly delta?: string;
  /** Only the axis; the number is printed elsewhere. */
  readonly bare?: boolean;
}

/** Percent for an SVG attribute; shares outside 0..1 are drawn at the end of the axis. */
function percent(share: number): string {
  return `${(Math.min(1, Math.max(0, share)) * 100).toFixed(2)}%`;
}

/** The interval as drawn: inside the axis, and never so narrow that it vanishes. */
function bar(low: number, high: number): { x: string; width: string } {
  const width = Math.max(0.02, Math.min(1, high) - Math.max(0, low));
  return { x: percent(Math.min(Math.max(0, low), 1 - width)), width: percent(width) };
}

/** A number; under it an axis from 0 to 1 with a tick (the figure) and a bar (its interval). */
export function FigureBar(props: FigureBarProps) {
  const { figure, text, label, hollow = false, strong = false, delta, bare = false } = props;
  return (
    <div className="min-w-18">
      <span className="sr-only">{label}</span>
      {!bare && (
        <div aria-hidden="true" className={cx('flex items-baseline justify-between', strong && 'font-bold')}>
          <span className="tracking-[0.04em]">{text}</span>
          {delta && <span className="text-xs font-bold text-ink-2">{delta}</span>}
        </div>
      )}
      <svg aria-hidden="true" focusable="false" width="100%" height="16" className="block overflow-visible">
        <line x1="0" x2="100%" y1="8" y2="8" strokeWidth="1" className="stroke-line" />
        {figure && (
          <>
            <rect
              {...bar(figure.low, figure.high)}
              y={hollow ? 5 : 5.5}
              height={hollow ? 6 : 5}
              strokeWidth={hollow ? 1 : 0}
              className={hollow ? 'fill-paper stroke-ink figure-edge' : 'fill-bar'}
            />
            <line
              x1={percent(figure.value)}
              x2={percent(figure.value)}
              y1="2"
              y2="14"
              strokeWidth="3"
              className="figure-ink stroke-ink"
            />
          </>
        )}
      </svg>
    </div>
  );
}
