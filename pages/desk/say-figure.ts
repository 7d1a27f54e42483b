import type { Figure } from '#shared/contracts/common.ts';
import { deskText } from '#shared/text/desk.ts';
import { numberText } from '#shared/text/numbers.ts';

const { percent, points } = numberText;

/** A figure in words, with what it rests on and how it moved. */
export function sayFigure(figure: Figure, change: number | null = null): string {
  if (figure.rests === 'nothing') return deskText.notBegun;
  return deskText.figureLabel({
    value: percent(figure.value),
    low: percent(figure.low),
    high: percent(figure.high),
    answers: figure.answers,
    elsewhere: figure.rests === 'elsewhere',
    change: change === null ? null : points(change),
  });
}

/** The figure as tables print it: whole points. */
export function printFigure(figure: Figure): string {
  return String(Math.round(figure.value * 100));
}

const DAY_MS = 86_400_000;

/** A local date as the desk says it, seen from `today`: today, yesterday, days ago, then day and month. */
export function sayPastDate(date: string | null, today: string): string {
  if (date === null) return deskText.never;
  const days = Math.round((Date.parse(today) - Date.parse(date)) / DAY_MS);
  if (days <= 0) return deskText.today;
  if (days === 1) return deskText.yesterday;
  if (days <= 28) return deskText.daysAgo(days);
  return new Date(`${date}T00:00:00Z`).toLocaleDateString('en-GB', {
    day: 'numeric',
    month: 'short',
    year: date.slice(0, 4) === today.slice(0, 4) ? undefined : 'numeric',
    timeZone: 'UTC',
  });
}
