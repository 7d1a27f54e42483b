import { plotLine, plotY, type TrendPoint } from './trend-path.ts';

export interface TrendSeries {
  readonly key: string;
  readonly label: string;
  readonly points: readonly TrendPoint[];
  readonly dashed?: boolean;
  readonly quiet?: boolean;
}

export interface Tick {
  readonly value: number;
  readonly label: string;
}

export interface TrendLineProps {
  /** Names the chart. */
  readonly label: string;
  readonly series: readonly TrendSeries[];
  readonly x: { readonly min: number; readonly max: number; readonly ticks: readonly Tick[] };
  readonly y: { readonly min: number; readonly max: number; readonly ticks: readonly Tick[] };
  /** The same figures as a table, for assistive technology. */
  readonly table: { readonly head: readonly string[]; readonly rows: readonly (readonly string[])[] };
  /** Where something ended or changed: vertical hair lines. */
  readonly marks?: readonly Tick[];
}

const HEIGHT = 176;
const LEFT = 40;
const LABELS = 64;

/** Lines over time, each labelled at its end; a table with the same figures stands behind it. */
export function TrendLine({ label, series, x, y, table, marks = [] }: TrendLineProps) {
  const across = (value: number) => `${(((value - x.min) / (x.max - x.min || 1)) * 100).toFixed(2)}%`;
  return (
    <figure>
      <div aria-hidden="true" className="flex">
        <svg
          width={LEFT}
          height={HEIGHT}
          className="shrink-0 overflow-visible"
          aria-hidden="true"
          focusable="false"
        >
          {y.ticks.map((tick) => (
            <text
              key={tick.value}
              x={LEFT - 8}
              y={plotY(tick.value, y, HEIGHT) + 4}
              textAnchor="end"
              className="fill-ink-2 text-xs"
            >
              {tick.label}
            </text>
          ))}
        </svg>
        <div className="min-w-0 flex-1">
          <svg
            width="100%"
            height={HEIGHT}
            className="block overflow-visible"
            aria-hidden="true"
            focusable="false"
          >
            {y.ticks.map((tick) => (
              <line
                key={tick.value}
                x1="0"
                x2="100%"
                y1={plotY(tick.value, y, HEIGHT)}
                y2={plotY(tick.value, y, HEIGHT)}
                className="stroke-hair"
              />
            ))}
            {marks.map((mark) => (
              <line
                key={mark.value}
                x1={across(mark.value)}
                x2={across(mark.value)}
                y1="0"
                y2={HEIGHT}
                className="stroke-line"
              />
            ))}
            <svg
              width="100%"
              height={HEIGHT}
              viewBox={`0 0 1000 ${HEIGHT}`}
              preserveAspectRatio="none"
              overflow="visible"
              aria-hidden="true"
            >
              {series.map((one) => (
                <path
                  key={one.key}
                  d={plotLine(one.points, x, y, 1000, HEIGHT)}
                  fill="none"
                  vectorEffect="non-scaling-stroke"
                  strokeWidth={one.quiet ? 1.5 : 2.5}
                  strokeDasharray={one.dashed ? '5 4' : undefined}
                  strokeLinejoin="round"
                  className={one.quiet ? 'stroke-bar' : 'figure-line stroke-ink'}
                />
              ))}
            </svg>
          </svg>
          <svg
            width="100%"
            height="22"
            className="block overflow-visible"
            aria-hidden="true"
            focusable="false"
          >
            {x.ticks.map((tick) => (
              <text
                key={tick.value}
                x={across(tick.value)}
                y="16"
                textAnchor="middle"
                className="fill-ink-2 text-xs"
              >
                {tick.label}
              </text>
            ))}
          </svg>
        </div>
        <svg
          width={LABELS}
          height={HEIGHT}
          className="shrink-0 overflow-visible"
          aria-hidden="true"
          focusable="false"
        >
          {series.map((one) => {
            const last = one.points.findLast((point) => point.y !== null);
            if (!last || last.y === null) return null;
            return (
              <text
                key={one.key}
                x="8"
                y={plotY(last.y, y, HEIGHT) + 4}
                className="fill-ink text-sm font-bold"
              >
                {one.label}
              </text>
            );
          })}
        </svg>
      </div>
      <div className="sr-only">
        <table>
          <caption>{label}</caption>
          <thead>
            <tr>
              {table.head.map((head) => (
                <th key={head} scope="col">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {table.rows.map((row) => (
              <tr key={row.join(' ')}>
                {row.map((value, k) => (
                  <td key={table.head[k] ?? k}>{value}</td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </figure>
  );
}
