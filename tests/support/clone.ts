import { type ChildProcess, execFileSync, spawn } from 'node:child_process';
import { cpSync, existsSync, mkdtempSync, realpathSync, symlinkSync } from 'node:fs';
import { chmod } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { processBirth } from '#server/toolbox/processes.mjs';
import { root } from '#server/toolbox/workplace.mjs';

/** Not part of a fresh clone. */
const LEFT_OUT = ['.git', '.data', '.tmp', 'node_modules', 'coverage'];

/**
 * Copies the repository as it is into a folder of its own; the packages are shared, and so are the built pages where
 * there are any.
 */
export async function makeClone(): Promise<string> {
  const clone = realpathSync(mkdtempSync(join(tmpdir(), 'sixteenfold-clone-')));
  // The database's user must be let through.
  await chmod(clone, 0o711);
  const outside = LEFT_OUT.map((name) => join(root, name));
  cpSync(root, clone, {
    recursive: true,
    filter: (source) => !outside.includes(source) && !/\.build-.*\.mjs$/.test(source),
  });
  symlinkSync(join(root, 'node_modules'), join(clone, 'node_modules'));
  return clone;
}

/** The environment without what the test runner and this product's own settings put into it. */
export function plainEnvironment(): NodeJS.ProcessEnv {
  const added =
    /^(VITEST|VITE_|TEST$|TEST_|NODE_ENV$|DEV$|PROD$|MODE$|SSR$|BASE_URL$|PORT$|HOST$|DATA_DIR$|DEMO$)/;
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => !added.test(name)));
}

/** A command that runs in a clone. */
export interface Running {
  readonly child: ChildProcess;
  /** All that it has printed so far, on both outputs. */
  output(): string;
  /** The address it told people to open; fails with its output if it ends before. */
  readonly opened: Promise<string>;
  /** Its exit code. */
  readonly ended: Promise<number | null>;
}

/** Starts a command in a clone, as a shell would: in a process group of its own. */
export function launch(clone: string, command: readonly string[], env: Record<string, string>): Running {
  const child = spawn(command[0] ?? '', command.slice(1), {
    cwd: clone,
    env: { ...plainEnvironment(), ...env },
    detached: true,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let said = '';
  const ended = new Promise<number | null>((resolve) => child.once('close', resolve));
  const opened = new Promise<string>((resolve, reject) => {
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', (text: string) => {
        said += text;
        const address = /^Open (\S+)$/m.exec(said)?.[1];
        if (address && said.includes('Ctrl-C stops it.')) resolve(address);
      });
    }
    ended.then((code) => reject(new Error(`It ended with ${code}:\n${said}`)));
  });
  // Whoever waits for the end alone does not care that it never opened.
  opened.catch(() => {});
  return { child, output: () => said, opened, ended };
}

/** A process, told apart from a later one with its number. */
export interface Known {
  readonly pid: number;
  readonly birth: string;
  readonly command: string;
}

/** All processes that descend from one. */
export function descendants(pid: number): Known[] {
  const all = execFileSync('ps', ['-eo', 'pid=,ppid=,args='], { encoding: 'utf8' })
    .split('\n')
    .map((line) => /^\s*(\d+)\s+(\d+)\s+(.*)$/.exec(line))
    .filter((match) => match !== null)
    .map(([, child, parent, command]) => ({
      pid: Number(child),
      parent: Number(parent),
      command: command ?? '',
    }));
  const below = (parent: number): Known[] =>
    all
      .filter((each) => each.parent === parent)
      .flatMap((each) => [{ ...each, birth: processBirth(each.pid) }, ...below(each.pid)]);
  return below(pid).filter(({ birth }) => birth !== '');
}

/** Those of the processes that are still alive. */
export function stillAlive(known: readonly Known[]): Known[] {
  return known.filter(({ pid, birth }) => processBirth(pid) === birth);
}

/** Whether a file is there, relative to a clone. */
export function has(clone: string, file: string): boolean {
  return existsSync(join(clone, file));
}
