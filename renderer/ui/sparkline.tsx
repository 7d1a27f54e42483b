import { plotLine, type TrendPoint } from './trend-path.ts';

export interface SparklineProps {
  readonly points: readonly TrendPoint[];
  readonly y: { readonly min: number; readonly max: number };
  /** The course in words, for assistive technology. */
  readonly label: string;
  readonly className?: string;
}

/** A line the height of a row, without axes. */
export function Sparkline({ points, y, label, className = 'h-6 w-24' }: SparklineProps) {
  const xs = points.map((point) => point.x);
  const x = { min: Math.min(...xs), max: Math.max(...xs) };
  return (
    <svg
      role="img"
      aria-label={label}
      focusable="false"
      viewBox="0 0 100 24"
      preserveAspectRatio="none"
      className={className}
    >
      <path
        d={plotLine(points, x, y, 100, 24)}
        fill="none"
        strokeWidth="1.5"
        vectorEffect="non-scaling-stroke"
        className="figure-line stroke-ink"
      />
    </svg>
  );
}
