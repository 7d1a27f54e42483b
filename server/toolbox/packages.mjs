import { createHash } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { readJson, writeWhole } from './files.mjs';
import { diskFull, PlainError, saysDiskFull } from './plain-error.mjs';

/** Holds the lock file's hash once all that it names is installed. */
const MARK = 'node_modules/.sixteenfold-lock';

/**
 * Why the packages have to be installed, or '' if they are all there.
 * @param {string} root
 */
export function whyInstall(root) {
  // npm notes here what it has put into node_modules, at the end of each install.
  const installed = readJson(join(root, 'node_modules/.package-lock.json'))?.packages;
  if (!installed) return 'not installed';
  const gone = Object.keys(installed).filter((path) => !existsSync(join(root, path, 'package.json')));
  if (gone.length > 0) return `${gone.length} missing`;
  const mark = join(root, MARK);
  if (existsSync(mark) && readFileSync(mark, 'utf8') === lockHash(root)) return '';
  return agrees(readJson(join(root, 'package-lock.json'))?.packages ?? {}, installed)
    ? ''
    : 'the lock changed';
}

/** Whether what is installed is what the lock names; packages for other systems may be absent. */
function agrees(locked, installed) {
  const named = Object.entries(locked).filter(([path]) => path !== '');
  return (
    named.every(([path, { version, optional }]) =>
      installed[path] ? installed[path].version === version : optional,
    ) && Object.keys(installed).every((path) => locked[path])
  );
}

function lockHash(root) {
  return createHash('sha256')
    .update(readFileSync(join(root, 'package-lock.json')))
    .digest('hex');
}

/** npm as this process was started by it, or the one on the path. */
export function npmCommand(env = process.env) {
  const script = env.npm_execpath ?? '';
  return /npm-cli\.c?js$/.test(script) && existsSync(script) ? [process.execPath, script] : ['npm'];
}

/**
 * Installs what the lock file names, if it is not what is there.
 * @param {{root: string, children: import('./children.mjs').Children,
 *   progress?: (percent: number | null, text: string) => void}} work
 * @returns {Promise<string>} What was done, for the person.
 * @throws {PlainError} if npm fails.
 */
export async function ensurePackages({ root, children, progress = () => {} }) {
  const why = whyInstall(root);
  if (why !== '') {
    progress(null, `installing (${why})`);
    const [command, ...before] = npmCommand();
    // Also what only tests need, whatever NODE_ENV says.
    const args = [...before, 'ci', '--include=dev', '--no-audit', '--no-fund'];
    const { code, output } = await children.run(command, args, { cwd: root });
    if (code !== 0) {
      if (saysDiskFull(output)) throw diskFull(root);
      throw new PlainError(
        `The packages could not be installed: ${reason(output)} Run "npm ci" to see all of it.`,
      );
    }
  }
  writeWhole(join(root, MARK), lockHash(root), 0o644);
  return why === '' ? 'up to date' : 'installed';
}

function reason(output) {
  const lines = output.split('\n').map((line) => line.replace(/^npm (error|ERR!) ?/, '').trim());
  const said = lines.filter((line) => line && !/^(code|errno|syscall|path|A complete log)/.test(line));
  return `${said[0] ?? 'npm gave no reason'}${/[.!?]$/.test(said[0] ?? '') ? '' : '.'}`;
}
