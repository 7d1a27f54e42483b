import type { FormView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { dateTicks, dayNumber } from './date-ticks.ts';

const text = memberText.form;
const HEIGHT = 96;

/** Minutes of training on each of the last 28 days: a bar a day, and a table with the same figures. */
export function MinutesChart({ days }: { days: FormView['minutesPerDay'] }) {
  const total = days.reduce((sum, day) => sum + day.minutes, 0);
  const trained = days.filter((day) => day.minutes > 0).length;
  const top = Math.max(1, Math.ceil(Math.max(0, ...days.map((day) => day.minutes))));
  const first = dayNumber(days[0]?.date ?? '1970-01-01');
  const across = (place: number) => `${((place / days.length) * 100).toFixed(2)}%`;
  return (
    <figure>
      <p className="pb-3">{text.minutesTotal(total, trained)}</p>
      <svg
        aria-hidden="true"
        focusable="false"
        width="100%"
        height={HEIGHT + 24}
        className="block overflow-visible"
      >
        <line x1="0" x2="100%" y1="0.5" y2="0.5" className="stroke-hair" />
        <text x="0" y="14" className="fill-ink-2 text-xs">
          {text.minutesTick(top)}
        </text>
        {days.map((day, k) => {
          const height = (day.minutes / top) * HEIGHT;
          return (
            <rect
              key={day.date}
              x={across(k + 0.2)}
              width={across(0.6)}
              y={HEIGHT - height}
              height={height}
              className="fill-ink"
            />
          );
        })}
        <line x1="0" x2="100%" y1={HEIGHT} y2={HEIGHT} className="stroke-ink" strokeWidth="1.5" />
        {dateTicks(first, first + days.length - 1).map((tick) => (
          <text
            key={tick.value}
            x={across(tick.value - first + 0.5)}
            y={HEIGHT + 18}
            textAnchor="middle"
            className="fill-ink-2 text-xs"
          >
            {tick.label}
          </text>
        ))}
      </svg>
      <div className="sr-only">
        <table>
          <caption>{text.minutesChart}</caption>
          <thead>
            <tr>
              {text.minutesHead.map((head) => (
                <th key={head} scope="col">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {days.map((day) => (
              <tr key={day.date}>
                <td>{day.date}</td>
                <td>{day.minutes.toFixed(1)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </figure>
  );
}
