import { describe, expect, it } from 'vitest';
import { root } from '#server/toolbox/workplace.mjs';
import { choose } from '#tests/run/choose.mjs';
import { countResults } from '#tests/run/vitest.mjs';

const passed = { status: 'passed', fullName: 'adds' };
const file = (name: string, assertionResults: object[]) => ({ name: `/repo/${name}`, assertionResults });

/** A run's report in the shape of Vitest's JSON reporter. */
function run(
  testResults: object[],
  more: Partial<{ failed: number; code: number; expected: string[] }> = {},
) {
  const { failed = 0, code = 0, expected = ['tests/a.test.ts'] } = more;
  return countResults({
    report: { numPassedTests: 1, numFailedTests: failed, testResults },
    code,
    root: '/repo',
    expected,
  });
}

describe('counting the tests', () => {
  it('counts what passed', () => {
    expect(run([file('tests/a.test.ts', [passed])])).toEqual({ passed: 1, failed: 0, remarks: [] });
  });
  it('takes a skipped test, a file without tests and a file that did not run for failures', () => {
    const result = run(
      [
        file('tests/a.test.ts', [passed, { status: 'pending', fullName: 'waits' }]),
        file('tests/b.test.ts', []),
      ],
      { expected: ['tests/a.test.ts', 'tests/b.test.ts', 'tests/c.test.ts'] },
    );
    expect(result).toEqual({
      passed: 1,
      failed: 3,
      remarks: [
        'tests/b.test.ts holds no test, or could not be read',
        'tests/c.test.ts was not run',
        'tests/a.test.ts: "waits" was skipped',
      ],
    });
  });
  it('takes an error outside of any test for a failure, and counts a failed test once', () => {
    expect(run([file('tests/a.test.ts', [passed])], { code: 1 }).failed).toBe(1);
    const broken = { status: 'failed', fullName: 'breaks' };
    expect(run([file('tests/a.test.ts', [passed, broken])], { code: 1, failed: 1 }).failed).toBe(1);
  });
  it('takes a missing report for a failure', () => {
    expect(countResults({ report: undefined, code: 0, root: '/repo', expected: [] }).failed).toBe(1);
  });
});

describe('the words behind npm test --', () => {
  it('choose steps, files or both', () => {
    expect(choose(root, []).steps.slice(0, 4)).toEqual(['verify', 'types', 'lint', 'unit']);
    expect(choose(root, ['lint']).steps).toEqual(['lint']);
    const one = choose(root, ['commands/counting']);
    expect(one.steps).toEqual(['unit']);
    expect(one.files.unit).toEqual(['tests/commands/counting.test.ts']);
    expect(choose(root, ['lint', 'commands/counting']).steps).toEqual(['lint', 'unit']);
    expect(() => choose(root, ['no-such-test'])).toThrow(/^No test file's path has "no-such-test" in it/);
  });
});
