import type { LogRow } from '#shared/memory/index.ts';

const DAY = 86_400_000;

/** A log row with plain defaults; ids and moments follow from day and place in the day. */
export function row(localDay: number, place: number, over: Partial<LogRow> = {}): LogRow {
  return {
    id: `d${String(localDay).padStart(6, '0')}-${String(place).padStart(3, '0')}`,
    answeredAt: localDay * DAY + place * 60_000,
    localDay,
    outcome: 'held',
    scored: true,
    keysOffered: 22,
    misTapped: false,
    ...over,
  };
}
