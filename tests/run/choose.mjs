import { PlainError } from '../../server/toolbox/plain-error.mjs';
import { PROJECTS, testFiles } from './projects.mjs';

/** The steps of a whole run, in order; `build` belongs to `browser`. */
export const STEPS = ['verify', 'types', 'lint', ...PROJECTS];

/**
 * What to run, from the words behind `npm test --`: names of steps, or parts of test files' paths.
 * @returns {{steps: string[], filters: string[], files: Record<string, string[]>}}
 * @throws {PlainError} if a word is neither.
 */
export function choose(root, words) {
  const filters = words.filter((word) => !STEPS.includes(word));
  const files = testFiles(root, filters);
  for (const word of filters)
    if (Object.values(testFiles(root, [word])).every((found) => found.length === 0))
      throw new PlainError(
        `No test file's path has "${word}" in it, and the steps are: ${STEPS.join(', ')}.`,
      );
  const named = STEPS.filter((step) => words.includes(step));
  // A part of a path alone, or beside a check, means the tests in the files that it picks.
  const wantsTests = filters.length > 0 && !named.some((step) => PROJECTS.includes(step));
  const all = named.length + filters.length === 0 ? STEPS : [...named, ...(wantsTests ? PROJECTS : [])];
  return { steps: all.filter((step) => !PROJECTS.includes(step) || files[step].length > 0), filters, files };
}
