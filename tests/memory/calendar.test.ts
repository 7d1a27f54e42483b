import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dayOfDate, dayStart, foldCase, isoDate, localDay } from '#shared/memory/index.ts';
import { row } from './rows.ts';

const HOUR = 3_600_000;

// Zones and their changes are facts of the IANA time zone database.
const ZONES = [
  'UTC',
  'Europe/London',
  'America/New_York',
  'America/St_Johns',
  'America/Sao_Paulo',
  'Asia/Kolkata',
  'Asia/Kathmandu',
  'Asia/Beirut',
  'Africa/Cairo',
  'Africa/Casablanca',
  'Australia/Lord_Howe',
  'Pacific/Chatham',
  'Pacific/Apia',
  'Pacific/Kwajalein',
  'Pacific/Kiritimati',
  'Etc/GMT+12',
  'Antarctica/Troll',
];
const zones = fc.constantFrom(...ZONES);
const hours = fc.integer({ min: 0, max: 23 });
/** 1990 to 2035. */
const instants = fc.integer({ min: Date.UTC(1990, 0, 1), max: Date.UTC(2035, 0, 1) });

/** The wall clock as the platform's own formatter shows it, independent of the code under test. */
function wall(instant: number, timeZone: string): { day: number; hour: number } {
  const parts = new Intl.DateTimeFormat('en-CA', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
  }).formatToParts(instant);
  const part = (type: string) => parts.find((p) => p.type === type)?.value ?? '';
  return { day: dayOfDate(`${part('year')}-${part('month')}-${part('day')}`), hour: Number(part('hour')) };
}

function lengthInHours(date: string, zone: string, rollover: number): number {
  const day = dayOfDate(date);
  return (dayStart(day + 1, zone, rollover) - dayStart(day, zone, rollover)) / HOUR;
}

describe('training days', () => {
  it('put every instant into exactly one day: from its beginning to the next one’s', () => {
    fc.assert(
      fc.property(instants, zones, hours, (instant, zone, rollover) => {
        const day = localDay(instant, zone, rollover);
        expect(dayStart(day, zone, rollover)).toBeLessThanOrEqual(instant);
        expect(dayStart(day + 1, zone, rollover)).toBeGreaterThan(instant);
      }),
      { numRuns: 1000 },
    );
  });

  it('never go backwards, and leave out only dates that the zone skipped', () => {
    fc.assert(
      fc.property(instants, zones, hours, (from, zone, rollover) => {
        let previous = localDay(from, zone, rollover);
        for (let step = 1; step <= 4 * 48; step += 1) {
          const day = localDay(from + (step * HOUR) / 2, zone, rollover);
          expect(day).toBeGreaterThanOrEqual(previous);
          for (let skipped = previous + 1; skipped < day; skipped += 1) {
            expect(dayStart(skipped, zone, rollover)).toBe(dayStart(skipped + 1, zone, rollover));
          }
          previous = day;
        }
      }),
      { numRuns: 60 },
    );
  });

  it('bear the date on the wall, or before the rollover hour the last date before it', () => {
    fc.assert(
      fc.property(instants, zones, hours, (instant, zone, rollover) => {
        const now = wall(instant, zone);
        const earlier = wall(instant - 3 * HOUR, zone);
        // Not just after clocks were put back: an hour shown a second time goes on in the day it is in.
        fc.pre(24 * (now.day - earlier.day) + now.hour - earlier.hour >= 3);
        const dateBefore = wall(dayStart(now.day, zone, 0) - 1, zone).day;
        expect(localDay(instant, zone, rollover)).toBe(now.hour >= rollover ? now.day : dateBefore);
      }),
      { numRuns: 400 },
    );
  });

  it('begin at the rollover hour by the wall clock', () => {
    // Derived: 4 in the morning in New York in winter is 9 UTC, in summer 8 UTC.
    expect(dayStart(dayOfDate('2024-01-15'), 'America/New_York', 4)).toBe(Date.UTC(2024, 0, 15, 9));
    expect(dayStart(dayOfDate('2024-07-15'), 'America/New_York', 4)).toBe(Date.UTC(2024, 6, 15, 8));
    expect(isoDate(localDay(Date.UTC(2024, 0, 15, 8, 59), 'America/New_York', 4))).toBe('2024-01-14');
    expect(isoDate(localDay(Date.UTC(2024, 0, 15, 9), 'America/New_York', 4))).toBe('2024-01-15');
  });

  it('are 23 and 25 hours long when the clocks change', () => {
    // London 2024: forward on 31 March, back on 27 October, both at 1 UTC. A day that begins at 4 has the
    // change in the night that ends it.
    expect(lengthInHours('2024-03-31', 'Europe/London', 0)).toBe(23);
    expect(lengthInHours('2024-10-27', 'Europe/London', 0)).toBe(25);
    expect(lengthInHours('2024-03-30', 'Europe/London', 4)).toBe(23);
    expect(lengthInHours('2024-10-26', 'Europe/London', 4)).toBe(25);
    expect(lengthInHours('2024-10-27', 'Europe/London', 4)).toBe(24);
  });

  it('begin with the jump when the clocks jump over the rollover hour', () => {
    // London, 31 March 2024: the hour from 1 to 2 does not exist.
    expect(dayStart(dayOfDate('2024-03-31'), 'Europe/London', 1)).toBe(Date.UTC(2024, 2, 31, 1));
    // Beirut, 31 March 2024: midnight itself does not exist; the day begins at 1, which is 22 UTC.
    expect(dayStart(dayOfDate('2024-03-31'), 'Asia/Beirut', 0)).toBe(Date.UTC(2024, 2, 30, 22));
  });

  it('change by half an hour on Lord Howe', () => {
    // 2024: back on 7 April at 2 (to 1:30), forward on 6 October at 2 (to 2:30).
    expect(lengthInHours('2024-04-07', 'Australia/Lord_Howe', 0)).toBe(24.5);
    expect(lengthInHours('2024-10-06', 'Australia/Lord_Howe', 0)).toBe(23.5);
    expect(dayStart(dayOfDate('2024-10-06'), 'Australia/Lord_Howe', 2)).toBe(Date.UTC(2024, 9, 5, 15, 30));
  });

  it('pass over the date that Apia skipped', () => {
    // Samoa went from 29 to 31 December 2011 at midnight, 10 UTC on the 30th.
    const midnight = Date.UTC(2011, 11, 30, 10);
    expect(isoDate(localDay(midnight - 1, 'Pacific/Apia', 0))).toBe('2011-12-29');
    expect(isoDate(localDay(midnight, 'Pacific/Apia', 0))).toBe('2011-12-31');
    expect(lengthInHours('2011-12-30', 'Pacific/Apia', 0)).toBe(0);
    // With a rollover at 4 the night that follows the 29th still belongs to it: 24 hours, then the 31st.
    expect(isoDate(localDay(midnight + 3 * HOUR, 'Pacific/Apia', 4))).toBe('2011-12-29');
    expect(isoDate(localDay(midnight + 4 * HOUR, 'Pacific/Apia', 4))).toBe('2011-12-31');
    expect(lengthInHours('2011-12-29', 'Pacific/Apia', 4)).toBe(24);
    expect(lengthInHours('2011-12-30', 'Pacific/Apia', 4)).toBe(0);
    expect(lengthInHours('2011-12-31', 'Pacific/Apia', 4)).toBe(24);
  });

  it('do not begin twice where the clocks go back over midnight', () => {
    // St John's until 2011: at 0:01 back to 23:01. Autumn 2010: 7 November, 2:31 UTC.
    const change = Date.UTC(2010, 10, 7, 2, 31);
    const start = dayStart(dayOfDate('2010-11-07'), 'America/St_Johns', 0);
    expect(start).toBe(change - 60_000);
    expect(wall(change, 'America/St_Johns')).toEqual({ day: dayOfDate('2010-11-06'), hour: 23 });
    expect(isoDate(localDay(change, 'America/St_Johns', 0))).toBe('2010-11-07');
    expect(isoDate(localDay(start - 1, 'America/St_Johns', 0))).toBe('2010-11-06');
  });

  it('reach from UTC+14 to UTC−12', () => {
    // Derived: noon UTC on the 10th is 2 on the 11th in Kiritimati and midnight on the 10th at −12.
    const noon = Date.UTC(2024, 4, 10, 12);
    expect(isoDate(localDay(noon, 'Pacific/Kiritimati', 0))).toBe('2024-05-11');
    expect(isoDate(localDay(noon, 'Pacific/Kiritimati', 4))).toBe('2024-05-10');
    expect(isoDate(localDay(noon, 'Etc/GMT+12', 0))).toBe('2024-05-10');
    expect(isoDate(localDay(noon - 1, 'Etc/GMT+12', 0))).toBe('2024-05-09');
  });

  it('give a traveller one first answer per local date, whatever the way taken', () => {
    const journeys = fc.array(fc.record({ zone: zones, hours: fc.integer({ min: 1, max: 40 }) }), {
      minLength: 2,
      maxLength: 20,
    });
    fc.assert(
      fc.property(instants, journeys, (from, legs) => {
        let instant = from;
        const log = legs.map(({ zone, hours: stay }, i) => {
          instant += stay * HOUR;
          return row(0, i, { answeredAt: instant, localDay: localDay(instant, zone, 4), outcome: 'missed' });
        });
        for (const { answeredAt, localDay: day } of log) {
          expect(Math.abs(day - Math.floor(answeredAt / (24 * HOUR)))).toBeLessThanOrEqual(1);
        }
        const { firsts, kinds } = foldCase(log);
        const days = firsts.map(({ localDay: day }) => day);
        expect(days).toEqual([...new Set(days)].sort((a, b) => a - b));
        expect([...kinds.values()].filter((kind) => kind === 'first').length).toBe(days.length);
      }),
    );
  });

  it('refuse what is no zone, hour, day or date', () => {
    expect(() => localDay(0, 'Europe/Atlantis', 4)).toThrow('Europe/Atlantis');
    expect(() => localDay(0, 'UTC', 24)).toThrow('rollover hour');
    expect(() => localDay(0, 'UTC', 1.5)).toThrow('rollover hour');
    expect(() => localDay(Number.NaN, 'UTC', 4)).toThrow('not a time');
    expect(() => dayStart(0.5, 'UTC', 4)).toThrow('whole number');
    expect(() => isoDate(0.5)).toThrow('whole number');
    expect(() => dayOfDate('2024-02-30')).toThrow('2024-02-30');
    expect(() => dayOfDate('10 May')).toThrow('10 May');
    expect(isoDate(dayOfDate('2024-02-29'))).toBe('2024-02-29');
  });
});
