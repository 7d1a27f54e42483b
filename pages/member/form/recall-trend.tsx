import { TrendLine } from '#renderer/ui/index.ts';
import type { FormView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { dateTicks, dayNumber } from './date-ticks.ts';

const text = memberText.form;

const SHARES = [0, 0.25, 0.5, 0.75];

/** A set's dealt recall over the last 90 days, its interval in quiet lines, and a table with the same figures. */
export function RecallTrend({ name, days }: { name: string; days: FormView['sets'][number]['days'] }) {
  const last = days.at(-1);
  const first = days[0];
  if (!first || !last) return <p className="text-ink-2">{text.noDays}</p>;
  const x = { min: Math.min(dayNumber(first.date), dayNumber(last.date) - 6), max: dayNumber(last.date) };
  // The axis begins at the quarter below the lowest figure, so that a steady course still shows its shape.
  const floor = SHARES.findLast((share) => days.every((day) => day.low >= share)) ?? 0;
  const middle = (floor + 1) / 2;
  const line = (of: (day: (typeof days)[number]) => number) =>
    days.map((day) => ({ x: dayNumber(day.date), y: of(day) }));
  return (
    <TrendLine
      label={text.chart(name)}
      series={[
        { key: 'low', label: '', points: line((day) => day.low), quiet: true },
        { key: 'high', label: '', points: line((day) => day.high), quiet: true },
        { key: 'value', label: memberText.percent(last.value), points: line((day) => day.value) },
      ]}
      x={{ ...x, ticks: dateTicks(x.min, x.max) }}
      y={{
        min: floor,
        max: 1,
        ticks: [floor, middle, 1].map((value) => ({ value, label: memberText.percent(value) })),
      }}
      table={{
        head: text.head,
        rows: days.map((day) => [
          day.date,
          memberText.percent(day.value),
          memberText.percent(day.low),
          memberText.percent(day.high),
          String(day.answers),
        ]),
      }}
    />
  );
}
