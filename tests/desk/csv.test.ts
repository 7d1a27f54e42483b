import { parse } from 'csv-parse/sync';
import { describe, expect, it } from 'vitest';
import { squadCsv } from '#pages/desk/squad/squad-csv.ts';
import { csvOf } from '#renderer/csv.ts';
import type { SquadRow } from '#shared/contracts/desk.ts';

describe('a CSV file', () => {
  it('ends every row with CRLF and quotes only what must be', () => {
    // RFC 4180, section 2, rules 1, 5, 6 and 7.
    expect(
      csvOf([
        ['a', 'b c'],
        [1, null],
        ['x,y', 'say "hi"'],
        ['two\nlines', ''],
      ]),
    ).toBe('a,b c\r\n1,\r\n"x,y","say ""hi"""\r\n"two\nlines",\r\n');
  });

  it('is read back as it was written', () => {
    const rows = [
      ['a,b', '"', 'c\r\nd'],
      ['', ' e ', 'é'],
    ];
    expect(parse(csvOf(rows))).toEqual(rows);
  });

  it('defuses texts that a spreadsheet would run, and leaves numbers alone', () => {
    for (const start of ['=', '+', '-', '@', '\t', '\r']) {
      expect(parse(csvOf([[`${start}1+1`]]))).toEqual([[`'${start}1+1`]]);
    }
    expect(csvOf([[-6, 'a=1']])).toBe('-6,a=1\r\n');
  });
});

describe('the squad as a file', () => {
  const row: SquadRow = {
    memberId: '0193d1a0-0000-7000-8000-000000000001',
    nickname: '=Kofi, "K"',
    role: 'member',
    cells: [
      { figure: { value: 0.9136, low: 0.8, high: 1, answers: 31, few: false, rests: 'here' }, change: -2.04 },
      { figure: null, change: null },
    ],
    answers: 31,
    lastTrained: '2026-11-30',
    minutesPerDay: 4.26,
  };
  it('says who has not begun a set, in place of a figure', () => {
    const figure = { value: 0, low: 0, high: 0, answers: 0, few: true, rests: 'nothing' } as const;
    const begun = { ...row, cells: [{ figure, change: null }, ...row.cells.slice(1)] };
    expect(parse(squadCsv({ columns }, [begun]))[1]?.slice(2, 7)).toEqual(['not begun', '', '', '0', '']);
  });

  const columns = [
    { key: 'pll', name: 'PLL', dealt: null },
    { key: 'oll', name: 'OLL', dealt: null },
  ];

  it('has a head, a row for each member, and nothing for what a member does not answer for', () => {
    const [head, line] = parse(squadCsv({ columns }, [row]));
    expect(head).toHaveLength(2 + 2 * 5 + 3);
    expect(line).toEqual([
      '\'=Kofi, "K"',
      'member',
      '91.4',
      '80',
      '100',
      '31',
      '-2',
      '',
      '',
      '',
      '',
      '',
      '31',
      '2026-11-30',
      '4.3',
    ]);
  });
});
