import { cx } from './cx.ts';

/** More showings than this and a tick stands for several. */
const MOST_TICKS = 60;

export interface RulerTicksProps {
  /** Answered and planned, whole numbers from 0. */
  readonly done: number;
  readonly total: number;
  /** Says what the ruler measures; `text` says where it stands. */
  readonly label: string;
  readonly text: string;
  readonly className?: string;
}

/** Progress of a sitting as a ruler up the picture's edge: done ticks dark, every fifth longer. Stands in a row. */
export function RulerTicks({ done, total, label, text, className = 'w-5' }: RulerTicksProps) {
  const each = Math.max(1, Math.ceil(total / MOST_TICKS));
  const count = Math.max(1, Math.ceil(total / each));
  const ticks = Array.from({ length: count }, (_, k) => k + 1);
  return (
    <div
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={total}
      aria-valuenow={Math.min(done, total)}
      aria-valuetext={text}
      className={cx('relative self-stretch', className)}
    >
      <svg
        aria-hidden="true"
        focusable="false"
        width="100%"
        height="100%"
        className="absolute inset-0 overflow-visible"
      >
        {ticks.map((tick) => {
          const reached = tick * each <= done;
          const y = `${(100 - ((tick - 0.5) / count) * 100).toFixed(2)}%`;
          return (
            <line
              key={tick}
              x1="0"
              x2={tick % 5 === 0 ? '100%' : reached ? '66%' : '50%'}
              y1={y}
              y2={y}
              strokeWidth={reached ? 2.5 : 1.5}
              className={cx(reached ? 'figure-ink stroke-ink' : 'stroke-bar')}
            />
          );
        })}
      </svg>
    </div>
  );
}
