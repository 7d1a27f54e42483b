import { FigureBar, Section, type Tick, TrendLine } from '#renderer/ui/index.ts';
import type { MemberPageView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';
import { numberText } from '#shared/text/numbers.ts';
import { sayFigure } from '../say-figure.ts';

const text = deskText.member;
const { percent } = numberText;

type MemberSet = MemberPageView['sets'][number];

const DAY_MS = 86_400_000;
const DAYS = 90;
const TICKS_AGO = [84, 56, 28, 0];

/** One set of a member: what stands now, and how it came there over 90 days. */
export function SetTrend({ set, date }: { set: MemberSet; date: string }) {
  return (
    <Section title={set.name} aside={text.edition(set.edition)} ruled>
      {set.now.rests === 'nothing' ? (
        <p className="py-3 text-ink-2">{text.notBegun}</p>
      ) : (
        <>
          <div className="grid grid-cols-[auto_minmax(0,1fr)] items-center gap-x-5 py-3">
            <span className="text-[2.125rem] font-bold leading-tight">{percent(set.now.value)}</span>
            <div>
              <FigureBar bare figure={set.now} text="" label={sayFigure(set.now)} hollow={set.now.few} />
              <p className="text-sm text-ink-2">
                {text.interval(percent(set.now.low), percent(set.now.high))},{' '}
                {set.now.rests === 'elsewhere' ? deskText.elsewhere : text.answers(set.now.answers)}
              </p>
            </div>
          </div>
          {set.days.length < 2 ? (
            <p className="py-3 text-ink-2">{text.trendTooShort}</p>
          ) : (
            <Trend set={set} today={dayOf(date)} />
          )}
        </>
      )}
    </Section>
  );
}

function Trend({ set, today }: { set: MemberSet; today: number }) {
  const points = (of: 'value' | 'low' | 'high') =>
    set.days.map((day) => ({ x: dayOf(day.date), y: day[of] }));
  const lowest = Math.min(...set.days.map((day) => day.low));
  const floor = Math.min(0.9, Math.floor(lowest * 10) / 10);
  return (
    <TrendLine
      label={text.trend(set.name)}
      series={[
        { key: 'low', label: '', points: points('low'), quiet: true },
        { key: 'high', label: '', points: points('high'), quiet: true },
        { key: 'value', label: percent(set.now.value), points: points('value') },
      ]}
      x={{
        min: today - DAYS + 1,
        max: today,
        ticks: TICKS_AGO.map((ago) => ({ value: today - ago, label: dayLabel(today - ago, ago) })),
      }}
      y={{ min: floor, max: 1, ticks: sharesFrom(floor) }}
      table={{
        head: [text.date, text.recall, text.from, text.to, text.columns.answers],
        rows: set.days.map((day) => [
          day.date,
          percent(day.value),
          percent(day.low),
          percent(day.high),
          String(day.answers),
        ]),
      }}
    />
  );
}

function sharesFrom(floor: number): Tick[] {
  return [floor, (1 + floor) / 2, 1].map((value) => ({ value, label: percent(value) }));
}

function dayOf(date: string): number {
  return Date.parse(date) / DAY_MS;
}

function dayLabel(day: number, ago: number): string {
  if (ago === 0) return text.now;
  return new Date(day * DAY_MS).toLocaleDateString('en-GB', {
    day: 'numeric',
    month: 'short',
    timeZone: 'UTC',
  });
}
