import type { Tick } from '#renderer/ui/index.ts';

const DAY_MS = 86_400_000;

/** Days from 1970-01-01 of an ISO date. */
export function dayNumber(date: string): number {
  return Math.round(Date.parse(`${date}T00:00:00Z`) / DAY_MS);
}

function say(day: number): string {
  return new Date(day * DAY_MS).toLocaleDateString('en-GB', {
    timeZone: 'UTC',
    day: 'numeric',
    month: 'short',
  });
}

/** About four dates along an axis of days, kept off its ends so that their words fit. */
export function dateTicks(min: number, max: number): Tick[] {
  const span = Math.max(1, max - min);
  const step = Math.max(1, Math.round(span / 4));
  const ticks: Tick[] = [];
  for (let day = min + Math.ceil(step / 2); day <= max; day += step)
    ticks.push({ value: day, label: say(day) });
  return ticks;
}
