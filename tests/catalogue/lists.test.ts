import { describe, expect, it } from 'vitest';
import { casesCsv } from '#pages/catalogue/set/cases-csv.tsx';
import { filterInput, setInput } from '#pages/catalogue/set/set-input.ts';
import { setsCsv } from '#pages/catalogue/sets/sets-csv.ts';
import { type SetRow, sortSets } from '#pages/catalogue/sets/sort-sets.ts';
import { lookOf, sheetInput } from '#pages/catalogue/sheet/sheet-input.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';

const set = (name: string, cases: number, publishedAt?: number): SetRow => ({
  setKey: name.toLowerCase(),
  name,
  entry: 'any',
  mix: [],
  toldApart: ['co'],
  solved: ['co'],
  cases,
  ofClub: false,
  parent: null,
  editions:
    publishedAt === undefined ? [] : [{ number: 1, publishedAt, note: '', cases, algorithms: cases + 1 }],
});

describe('the list of sets', () => {
  const sets = [set('OLL', 57, 5), set('PLL', 21, 9), set('1LLL', 3915)];
  const names = (word: string | null) => sortSets(sets, word).map(({ name }) => name);

  it('stays as the trade has it until another order is asked for', () => {
    expect(names(null)).toEqual(['OLL', 'PLL', '1LLL']);
    expect(names('colour')).toEqual(['OLL', 'PLL', '1LLL']);
    expect(names('set')).toEqual(['1LLL', 'OLL', 'PLL']);
    expect(names('cases')).toEqual(['PLL', 'OLL', '1LLL']);
    expect(names('-editions')).toEqual(['PLL', 'OLL', '1LLL']);
  });

  it('goes into a file with the size of the newest edition', () => {
    const [head, first, , last] = setsCsv(sets).split('\r\n');
    expect(head?.split(',')).toHaveLength(8);
    expect(first).toBe('OLL,any last layer,orientation of corners,orientation of corners,57,1,57,58');
    expect(last).toMatch(/3915,,,$/);
  });

  it('says of a mix how much of it comes by which entry', () => {
    const { entryOrMix } = catalogueText.sets;
    expect(entryOrMix('eo', [])).toBe('edges oriented');
    expect(
      entryOrMix('any', [
        { entry: 'eo', parts: 2 },
        { entry: 'any', parts: 3 },
      ]),
    ).toBe('2 of 5 edges oriented, 3 of 5 any last layer');
  });
});

describe('what an address asks for', () => {
  it('passes on what makes sense and forgets the rest', () => {
    expect(
      filterInput('pll', { group: 'x', angles: '3', algorithms: 'some', q: ' ', sort: 'colour' }),
    ).toEqual({
      setKey: 'pll',
      group: 'x',
    });
    expect(
      filterInput('pll', { edition: '2', angles: '4', algorithms: 'with', q: ' R U ', sort: '-prior' }),
    ).toEqual({
      setKey: 'pll',
      edition: 2,
      angles: '4',
      algorithms: 'with',
      q: 'R U',
      sort: '-prior',
    });
    expect(setInput('pll', { after: 'a', before: 'b' })).toEqual({ setKey: 'pll', after: 'a' });
    expect(setInput('pll', { before: 'b', edition: '0' })).toEqual({ setKey: 'pll', before: 'b' });
  });

  it('tells how a sheet is to look', () => {
    expect(lookOf({})).toEqual({ first: false, colours: false });
    expect(lookOf({ algorithms: 'first', shades: 'colours' })).toEqual({ first: true, colours: true });
    expect(sheetInput('pll', { edition: '3', group: 'dot' })).toEqual({
      setKey: 'pll',
      edition: 3,
      group: 'dot',
    });
  });
});

it('puts cases into a file with exact priors and all algorithms', () => {
  const csv = casesCsv({
    setKey: 'pll',
    edition: 1,
    rows: [
      {
        key: 'k',
        number: 7,
        name: 'T',
        alias: null,
        group: '=1+1',
        prior: { weight: 16, total: 288 },
        angles: 4,
        algorithms: ['R U', "F R'"],
      },
    ],
  });
  // What a spreadsheet would run is made harmless.
  expect(csv.split('\r\n')[1]).toBe("7,T,,'=1+1,4,16,288,R U; F R'");
});

describe('words of a case', () => {
  it('gives the prior in lowest terms and as one in how many solves', () => {
    // 16/288 and 4/27: derived by hand.
    expect(catalogueCaseText.fraction({ weight: 16, total: 288 })).toBe('1/18');
    expect(catalogueCaseText.fraction({ weight: 24, total: 162 })).toBe('4/27');
    expect(catalogueCaseText.solves({ weight: 4, total: 27 })).toBe('6.75 solves');
  });

  it('says under which turns a case stays as it is', () => {
    const { turns } = catalogueCaseText.symmetry;
    expect(turns([{ before: 0, after: 0 }])).toBe('');
    expect(
      turns([
        { before: 0, after: 0 },
        { before: 2, after: 2 },
      ]),
    ).toBe('It stays as it is under U2 before with U2 after.');
    // Orientation alone: a turn after changes nothing that is seen, so it is not said.
    const afters = [0, 1, 2, 3];
    expect(turns(afters.map((after) => ({ before: 0, after })))).toBe('');
    expect(turns([0, 2].flatMap((before) => afters.map((after) => ({ before, after }))))).toBe(
      'It stays as it is under U2 before.',
    );
  });

  it('says which AUFs are right for a view', () => {
    const { auf } = catalogueCaseText.views;
    expect(auf([0])).toBe('no AUF');
    expect(auf([1, 3])).toBe('AUF U or U′');
    expect(auf([0, 1, 2, 3])).toBe('AUF any');
  });
});
