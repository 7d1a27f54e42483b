import { describe, expect, it } from 'vitest';
import { burnsideSum, gatheredTerms } from '#pages/ledger/burnside-sum.ts';
import { ledgerOf } from '#shared/lastlayer/index.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { numberText } from '#shared/text/numbers.ts';

const { fraction, mixed, whole, formula, powers, three, symmetry } = ledgerText;

describe('numbers of the Ledger', () => {
  it('set off thousands and nothing else', () => {
    expect([0, 999, 1000, 62_208, 1_234_567].map(whole)).toEqual([
      '0',
      '999',
      '1,000',
      '62,208',
      '1,234,567',
    ]);
  });

  it('are exact as fractions, and as mixed numbers where they are made of quarters', () => {
    expect(fraction({ numerator: 1, denominator: 15_552 })).toBe('1/15,552');
    expect(fraction({ numerator: 0, denominator: 1 })).toBe('0');
    expect(mixed({ numerator: 81, denominator: 2 })).toBe('40½');
    expect(mixed({ numerator: 27, denominator: 4 })).toBe('6¾');
    expect(mixed({ numerator: 1, denominator: 4 })).toBe('¼');
    expect(mixed({ numerator: 15_552, denominator: 1 })).toBe('15,552');
    // 270/19 is 14.21…, and 59.98 rounds up past its whole part.
    expect(mixed({ numerator: 270, denominator: 19 })).toBe('≈ 14.2');
    expect(mixed({ numerator: 2999, denominator: 50 })).toBe('≈ 60.0');
    expect(symmetry.solves({ numerator: 1, denominator: 1 })).toBe('1 solve');
    expect(symmetry.solves({ numerator: 27, denominator: 2 })).toBe('13½ solves');
  });

  it('stand in their formulas', () => {
    const all = ledgerOf('any', ['co', 'eo', 'cp', 'ep']);
    // 4!·3⁴·4!·2⁴ ways to put the pieces in, a twelfth of them solvable (common practice).
    expect(powers(all.assemblies.factors)).toBe('4! · 3⁴ · 4! · 2⁴');
    expect(formula(all.solvable)).toBe('24 · 81 · 24 · 16 / (3 · 2 · 2)');
    expect(powers([])).toBe('1');
    expect(formula({ factors: [], divisors: [] })).toBe('1');
  });

  it('agree two by two', () => {
    const pll = ledgerOf('co+eo', ['cp', 'ep']);
    const fixed = pll.burnside.map((row) => row.fixed);
    expect(burnsideSum(fixed)).toBe(352);
    expect(three.states(formula(pll.solvable), pll.solvable.value, pll.withoutAufAfter.value)).toBe(
      '24 · 24 / 2 = 288; 288 / 4 = 72 states',
    );
    const classes = [...pll.classes].reverse();
    expect(three.classes(classes, 72)).toBe('16 · 4 + 2 · 2 + 4 · 1 = 72 states');
    expect(three.burnside(gatheredTerms(fixed), 22)).toBe('(288 + 32 + 4 · 8) / 16 = 22 cases');
    expect(
      three.listed(
        classes.map(({ caseNumbers }) => ({ cases: caseNumbers.length })),
        22,
      ),
    ).toBe('16 + 2 + 4 = 22 cases');
  });

  it('say a step with one case in words that are no sum', () => {
    expect(three.states('1', 1, 1)).toBe('1 state');
    expect(three.classes([{ cases: 1, angles: 1 }], 1)).toBe('1 · 1 = 1 state');
    expect(three.listed([{ cases: 1 }], 1)).toBe('1 case');
    expect(numberText.count(3916, 'case', 'cases')).toBe('3,916 cases');
  });
});
