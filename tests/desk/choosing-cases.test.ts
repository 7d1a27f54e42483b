import { describe, expect, it } from 'vitest';
import { readDefinition, sharesOf, wholeOf, writeDefinition } from '#pages/catalogue/define/definition.ts';
import { stillWrong, wrongShares } from '#pages/catalogue/define/wrong.ts';
import {
  type CaseChoice,
  dealtShare,
  groupCases,
  groupingsOf,
  withCases,
} from '#pages/catalogue/subset/choosing.ts';

const choice = (key: string, words: Partial<CaseChoice>): CaseChoice => ({
  key,
  name: key,
  alias: null,
  group: '',
  corners: null,
  edges: null,
  swap: null,
  weight: 4,
  picture: {
    stickers: { top: 'U'.repeat(9), front: 'FFF', right: 'RRR', back: 'BBB', left: 'LLL' },
    colouring: 0,
  },
  known: true,
  ...words,
});

const CASES = [
  choice('a', { group: 'T 10', corners: 'T' }),
  choice('b', { group: 'T 2', corners: 'T', weight: 8 }),
  choice('c', { group: '', corners: 'U' }),
];

describe('cases to choose from', () => {
  it('are grouped by what tells them apart, in the order of names, those without a group last', () => {
    expect(groupingsOf(CASES)).toEqual(['group', 'corners']);
    expect(groupCases(CASES, 'group').map(({ name }) => name)).toEqual(['T 2', 'T 10', '']);
    expect(groupCases(CASES, 'corners').map(({ cases }) => cases.map(({ key }) => key))).toEqual([
      ['a', 'b'],
      ['c'],
    ]);
    expect(groupCases(CASES, null)).toHaveLength(1);
  });

  it('stand in the order of their names, as people count', () => {
    const cases = ['T 10', 'T 2', 'T 1'].map((name) => choice(name, { group: 'T' }));
    expect(groupCases(cases, 'group')[0]?.cases.map(({ name }) => name)).toEqual(['T 1', 'T 2', 'T 10']);
  });

  it('are taken and left as a group, the others staying as they are', () => {
    const chosen = withCases(new Set(['c']), CASES.slice(0, 2), true);
    expect([...chosen].sort()).toEqual(['a', 'b', 'c']);
    expect([...withCases(chosen, CASES.slice(1, 2), false)].sort()).toEqual(['a', 'c']);
  });

  it('say which share of the step’s solves they are', () => {
    const view = { setKey: 'x', name: 'X', total: 64, cases: CASES };
    // (4 + 8) / 64, the weights above.
    expect(dealtShare(view, new Set(['a', 'b']))).toBe(0.1875);
    expect(dealtShare(view, new Set())).toBe(0);
  });
});

describe('a definition in an address', () => {
  it('comes back as it was written', () => {
    const definition = readDefinition({ entries: 'any:3,eo:2', toldApart: 'co,eo', solved: 'co,eo' });
    expect(writeDefinition(definition)).toEqual({
      entries: 'any:3,eo:2',
      toldApart: 'co,eo',
      solved: 'co,eo',
    });
    expect(sharesOf(definition)).toEqual([
      { entry: 'any', parts: 3 },
      { entry: 'eo', parts: 2 },
    ]);
  });

  it('leaves out words that are none, and counts a share that is none yet as 1', () => {
    const definition = readDefinition({ entries: 'f2l:3,eo:,co:0', toldApart: 'colour,ep', solved: '' });
    expect(definition.toldApart).toEqual(['ep']);
    expect(sharesOf(definition)).toEqual([
      { entry: 'eo', parts: 1 },
      { entry: 'co', parts: 1 },
    ]);
  });
});

describe('what is wrong with a definition', () => {
  const typed = (...parts: string[]) => ({
    entries: parts.map((one, at) => ({ entry: (['any', 'eo', 'co'] as const)[at] ?? 'any', parts: one })),
    toldApart: [],
    solved: [],
  });

  it('is each share that is no number from 1 to 1000; there is no whole then', () => {
    expect(wrongShares(typed('40', 'x', '0')).map(({ fieldId }) => fieldId)).toEqual([
      'define-parts-1',
      'define-parts-2',
    ]);
    expect(wrongShares(typed('x'))).toEqual([]);
    expect(wholeOf(typed('40', 'x').entries)).toBeNull();
    expect(wholeOf(typed('40', '60').entries)).toBe(100);
  });

  it('goes when it is mended, and no complaint comes before one was made', () => {
    const name = { fieldId: 'define-name', message: 'Taken.' };
    const told = { fieldId: 'define-told', message: 'It is that set.' };
    const shares = wrongShares(typed('x', '2'));
    expect(stillWrong([name, told, ...shares], typed('x', '3'))).toEqual([name, ...shares]);
    expect(stillWrong([name, ...shares], typed('1', '3'))).toEqual([name]);
    expect(stillWrong([told], typed('x', '3'))).toEqual([]);
  });
});
