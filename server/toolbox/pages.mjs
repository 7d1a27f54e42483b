import { existsSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { readJson, writeJson } from './files.mjs';
import { filesUnder, fingerprint } from './fingerprint.mjs';
import { diskFull, PlainError, saysDiskFull } from './plain-error.mjs';

/** All that the built pages are made from. */
const SOURCES = [
  'pages',
  'renderer',
  'shared',
  'public',
  'vite.config.ts',
  'tsconfig.json',
  'package-lock.json',
];

/**
 * Builds the pages if their sources changed, or if the last build was cut short or lost files.
 * @param {{root: string, children: import('./children.mjs').Children,
 *   progress?: (percent: number | null, text: string) => void}} work
 * @returns {Promise<string>} What was done, for the person.
 * @throws {PlainError} if the build fails.
 */
export async function ensurePages({ root, children, progress = () => {} }) {
  const mark = join(root, 'dist/.built');
  const sources = fingerprint(root, SOURCES);
  const built = readJson(mark);
  if (built?.sources === sources && built.files.every((file) => existsSync(join(root, file))))
    return 'up to date';
  progress(null, 'building');
  rmSync(join(root, 'dist'), { recursive: true, force: true });
  const { code, output } = await children.run(process.execPath, ['node_modules/vite/bin/vite.js', 'build'], {
    cwd: root,
    env: { ...process.env, NODE_ENV: 'production', NO_COLOR: '1' },
  });
  if (code !== 0) {
    if (saysDiskFull(output)) throw diskFull(root);
    throw new PlainError(
      `The pages could not be built: ${reason(output)} Run "npm run build" to see all of it.`,
    );
  }
  // Sources that changed while they were built count as not yet built.
  writeJson(mark, { sources, files: filesUnder(root, 'dist') });
  return 'built';
}

/** The first line behind Vite's "error during build" that says what is wrong. */
function reason(output) {
  const lines = output
    .slice(output.search(/error during build/))
    .split('\n')
    .slice(1);
  const said = lines.map((line) => line.trim()).filter((line) => line && !/^Build failed with/.test(line));
  return `${said[0] ?? 'Vite gave no reason'}${/[.!?]$/.test(said[0] ?? '') ? '' : '.'}`;
}
