import { describe, expect, it } from 'vitest';
import type { EditionContent } from '#server/services/catalogue/read-edition.ts';
import { type Answering, costliest, lossesOf } from '#server/services/squad/lost-cases.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { type CaseMemory, recall } from '#shared/memory/index.ts';
import { dealtRecall } from '#shared/standing/index.ts';

const pll = caseSet('pll');
const content: EditionContent = {
  setKey: 'pll',
  setName: 'PLL',
  number: 1,
  publishedAt: new Date(0),
  note: '',
  cases: new Map(pll.cases.map((c) => [c.key, { key: c.key, name: c.name, group: c.group, algorithms: [] }])),
};

function memory(stability: number): CaseMemory {
  return { stability, difficulty: 5, firstDay: 0, lastDay: 100, answers: 3, lapses: 0, lastId: '' };
}

/** Two members: one knows every other case, one knows all of them less well. */
const squad: Answering[] = [
  {
    nickname: 'Arun',
    memory: new Map(pll.cases.filter((_, k) => k % 2 === 0).map((c, k) => [c.key, memory(5 + k)])),
    shift: 0.3,
    day: 110,
  },
  {
    nickname: 'Wen',
    memory: new Map(pll.cases.map((c, k) => [c.key, memory(2 + k)])),
    shift: -0.2,
    day: 108,
  },
];

describe('what a squad loses', () => {
  it('adds up to one less the mean dealt recall, over the solves that do not skip', () => {
    const losses = lossesOf(pll, content, squad);
    const thetas = squad.map(({ memory: known, shift, day }) => {
      const cases = pll.cases.map((c) => {
        const own = known.get(c.key);
        return { prior: c.weight, recall: own ? recall(own, day + 1) : null };
      });
      return dealtRecall(cases, { b: shift, information: 4 }).theta;
    });
    const mean = thetas.reduce((sum, theta) => sum + theta, 0) / thetas.length;
    const skips = pll.skip.weight / pll.total;
    expect(losses.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo((1 - mean) * (1 - skips), 12);
  });

  it('tells how much of it is unmet, and by whom', () => {
    const losses = lossesOf(pll, content, squad);
    const odd = losses.find((loss) => loss.case.key === pll.cases[1]?.key);
    const even = losses.find((loss) => loss.case.key === pll.cases[0]?.key);
    expect(odd).toMatchObject({ unmet: ['Arun'], members: 2 });
    expect(odd?.unmetShare).toBeCloseTo((pll.cases[1]?.weight ?? 0) / pll.total / 2, 12);
    expect(even).toMatchObject({ unmet: [], unmetShare: 0 });
  });

  it('puts the costliest first, and is nothing when nobody answers for the set', () => {
    const losses = lossesOf(pll, content, squad);
    const shares = costliest(losses, 5).map(({ share }) => share);
    expect(shares).toEqual([...losses.map(({ share }) => share)].sort((a, b) => b - a).slice(0, 5));
    expect(lossesOf(pll, content, [])).toEqual([]);
  });
});
