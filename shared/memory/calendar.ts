import { tzOffset } from '@date-fns/tz';

const HOUR = 3_600_000;
const DAY = 24 * HOUR;
/** No zone is further from UTC than this, so a local midnight is found within so much of UTC's. */
const FURTHEST_OFFSET = 15 * HOUR;
/** No change of offset within so much before an instant means that its training day is a plain one. */
const LOOK_BACK = 36 * HOUR;

const knownZones = new Set<string>();

/**
 * The training day an instant falls in, as the number of days from 1970-01-01 to its local date. A day
 * begins at `rolloverHour` by the clock on the wall; the hours before it belong to the date before. Days
 * never go backwards as time passes in one zone, each local date that exists has exactly one day, and a
 * date the zone skipped has none (its neighbours meet).
 *
 * @param instantMs milliseconds since 1970, UTC
 * @param timeZone IANA name
 * @param rolloverHour 0..23
 * @throws RangeError for an unknown zone, an hour outside 0..23 or an instant that is not a time.
 */
export function localDay(instantMs: number, timeZone: string, rolloverHour: number): number {
  checkPlace(timeZone, rolloverHour);
  if (!Number.isFinite(instantMs)) throw new RangeError('The instant is not a time.');
  const offset = offsetAt(instantMs, timeZone);
  const day = Math.floor((instantMs + offset - rolloverHour * HOUR) / DAY);
  if (offset === offsetAt(instantMs - LOOK_BACK, timeZone)) return day;
  for (let candidate = day + 1; candidate > day - 3; candidate -= 1) {
    const begun = wallReaches(candidate * DAY + rolloverHour * HOUR, timeZone) <= instantMs;
    if (begun && dateExists(candidate, timeZone)) return candidate;
  }
  return day;
}

/**
 * The instant (milliseconds since 1970) at which a training day begins: the first at which the wall clock
 * shows the rollover hour of that date, or has jumped past it. A skipped date begins and ends together
 * with the next one's beginning.
 */
export function dayStart(day: number, timeZone: string, rolloverHour: number): number {
  checkPlace(timeZone, rolloverHour);
  if (!Number.isInteger(day)) throw new RangeError('A day is a whole number.');
  const real = dateExists(day, timeZone) ? day : day + 1;
  return wallReaches(real * DAY + rolloverHour * HOUR, timeZone);
}

/** ISO date (YYYY-MM-DD) of a day number. */
export function isoDate(day: number): string {
  if (!Number.isInteger(day)) throw new RangeError('A day is a whole number.');
  return new Date(day * DAY).toISOString().slice(0, 10);
}

/** Day number of an ISO date. */
export function dayOfDate(date: string): number {
  const day = /^\d{4}-\d{2}-\d{2}$/.test(date) ? Date.parse(`${date}T00:00:00Z`) / DAY : Number.NaN;
  if (!Number.isInteger(day) || isoDate(day) !== date) throw new RangeError(`${date} is not a date.`);
  return day;
}

/** First instant at which the zone's wall clock shows `wall` (as if UTC) or something later. */
function wallReaches(wall: number, timeZone: string): number {
  let before = wall - FURTHEST_OFFSET;
  let after = wall + FURTHEST_OFFSET;
  const offsetBefore = offsetAt(before, timeZone);
  const offsetAfter = offsetAt(after, timeZone);
  const early = wall - offsetBefore;
  if (offsetBefore === offsetAfter) return early;
  // The clock changes nearby: halve down to the millisecond of the change.
  while (after - before > 1) {
    const middle = Math.floor((before + after) / 2);
    if (offsetAt(middle, timeZone) === offsetBefore) before = middle;
    else after = middle;
  }
  if (early < after) return early;
  return Math.max(after, wall - offsetAfter);
}

/** Whether any instant of the zone bears this local date. */
function dateExists(day: number, timeZone: string): boolean {
  return wallReaches(day * DAY, timeZone) < wallReaches((day + 1) * DAY, timeZone);
}

function offsetAt(instantMs: number, timeZone: string): number {
  return tzOffset(timeZone, new Date(instantMs)) * 60_000;
}

function checkPlace(timeZone: string, rolloverHour: number): void {
  if (!Number.isInteger(rolloverHour) || rolloverHour < 0 || rolloverHour > 23) {
    throw new RangeError('The rollover hour is a whole number from 0 to 23.');
  }
  if (knownZones.has(timeZone)) return;
  // Throws a RangeError that names the zone if there is none such.
  new Intl.DateTimeFormat('en-US', { timeZone });
  knownZones.add(timeZone);
}
