import { expect, it } from 'vitest';
import type { EditionCase, EditionContent } from '#server/services/catalogue/read-edition.ts';
import { judgeLines } from '#server/services/intake/judge-lines.ts';
import { mergeEdition } from '#server/services/intake/merge-edition.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { KNOWN } from '#tests/support/intake.ts';

const pll = caseSet('pll');
const key = (name: string) => pll.byName(name)!.key;

function edition(...cases: EditionCase[]): EditionContent {
  return {
    setKey: 'pll',
    setName: 'PLL',
    number: 1,
    publishedAt: new Date(0),
    note: '',
    cases: new Map(cases.map((c) => [c.key, c])),
  };
}

function judged(...lines: { case: string; algorithm: string; group?: string; note?: string; take?: true }[]) {
  return judgeLines(
    pll,
    lines.map(({ case: caseName, algorithm, group = '', note = '', take }, at) => ({
      line: at + 2,
      caseName,
      algorithm,
      group,
      note,
      decision: take ? ('take' as const) : ('none' as const),
      editedCaseName: null,
      editedAlgorithm: null,
    })),
  );
}

const OLD_H: EditionCase = {
  key: key('H'),
  name: 'H',
  group: 'edges only',
  algorithms: [
    { algorithm: "M2 U' M2 U2 M2 U' M2", note: 'left' },
    { algorithm: KNOWN.H, note: 'right' },
  ],
};
const OLD_Y: EditionCase = {
  key: key('Y'),
  name: 'Y',
  group: 'x',
  algorithms: [{ algorithm: KNOWN.Y, note: '' }],
};

it('puts the file first, then what the newest edition has besides, each once', () => {
  const { cases, effect } = mergeEdition(
    pll,
    judged({ case: 'H', algorithm: '(M2 U M2) U2 (M2 U M2)' }),
    edition(OLD_H, OLD_Y),
  );
  expect(cases.find((c) => c.name === 'H')?.algorithms).toEqual([
    { algorithm: KNOWN.H, note: 'right' },
    { algorithm: "M2 U' M2 U2 M2 U' M2", note: 'left' },
  ]);
  expect(cases.find((c) => c.name === 'Y')).toEqual(OLD_Y);
  expect(effect).toEqual({ newCases: 0, newAlgorithms: 0, keptCases: 1, alreadyThere: 1 });
});

it('takes names from the engine, and groups from the file, the newest edition, the engine, in that order', () => {
  const { cases, effect } = mergeEdition(
    pll,
    judged(
      { case: 'T-perm', algorithm: KNOWN.T, group: 'mine' },
      { case: 'Y', algorithm: KNOWN.Y },
      { case: 'H', algorithm: KNOWN.H },
    ),
    edition(OLD_Y),
  );
  expect(cases.map(({ name, group }) => [name, group]).sort()).toEqual([
    ['H', pll.byName('H')!.group],
    ['T', 'mine'],
    ['Y', 'x'],
  ]);
  expect(effect).toEqual({ newCases: 2, newAlgorithms: 2, keptCases: 0, alreadyThere: 1 });
});

it('files a taken line under the case it solves, whose group it says nothing of', () => {
  const { cases } = mergeEdition(
    pll,
    judged({ case: 'Ra', algorithm: KNOWN.F, group: 'of Ra', take: true }),
    null,
  );
  expect(cases).toEqual([
    {
      key: key('F'),
      name: 'F',
      group: pll.byName('F')!.group,
      algorithms: [{ algorithm: KNOWN.F, note: '' }],
    },
  ]);
});

it('stores plain moves, so that nobody needs more than a reader of moves', () => {
  const { cases } = mergeEdition(pll, judged({ case: 'H', algorithm: "(M2 U)1 M2 U2 (M2’ U) M2'" }), null);
  expect(cases[0]?.algorithms).toEqual([{ algorithm: KNOWN.H, note: '' }]);
});

it('leaves out lines that are dropped or not settled', () => {
  expect(mergeEdition(pll, judged({ case: 'Ra', algorithm: KNOWN.F }), null).cases).toEqual([]);
});
