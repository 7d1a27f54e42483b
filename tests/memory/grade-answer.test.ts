import { describe, expect, it } from 'vitest';
import { defaultLimitMs, type Expectation, gradeAnswer, type RawChoice } from '#shared/memory/index.ts';

const expectation: Expectation = {
  caseKey: 'set.T',
  rightAufs: [1],
  asksAuf: true,
  limitMs: 3000,
  namingLimitMs: 5000,
  lengthened: false,
};
const choice: RawChoice = { named: 'set.T', aufBefore: 1, recognitionMs: 1200, namingMs: 900 };

function grade(over: Partial<RawChoice>, expected: Partial<Expectation> = {}) {
  return gradeAnswer({ ...choice, ...over }, { ...expectation, ...expected });
}

describe('grading', () => {
  it('holds the right name with the right AUF in time', () => {
    expect(grade({})).toEqual({
      outcome: 'held',
      caseRight: true,
      aufRight: true,
      scored: true,
      unscoredReason: null,
      onBoards: true,
    });
  });

  it.each([0, 2, 3, null])('does not hold the right name with AUF %s where U is right', (aufBefore) => {
    expect(grade({ aufBefore })).toMatchObject({ outcome: 'missed', caseRight: true, aufRight: false });
  });

  it('accepts every right AUF of a symmetric case and no other', () => {
    const twoWays = [0, 1, 2, 3].map((aufBefore) => grade({ aufBefore }, { rightAufs: [1, 3] }).outcome);
    expect(twoWays).toEqual(['missed', 'held', 'missed', 'held']);
    const anyWay = [0, 1, 2, 3].map((aufBefore) => grade({ aufBefore }, { rightAufs: [0, 1, 2, 3] }).outcome);
    expect(anyWay).toEqual(['held', 'held', 'held', 'held']);
  });

  it('leaves the AUF alone where it is not asked', () => {
    expect(grade({ aufBefore: null }, { asksAuf: false })).toMatchObject({ outcome: 'held', aufRight: null });
    expect(grade({ aufBefore: 2 }, { asksAuf: false, rightAufs: [] })).toMatchObject({
      outcome: 'held',
      aufRight: null,
    });
  });

  it('says nothing of the AUF when the case is wrong', () => {
    expect(grade({ named: 'set.Ja' })).toMatchObject({ outcome: 'missed', caseRight: false, aufRight: null });
  });

  it('takes “solved” as an answer: right for the solved class, wrong for a case', () => {
    const skip = { caseKey: 'set.skip', skip: true, rightAufs: [] };
    expect(grade({ named: 'solved', aufBefore: null }, skip)).toMatchObject({
      outcome: 'held',
      caseRight: true,
      aufRight: null,
    });
    expect(grade({ named: 'set.T' }, skip)).toMatchObject({ outcome: 'missed', caseRight: false });
    expect(grade({ named: 'solved', aufBefore: null })).toMatchObject({
      outcome: 'missed',
      caseRight: false,
    });
  });

  it('calls late what is right but over the limit; the limit itself is in time', () => {
    expect(grade({ recognitionMs: 3000 }).outcome).toBe('held');
    expect(grade({ recognitionMs: 3001 })).toMatchObject({
      outcome: 'late',
      caseRight: true,
      aufRight: true,
    });
    expect(grade({ recognitionMs: 9000, aufBefore: 0 }).outcome).toBe('missed');
    expect(grade({ recognitionMs: 9000, named: 'set.Ja' }).outcome).toBe('missed');
  });

  it.each(['unrecognised', 'lost'])('counts “%s” as missed', (named) => {
    expect(grade({ named, aufBefore: null, namingMs: null })).toMatchObject({
      outcome: 'missed',
      caseRight: false,
      aufRight: null,
      scored: true,
    });
  });

  it('keeps what was left out of the count', () => {
    expect(grade({ named: 'left', aufBefore: null, recognitionMs: null, namingMs: null })).toEqual({
      outcome: 'left',
      caseRight: false,
      aufRight: null,
      scored: false,
      unscoredReason: 'left',
      onBoards: false,
    });
  });

  it('does not score what took more than five seconds to name, right or wrong', () => {
    expect(grade({ namingMs: 5000 }).scored).toBe(true);
    const slow = { scored: false, unscoredReason: 'slow naming', onBoards: false };
    expect(grade({ namingMs: 5001 })).toMatchObject({ ...slow, outcome: 'held' });
    expect(grade({ namingMs: 5001, named: 'set.Ja' })).toMatchObject({ ...slow, outcome: 'missed' });
  });

  it('scores answers under lengthened limits but keeps them off boards', () => {
    const lengthened = { lengthened: true, limitMs: 6000, namingLimitMs: 10_000 };
    expect(grade({ recognitionMs: 4500, namingMs: 7000 }, lengthened)).toMatchObject({
      outcome: 'held',
      scored: true,
      unscoredReason: null,
      onBoards: false,
    });
  });

  it('refuses what cannot be judged', () => {
    expect(() => grade({ recognitionMs: null })).toThrow('recognition time');
    expect(() => grade({ recognitionMs: -1 })).toThrow('below nothing');
    expect(() => grade({ namingMs: Number.NaN })).toThrow('below nothing');
    expect(() => grade({ aufBefore: 4 })).toThrow('quarter turns');
    expect(() => grade({ aufBefore: 0.5 })).toThrow('quarter turns');
    expect(() => grade({}, { rightAufs: [] })).toThrow('at least one right one');
    expect(() => grade({}, { limitMs: 0 })).toThrow('limit');
  });

  it('starts OLL and PLL with 3 s and larger sets with 6 s (the product’s own choice)', () => {
    expect([21, 57, 331, 493].map(defaultLimitMs)).toEqual([3000, 3000, 6000, 6000]);
  });
});
