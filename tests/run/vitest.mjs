import { rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import { readJson } from '../../server/toolbox/files.mjs';

/**
 * Counts one group's results, so that nothing which did not run can look as if it had passed.
 * @param {{report: any, code: number, root: string, expected: string[]}} run Vitest's JSON report (undefined if it
 *   wrote none), its exit code, and the test files that had to run.
 * @returns {{passed: number, failed: number, remarks: string[]}}
 */
export function countResults({ report, code, root, expected }) {
  if (!report) return { passed: 0, failed: 1, remarks: ['the test runner ended without a report'] };
  const remarks = [];
  let failed = report.numFailedTests;
  const fail = (remark) => {
    failed += 1;
    remarks.push(remark);
  };
  const ran = new Map(report.testResults.map((result) => [relative(root, result.name), result]));
  for (const file of expected) {
    const result = ran.get(file);
    if (!result) fail(`${file} was not run`);
    else if (result.assertionResults.length === 0) fail(`${file} holds no test, or could not be read`);
  }
  for (const { name, assertionResults } of report.testResults)
    for (const { status, fullName } of assertionResults)
      if (status !== 'passed' && status !== 'failed')
        fail(`${relative(root, name)}: "${fullName}" was skipped`);
  if (code !== 0 && failed === 0) fail('an error outside of any test (see above)');
  return { passed: report.numPassedTests, failed, remarks };
}

/**
 * Runs one group of tests and shows them as they go.
 * @param {{root: string, project: string, expected: string[], filters: string[], env: NodeJS.ProcessEnv,
 *   children: import('../../server/toolbox/children.mjs').Children}} run
 */
export async function runProject({ root, project, expected, filters, env, children }) {
  const outputFile = join(tmpdir(), `sixteenfold-report-${process.pid}-${project}.json`);
  const args = ['run', '--project', project, '--reporter=default', '--reporter=json'];
  const child = children.start(
    process.execPath,
    ['node_modules/vitest/vitest.mjs', ...args, `--outputFile.json=${outputFile}`, ...filters],
    { cwd: root, env: { ...process.env, ...env }, stdio: ['ignore', 'inherit', 'inherit'] },
  );
  const code = await new Promise((resolve) => {
    child.once('error', () => resolve(127));
    child.once('close', (ended) => resolve(ended ?? 128));
  });
  const report = readJson(outputFile);
  rmSync(outputFile, { force: true });
  return countResults({ report, code, root, expected });
}
