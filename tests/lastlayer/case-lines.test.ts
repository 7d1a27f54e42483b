import { describe, expect, it } from 'vitest';
import { expandAlgorithm } from '#server/services/intake/expand-algorithm.ts';
import { caseSet, readCaseLines } from '#shared/lastlayer/index.ts';
import { findingsText } from '#shared/text/findings.ts';

const pll = caseSet('pll');
const T = "R U R' U' R' F R2 U' R' U' R U R' F'";
const JB = "R U R' F' R U R' U' R' F R2 U' R'";
const SUNE = "R U R' U R U2 R'";

const lines = (...pairs: (readonly [string, string])[]) =>
  pairs.map(([name, algorithm], at) => ({ line: at + 2, case: name, algorithm }));
const read = (...pairs: (readonly [string, string])[]) =>
  readCaseLines(pll, lines(...pairs), expandAlgorithm);
const findings = (...pairs: (readonly [string, string])[]) =>
  read(...pairs).rows.map(({ finding }) => finding);

describe('findings of a case file', () => {
  it.each([
    ['agrees', 'T', T, 'T'],
    ['agrees', 'PLL T-perm', `y ${T} y'`, 'T'],
    ['solves-other', 'F', T, 'T'],
    ['solves-other', 'no such case', T, 'T'],
    ['solves-other', 'T', 'U', 'skip'],
    ['agrees', 'skip', 'U2', 'skip'],
    ['solves-other', 'skip', T, 'T'],
    ['first-two-layers-broken', 'T', T.replace(" F'", ''), null],
    ['not-in-set', 'T', SUNE, null],
    ['not-a-move', 'T', `${T} Q`, null],
    ['missing-field', '', T, 'T'],
    ['missing-field', ' ', 'R Q', null],
    ['missing-field', 'T', ' ', null],
    ['missing-field', '', '', null],
    ['agrees', 'T', "(R U R' U') R' F R2 U' (R' U' R U) R' F'", 'T'],
    // The same seven turns again and again: six Sunes are nothing at all.
    ['solves-other', 'T', `(${SUNE})6`, 'skip'],
  ] as const)('%s: a line that says %j for %j', (finding, name, algorithm, solves) => {
    expect(read([name, algorithm]).rows[0]).toMatchObject({ finding, solves });
  });

  it('say where an algorithm stops being one', () => {
    expect(read(['T', "R U R' Q U'"]).rows[0]).toMatchObject({
      finding: 'not-a-move',
      column: 8,
      token: 'Q',
    });
    expect(read(['T', T]).rows[0]).not.toHaveProperty('column');
    expect(read(['T', 'R']).rows[0]?.pieces).toEqual(['DFR', 'DBR', 'DR', 'FR', 'BR']);
  });

  it('take the same algorithm on a later line for a duplicate, and nothing else', () => {
    expect(findings(['T', T], ['T', T])).toEqual(['agrees', 'duplicate']);
    expect(findings(['T', T], ['T', T.replaceAll("'", '’').replaceAll(' ', '')])).toEqual([
      'agrees',
      'duplicate',
    ]);
    expect(findings(['T', T], ['F', T])).toEqual(['agrees', 'duplicate']);
    expect(findings(['T', T], ['T', `U2 ${T}`])).toEqual(['agrees', 'agrees']);
    expect(findings(['T', T], ['T', `R R' ${T}`])).toEqual(['agrees', 'duplicate']);
    expect(findings(['T', 'R'], ['T', 'R'])).toEqual(['first-two-layers-broken', 'duplicate']);
    expect(findings(['T', 'R Q'], ['T', 'R Q'])).toEqual(['not-a-move', 'not-a-move']);
    expect(read(['Jb', JB], ['T', T], ['T', T], ['T', T]).rows.map(({ sameAs }) => sameAs)).toEqual([
      undefined,
      undefined,
      3,
      3,
    ]);
  });

  it('count the cases for which a line agrees, once each', () => {
    const two = read(['T', T], ['T', `U ${T}`], ['Jb', JB], ['F', `U2 ${T}`], ['skip', 'U']);
    expect(two).toMatchObject({ covered: 2, of: 21 });
    expect(two.missing).toHaveLength(19);
    expect(two.missing).not.toContain('T');
    expect(two.missing).toContain('F');
  });

  it('keep each line as it came', () => {
    const line = { line: 7, case: ' T ', algorithm: ` ${T}`, group: 'g', note: 'n' };
    expect(readCaseLines(pll, [line]).rows[0]).toMatchObject({ ...line, normalised: T });
  });

  it('have a sentence, a hint and a label each', () => {
    const all = read(
      ['T', T],
      ['F', T],
      ['V', JB],
      ['T', 'R'],
      ['T', SUNE],
      ['T', 'Q'],
      ['', 'R2'],
      ['T', ''],
      ['?', 'U'],
    );
    const said = all.rows.map((row) =>
      findingsText.says({ ...row, known: pll.byName(row.case) !== undefined, set: 'PLL' }),
    );
    expect(said).toEqual([
      'Solves PLL T, as the line says.',
      'The same algorithm as line 2.',
      'Says V, but the algorithm solves PLL Jb.',
      'Breaks the first two layers: DFR, DBR, DR, FR and more out of place.',
      'Keeps the first two layers, but solves no case of PLL: it undoes what is done before this step.',
      'Q is not a move (character 1).',
      'The case is missing.',
      'The algorithm is missing.',
      'PLL has no case called ?; the algorithm leaves a solved cube as it is.',
    ]);
    for (const { finding } of all.rows) {
      expect(findingsText.labels[finding]).not.toBe('');
      expect(findingsText.hint(finding) === '').toBe(finding === 'agrees');
    }
  });
});
