import { describe, expect, it } from 'vitest';
import { type SortKey, sortOf, sortRows } from '#pages/desk/squad/squad-sort.ts';
import type { Figure } from '#shared/contracts/common.ts';
import type { SquadRow } from '#shared/contracts/desk.ts';

const columns = [
  { key: 'dot', name: 'dot', dealt: 0.13 },
  { key: '*', name: 'All', dealt: null },
];

function row(
  nickname: string,
  value: number | null,
  change: number | null,
  more: Partial<SquadRow> = {},
): SquadRow {
  const figure: Figure | null =
    value === null ? null : { value, low: value, high: value, answers: 30, few: false, rests: 'here' };
  return {
    memberId: nickname,
    nickname,
    role: 'member',
    cells: [
      { figure: null, change: null },
      { figure, change },
    ],
    answers: 0,
    lastTrained: null,
    minutesPerDay: 0,
    ...more,
  };
}

const rows = [
  row('Ines', 0.9, null, { answers: 5, lastTrained: '2026-11-02', minutesPerDay: 3 }),
  row('arun', 0.7, 4, { answers: 9 }),
  row('Wen', null, null, { answers: 1, lastTrained: '2026-11-30', minutesPerDay: 9 }),
  row('Kofi', 0.9, -6, { answers: 9, lastTrained: '2026-10-31', minutesPerDay: 1 }),
];

function names(key: SortKey, direction: 'ascending' | 'descending') {
  return sortRows({ columns, rows }, { key, direction }).map(({ nickname }) => nickname);
}

describe('the order of the squad', () => {
  it('goes by figure, equals by name, those without one last either way', () => {
    expect(names('r.*', 'descending')).toEqual(['Ines', 'Kofi', 'arun', 'Wen']);
    expect(names('r.*', 'ascending')).toEqual(['arun', 'Ines', 'Kofi', 'Wen']);
  });

  it('goes by every other column', () => {
    expect(names('d.*', 'descending')).toEqual(['arun', 'Kofi', 'Ines', 'Wen']);
    expect(names('member', 'ascending')).toEqual(['arun', 'Ines', 'Kofi', 'Wen']);
    expect(names('answers', 'descending')).toEqual(['arun', 'Kofi', 'Ines', 'Wen']);
    expect(names('trained', 'descending')).toEqual(['Wen', 'Ines', 'Kofi', 'arun']);
    expect(names('minutes', 'ascending')).toEqual(['arun', 'Kofi', 'Ines', 'Wen']);
  });

  it('is read from the address, and falls back to the whole set when that asks for what is not there', () => {
    const of = (query: string) => sortOf({ columns }, new URLSearchParams(query));
    expect(of('')).toEqual({ key: 'r.*', direction: 'descending' });
    expect(of('sort=r.dot&dir=up')).toEqual({ key: 'r.dot', direction: 'ascending' });
    expect(of('sort=member')).toEqual({ key: 'member', direction: 'ascending' });
    expect(of('sort=answers&dir=sideways')).toEqual({ key: 'answers', direction: 'descending' });
    expect(of('sort=r.pll&dir=up')).toEqual({ key: 'r.*', direction: 'descending' });
    expect(sortOf({ columns: [] }, new URLSearchParams())).toEqual({ key: 'member', direction: 'ascending' });
  });
});
