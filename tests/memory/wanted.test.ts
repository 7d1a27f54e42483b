import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type CaseMemory, caseStateName, dueDay, recall, wantedRecall } from '#shared/memory/index.ts';

const memory: CaseMemory = {
  stability: 10,
  difficulty: 5,
  firstDay: 100,
  lastDay: 110,
  answers: 4,
  lapses: 1,
  lastId: 'a',
};

describe('wanted recall', () => {
  it('follows the square-root law on the mixed prior', () => {
    // Derived: p′ = .8·.01 + .2/100 = .01, N·p′ = 1, so 1 − β.
    expect(wantedRecall(0.01, 100, 0.07)).toBeCloseTo(0.93, 12);
    // Derived: p′ = .8·.04 + .002 = .034, √3.4 = 1.843909.
    expect(wantedRecall(0.04, 100, 0.07)).toBeCloseTo(1 - 0.07 / 1.843909, 6);
  });

  it('stays within .70 and .98', () => {
    expect(wantedRecall(0.5, 100, 0)).toBe(0.98);
    expect(wantedRecall(0, 100, 5)).toBe(0.7);
  });

  it('never falls as the prior rises', () => {
    const shares = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(shares, shares, fc.double({ min: 0, max: 2, noNaN: true }), (a, b, beta) => {
        const [low, high] = a < b ? [a, b] : [b, a];
        expect(wantedRecall(low, 50, beta)).toBeLessThanOrEqual(wantedRecall(high, 50, beta));
      }),
    );
  });
});

describe('state of a case', () => {
  it('is unmet without an answer and settling for three training days', () => {
    expect(caseStateName(null, 5, 0.9)).toBe('unmet');
    const fresh = { ...memory, firstDay: 110 };
    expect([110, 111, 112, 113].map((day) => caseStateName(fresh, day, 0.9))).toEqual([
      'settling',
      'settling',
      'settling',
      'holding',
    ]);
  });

  it('holds above what is wanted and slips at it', () => {
    // Stability is the number of days to recall .9, so day 120 is exactly there.
    expect(recall(memory, 120)).toBe(0.9);
    expect(caseStateName(memory, 119, 0.9)).toBe('holding');
    expect(caseStateName(memory, 120, 0.9)).toBe('slipping');
    expect(recall(memory, 110)).toBe(1);
    expect(recall(memory, 90)).toBe(1);
  });

  it('is due on the first day at or below what is wanted', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 400, noNaN: true }),
        fc.double({ min: 0.7, max: 0.98, noNaN: true }),
        (stability, wanted) => {
          const due = dueDay({ ...memory, stability }, wanted);
          expect(due).toBeGreaterThan(memory.lastDay);
          expect(recall({ ...memory, stability }, due)).toBeLessThanOrEqual(wanted + 1e-8);
          if (due > memory.lastDay + 1) {
            expect(recall({ ...memory, stability }, due - 1)).toBeGreaterThan(wanted - 1e-8);
          }
        },
      ),
    );
    expect(dueDay(memory, 0.9)).toBe(120);
  });
});
