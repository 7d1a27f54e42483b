import { filesUnder } from '../../server/toolbox/fingerprint.mjs';

/** The groups of tests in vitest.config.ts, by what they need to run. */
export const PROJECTS = ['unit', 'api', 'browser'];

/** The group that a test file belongs to. */
function projectOf(file) {
  const [, folder] = file.split('/');
  if (folder === 'api' || folder === 'faults') return 'api';
  return folder === 'browser' ? 'browser' : 'unit';
}

/**
 * The test files of each group.
 * @param {string[]} filters Parts of paths; none: all files.
 * @returns {Record<string, string[]>}
 */
export function testFiles(root, filters = []) {
  const all = filesUnder(root, 'tests').filter((file) => /\.test\.tsx?$/.test(file));
  const chosen = all.filter((file) => filters.length === 0 || filters.some((part) => file.includes(part)));
  return Object.fromEntries(
    PROJECTS.map((project) => [project, chosen.filter((file) => projectOf(file) === project)]),
  );
}
