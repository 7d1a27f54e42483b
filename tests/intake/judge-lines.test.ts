import { describe, expect, it } from 'vitest';
import { blocking, judgeLines, type KeptLine } from '#server/services/intake/judge-lines.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { KNOWN } from '#tests/support/intake.ts';

const pll = caseSet('pll');

function kept(line: number, caseName: string, algorithm: string, more: Partial<KeptLine> = {}): KeptLine {
  return {
    line,
    caseName,
    algorithm,
    group: '',
    note: '',
    decision: 'none',
    editedCaseName: null,
    editedAlgorithm: null,
    ...more,
  };
}

const standings = (...lines: KeptLine[]) => judgeLines(pll, lines).map(({ standing }) => standing);

describe('where a line stands', () => {
  it('goes in when it agrees, and under any usual form of the name', () => {
    expect(standings(kept(2, 'T', KNOWN.T), kept(3, 'PLL F-perm', KNOWN.F))).toEqual(['fine', 'fine']);
  });

  it('is to decide when it solves another case, until it is taken', () => {
    expect(standings(kept(2, 'Ra', KNOWN.F))).toEqual(['decide']);
    const [taken] = judgeLines(pll, [kept(2, 'Ra', KNOWN.F, { decision: 'take' })]);
    expect(taken).toMatchObject({ standing: 'fine', goesTo: { name: 'F' } });
  });

  it('cannot go in broken, unreadable, empty, outside the set, or for the skip', () => {
    expect(
      standings(
        kept(2, 'T', 'R U R'),
        kept(3, 'T', "R U'' R'"),
        kept(4, 'T', ''),
        kept(5, '', KNOWN.T),
        // A well-known OLL algorithm: it turns corners, which PLL finds done.
        kept(6, 'T', "R U R' U R U2 R'"),
        kept(7, 'T', "U U'"),
        kept(8, 'skip', 'U'),
      ),
    ).toEqual(['cannot', 'cannot', 'cannot', 'cannot', 'cannot', 'cannot', 'cannot']);
  });

  it('takes a decision only where it means something', () => {
    const [agreeing, broken] = judgeLines(pll, [
      kept(2, 'T', KNOWN.T, { decision: 'take' }),
      kept(3, 'F', 'R U', { decision: 'take' }),
    ]);
    expect(agreeing).toMatchObject({ decision: 'none', standing: 'fine' });
    expect(broken).toMatchObject({ decision: 'none', standing: 'cannot' });
  });

  it('is read with what was typed over the file', () => {
    const [line] = judgeLines(pll, [kept(2, 'T', 'R U', { editedAlgorithm: KNOWN.T })]);
    expect(line).toMatchObject({ standing: 'fine', goesTo: { name: 'T' } });
  });
});

describe('the same algorithm twice', () => {
  const twice = [kept(2, 'T', KNOWN.T), kept(5, 'T', KNOWN.T.replaceAll(' ', ''))];

  it('is to decide at the later line', () => {
    const [, later] = judgeLines(pll, twice);
    expect(later).toMatchObject({ standing: 'decide', read: { finding: 'duplicate', sameAs: 2 } });
  });

  it('is settled by dropping either', () => {
    expect(standings(twice[0]!, { ...twice[1]!, decision: 'drop' })).toEqual(['fine', 'out']);
    expect(standings({ ...twice[0]!, decision: 'drop' }, twice[1]!)).toEqual(['out', 'fine']);
  });

  it('is seen at a dropped line too, so that it says why it was dropped', () => {
    const [first] = judgeLines(pll, [{ ...twice[0]!, decision: 'drop' }, twice[1]!]);
    expect(first?.read).toMatchObject({ finding: 'duplicate', sameAs: 5 });
  });
});

it('keeps the order of the file and counts what is left to settle', () => {
  const judged = judgeLines(pll, [
    kept(2, 'T', KNOWN.T, { decision: 'drop' }),
    kept(3, 'Ra', KNOWN.F),
    kept(4, 'H', 'nonsense'),
    kept(5, 'Y', KNOWN.Y),
  ]);
  expect(judged.map((line) => line.kept.line)).toEqual([2, 3, 4, 5]);
  expect(blocking(judged)).toBe(2);
});
