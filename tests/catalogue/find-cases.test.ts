import { describe, expect, it } from 'vitest';
import { casesOfCatalogue } from '#server/services/catalogue/cases-of-catalogue.ts';
import { filterCases, orderOf, pageOfCases } from '#server/services/catalogue/find-cases.ts';
import type { EditionContent } from '#server/services/catalogue/read-edition.ts';
import { caseSet } from '#shared/lastlayer/index.ts';

const pll = caseSet('pll');
const keyOf = (name: string) => pll.byName(name)?.key ?? '';
const T = "R U R' U' R' F R2 U' R' U' R U R' F'";

const content: EditionContent = {
  setKey: 'pll',
  setName: 'PLL',
  number: 1,
  publishedAt: new Date(0),
  note: '',
  cases: new Map([
    [keyOf('T'), { key: keyOf('T'), name: 'T', group: 'adjacent', algorithms: [{ algorithm: T, note: '' }] }],
  ]),
};
const cases = casesOfCatalogue(pll, content, new Map([[keyOf('F'), 'Felix']]));
const names = (list: readonly { name: string }[]) => list.map(({ name }) => name);

describe('filtering the cases of a set', () => {
  it('takes names, groups and algorithms from the edition, else from the set', () => {
    // 21 PLL cases: common practice.
    expect(cases).toHaveLength(21);
    expect(cases.find(({ name }) => name === 'T')).toMatchObject({ group: 'adjacent', alias: null });
    expect(cases.find(({ name }) => name === 'F')).toMatchObject({ alias: 'Felix', algorithms: [] });
  });

  it('finds by name, alias, number and moves, however they are spaced', () => {
    expect(names(filterCases(cases, { q: 't' }))).toContain('T');
    expect(names(filterCases(cases, { q: 'fel' }))).toEqual(['F']);
    expect(names(filterCases(cases, { q: "RUR'U'R'F" }))).toEqual(['T']);
    expect(names(filterCases(cases, { q: 'R U R′ U′ R′ F' }))).toEqual(['T']);
    // A small r is a wide turn, not this one.
    expect(filterCases(cases, { q: "r U R' U' R' F" })).toEqual([]);
    const seventh = pll.cases[6];
    expect(filterCases(cases, { q: '#7' }).map((one) => one.case)).toEqual([seventh]);
  });

  it('keeps only what every part of the filter lets through', () => {
    // One angle: H, Na and Nb; two: E and Z; the skip is no case here (common practice).
    expect(names(filterCases(cases, { angles: '1' })).sort()).toEqual(['H', 'Na', 'Nb']);
    expect(names(filterCases(cases, { angles: '2' })).sort()).toEqual(['E', 'Z']);
    expect(names(filterCases(cases, { algorithms: 'with' }))).toEqual(['T']);
    expect(filterCases(cases, { algorithms: 'without' })).toHaveLength(20);
    expect(names(filterCases(cases, { group: 'adjacent', angles: '4' }))).toEqual(['T']);
    expect(filterCases(cases, { group: 'adjacent', angles: '1' })).toEqual([]);
  });
});

describe('sorting and paging', () => {
  it('orders by name unless told otherwise, and turns round with a minus', () => {
    const byName = names([...cases].sort(orderOf()));
    expect(byName.slice(0, 3)).toEqual(['Aa', 'Ab', 'E']);
    expect(names([...cases].sort(orderOf('-name')))).toEqual([...byName].reverse());
    expect([...cases].sort(orderOf('number')).map((one) => one.case.number)).toEqual(
      Array.from({ length: 21 }, (_, at) => at + 1),
    );
    // Dealt once in 18: four angles come last when the rarest are first.
    expect([...cases].sort(orderOf('prior')).at(-1)?.case.angles).toBe(4);
  });

  it('goes through all cases once, forwards and back, whatever the order', () => {
    for (const word of ['name', '-prior', 'group', 'angles', '-algorithms', 'number']) {
      const order = orderOf(word);
      const sorted = [...cases].sort(order);
      const seen: string[] = [];
      let page = pageOfCases(sorted, order, { size: 8 });
      const lefts: (string | null)[] = [];
      for (;;) {
        seen.push(...names(page.rows));
        lefts.push(page.previous);
        const after = cases.find((one) => one.case.key === page.next);
        if (!after) break;
        page = pageOfCases(sorted, order, { after, size: 8 });
      }
      expect(seen).toEqual(names(sorted));
      expect(lefts).toHaveLength(3);
      expect(page.from).toBe(17);
      const before = cases.find((one) => one.case.key === page.previous);
      if (!before) throw new Error('The last page of three has one before it.');
      const back = pageOfCases(sorted, order, { before, size: 8 });
      expect(names(back.rows)).toEqual(names(sorted.slice(8, 16)));
    }
  });

  it('keeps the place of a case that the filter has left out', () => {
    const order = orderOf('name');
    const sorted = filterCases(cases, { angles: '1' }).sort(order);
    const after = cases.find(({ name }) => name === 'Ja');
    if (!after) throw new Error('PLL has a Ja.');
    expect(names(pageOfCases(sorted, order, { after, size: 8 }).rows)).toEqual(['Na', 'Nb']);
  });

  it('has an empty page where nothing was found', () => {
    expect(pageOfCases([], orderOf(), { size: 8 })).toEqual({
      rows: [],
      from: 0,
      next: null,
      previous: null,
    });
  });
});
