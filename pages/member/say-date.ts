import { memberText } from '#shared/text/member.ts';

const DAY_MS = 86_400_000;

/** Whole days from one ISO date to another. */
export function daysBetween(from: string, to: string): number {
  return Math.round((Date.parse(to) - Date.parse(from)) / DAY_MS);
}

/** A local date as people say it, seen from `today`: today, tomorrow, a weekday, or day and month. */
export function sayDate(date: string, today: string): string {
  const days = daysBetween(today, date);
  if (days <= 0) return memberText.today;
  if (days === 1) return memberText.tomorrow;
  const at = new Date(`${date}T00:00:00Z`);
  const weekday = days < 7 ? ({ weekday: 'long' } as const) : ({ day: 'numeric', month: 'long' } as const);
  return at.toLocaleDateString('en-GB', { timeZone: 'UTC', ...weekday });
}
