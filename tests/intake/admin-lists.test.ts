import { describe, expect, it } from 'vitest';
import { wrongPart } from '#pages/admin/intake/line-edit.tsx';
import { isShown, SHOWS, showFrom } from '#pages/admin/intake/line-filter.ts';
import { reportCsv } from '#pages/admin/intake/report-csv.ts';
import { stepDone } from '#pages/admin/intake/step-done.ts';
import { editionCsv } from '#pages/catalogue/edition/edition-csv.ts';
import {
  type CaseRow,
  filterCases,
  sortCases,
  sortFrom,
  sortWord,
} from '#pages/catalogue/edition/sort-cases.ts';
import { pageOf } from '#renderer/page-links.tsx';
import { queryHref } from '#renderer/query-href.ts';
import type { DraftLine } from '#shared/contracts/intake.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { intakeText } from '#shared/text/intake.ts';
import { numberText } from '#shared/text/numbers.ts';

function line(number: number, more: Partial<DraftLine> = {}): DraftLine {
  return {
    line: number,
    caseName: 'T',
    algorithm: 'R U',
    group: '',
    note: '',
    original: null,
    finding: 'agrees',
    column: null,
    token: null,
    says: 'Agrees',
    hint: '4 angles',
    solves: 'T',
    prior: { weight: 16, total: 288 },
    angles: 4,
    picture: null,
    decision: 'none',
    standing: 'fine',
    ...more,
  };
}

function row(name: string, group: string, weight: number, ...algorithms: string[]): CaseRow {
  return {
    key: name,
    name,
    group,
    picture: {
      stickers: { top: 'UUUUUUUUU', front: 'FFF', right: 'RRR', back: 'BBB', left: 'LLL' },
      colouring: 0,
    },
    prior: { weight, total: 288 },
    angles: 4,
    algorithms: algorithms.map((algorithm) => ({ algorithm, note: '' })),
  };
}

describe('lines shown', () => {
  const standings = ['fine', 'decide', 'cannot', 'out'] as const;
  const shownBy = (show: (typeof SHOWS)[number]) =>
    standings.filter((standing) => isShown(line(2, { standing }), show));

  it('shows by where they stand', () => {
    expect(SHOWS.map(shownBy)).toEqual([[...standings], ['decide', 'cannot'], ['cannot'], ['fine'], ['out']]);
  });

  it('shows all for a word it does not know', () => {
    expect([showFrom(null), showFrom('nonsense'), showFrom('settle')]).toEqual(['all', 'all', 'settle']);
  });
});

describe('the wrong part of an algorithm', () => {
  it('is the whole token around the first wrong character', () => {
    // Column 5 is the second prime of the token that begins at 3.
    expect(wrongPart({ algorithm: "R U'' R'", column: 5, token: "U''" })).toEqual({ column: 3, length: 3 });
    expect(wrongPart({ algorithm: 'R Q R', column: 3, token: 'Q' })).toEqual({ column: 3, length: 1 });
  });

  it('is nothing where nothing is wrong', () => {
    expect(wrongPart({ algorithm: 'R', column: null, token: null })).toBeUndefined();
    expect(wrongPart({ algorithm: 'R', column: 2, token: '' })).toBeUndefined();
  });
});

describe('the report', () => {
  it('is RFC 4180 with formula cells made harmless', () => {
    const csv = reportCsv([
      line(2),
      line(3, { caseName: '=1+1', says: 'Solves F, the file says "=1+1"', hint: '', standing: 'cannot' }),
      line(4, { caseName: 'Ra', group: 'corners', says: 'Solves T, the file says Ra', decision: 'take' }),
    ]);
    expect(csv.split('\r\n')).toEqual([
      'line,case,algorithm,group,solves,finding,column,says,standing,note',
      '2,T,R U,,T,agrees,,Agrees; 4 angles,goes in,',
      `3,'=1+1,R U,,T,agrees,,"Solves F, the file says ""=1+1""",cannot go in,`,
      '4,Ra,R U,corners,T,agrees,,Taken as T,goes in,',
      '',
    ]);
  });
});

describe('cases of an edition', () => {
  const cases = [row('10', 'dot', 4, "R U'"), row('2', 'fish', 16, 'F', 'L'), row('Ab', 'dot', 16, "U' R")];
  const names = (rows: CaseRow[]) => rows.map(({ name }) => name);

  it('sorts names as people count, and by other columns with names in order', () => {
    expect(names(sortCases(cases, sortFrom(null)))).toEqual(['2', '10', 'Ab']);
    expect(names(sortCases(cases, sortFrom('-prior')))).toEqual(['2', 'Ab', '10']);
    expect(names(sortCases(cases, sortFrom('group')))).toEqual(['10', 'Ab', '2']);
    expect(names(sortCases(cases, sortFrom('-algorithms')))[0]).toBe('2');
  });

  it('keeps a sort in the address', () => {
    for (const word of ['group', '-prior', '-name']) expect(sortWord(sortFrom(word))).toBe(word);
    expect(sortWord(sortFrom('constructor'))).toBeNull();
  });

  it('finds names, groups and algorithms, whichever prime is typed', () => {
    expect(names(filterCases(cases, ' DOT '))).toEqual(['10', 'Ab']);
    expect(names(filterCases(cases, 'U′ R'))).toEqual(['Ab']);
    expect(names(filterCases(cases, ''))).toHaveLength(3);
    expect(filterCases(cases, 'nowhere')).toEqual([]);
  });

  it('goes out as a case file', () => {
    expect(editionCsv([row('T', 'adjacent corners', 16, 'R U', 'U R')])).toBe(
      'case,algorithm,group,note\r\nT,R U,adjacent corners,\r\nT,U R,adjacent corners,\r\n',
    );
  });
});

describe('long lists', () => {
  const rows = Array.from({ length: 450 }, (_, at) => at);

  it('come in pages, and a page beyond the end is the last', () => {
    expect(pageOf(rows, 200, 1)).toMatchObject({ page: 1, of: 3 });
    expect(pageOf(rows, 200, 3).rows).toHaveLength(50);
    expect(pageOf(rows, 200, 99).page).toBe(3);
    expect(pageOf(rows, 200, Number.NaN).page).toBe(1);
    expect(pageOf([], 200, 1)).toEqual({ rows: [], page: 1, of: 1 });
  });

  it('keep the rest of the address', () => {
    const now = new URLSearchParams('show=settle&page=2');
    expect(queryHref(now, '/x', { page: '3' })).toBe('/x?show=settle&page=3');
    expect(queryHref(now, '/x', { show: null, page: null })).toBe('/x');
  });
});

it('says priors and aspects in words', () => {
  expect(numberText.oneIn({ weight: 16, total: 288 })).toBe('1 in 18');
  // 4/27 of OCLL's states: common practice.
  expect(numberText.oneIn({ weight: 4, total: 27 })).toBe('1 in 6.75');
  expect(numberText.fraction({ weight: 16, total: 288 })).toBe('1/18');
  expect(numberText.fraction({ weight: 4, total: 27 })).toBe('4/27');
  // Lowest terms by the greatest common divisors, 4 and 16 (derived by hand).
  expect(numberText.fraction({ weight: 76, total: 77_760 })).toBe('19/19,440');
  expect(numberText.fraction({ weight: 16, total: 1296 })).toBe('1/81');
  const { aspects } = catalogueText.sets;
  expect(
    [['co', 'eo'], ['co', 'cp'], ['co', 'eo', 'cp'], ['co', 'eo', 'cp', 'ep'], ['ep']].map(aspects),
  ).toEqual([
    'orientation of corners and edges',
    'orientation and permutation of corners',
    'orientation of corners and edges, permutation of corners',
    'everything',
    'permutation of edges',
  ]);
});

describe('what is said after a step', () => {
  it('tells taken, dropped, changed and taken back apart', () => {
    const original = { caseName: 'T', algorithm: 'R' };
    expect(stepDone({ decision: 'drop', original })).toBe('drop');
    expect(stepDone({ decision: 'take', original: null })).toBe('take');
    expect(stepDone({ decision: 'none', original })).toBe('edit');
    expect(stepDone({ decision: 'none', original: null })).toBe('none');
    expect(intakeText.draft.settled(5, 'drop', 0)).toBe('Line 5 is dropped. Nothing is left to settle.');
  });
});
