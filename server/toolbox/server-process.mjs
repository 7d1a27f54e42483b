import { closeSync, openSync, readFileSync, statSync } from 'node:fs';
import { createInterface } from 'node:readline';
import { diskFull, PlainError, saysDiskFull } from './plain-error.mjs';
import { portProblem } from './ports.mjs';
import { signal, waitForEnd } from './processes.mjs';

/** A log longer than this is begun again at a start. */
const LONGEST_LOG = 5_000_000;

/**
 * Starts the server and waits until it listens.
 * @param {{root: string, env: NodeJS.ProcessEnv, logFile: string | null, host: string, port: number,
 *   children: import('./children.mjs').Children}} how `logFile` takes what the server logs; null: the terminal.
 * @returns {Promise<{address: string, ended: Promise<number>, stop: () => Promise<void>}>} `ended` gives the
 *   exit code when the process is gone.
 * @throws {PlainError} if it ends before it listens.
 */
export async function startServer({ root, env, logFile, host, port, children }) {
  const from = logFile ? logSize(logFile) : 0;
  const log = logFile ? openSync(logFile, from === 0 ? 'w' : 'a', 0o600) : 'inherit';
  const child = children.start(process.execPath, ['--import', 'tsx', 'server/main.ts'], {
    cwd: root,
    env: { ...env, HOST: host, PORT: String(port) },
    stdio: ['ignore', 'pipe', log],
  });
  if (logFile) closeSync(log);
  const ended = new Promise((resolve) => {
    child.once('error', () => resolve(1));
    child.once('close', (code) => resolve(code ?? 1));
  });

  let told = {};
  const address = await new Promise((resolve) => {
    createInterface({ input: child.stdout }).on('line', (line) => {
      told = { ...told, ...parseLine(line) };
      if (told.listening) resolve(told.listening);
    });
    ended.then(() => resolve(undefined));
  });
  if (address === undefined) throw bootProblem({ told, code: await ended, logFile, from, host, port });
  return {
    address,
    ended,
    async stop() {
      signal(child.pid, 'SIGTERM');
      // The server gives what is in flight up to ten seconds.
      if (!(await waitForEnd(child.pid, 12_000))) signal(-child.pid, 'SIGKILL');
      await ended;
    },
  };
}

/** How long the log is that is written on; 0 to begin it again. */
function logSize(file) {
  const size = statSync(file, { throwIfNoEntry: false })?.size ?? 0;
  return size > LONGEST_LOG ? 0 : size;
}

function parseLine(line) {
  try {
    const said = JSON.parse(line);
    return typeof said === 'object' && said !== null ? said : {};
  } catch {
    return {};
  }
}

function bootProblem({ told, code, logFile, from, host, port }) {
  const logged = logFile ? readFileSync(logFile).subarray(from).toString('utf8') : '';
  if (saysDiskFull(`${told.problem} ${logged}`)) return diskFull(logFile ?? 'this folder');
  if (['EADDRINUSE', 'EACCES', 'EADDRNOTAVAIL', 'ENOTFOUND'].includes(told.code))
    return portProblem(told.code, host, port);
  const where = logFile ? ` Its log is ${logFile}.` : '';
  return new PlainError(
    told.problem
      ? `The server does not start: ${told.problem}${where}`
      : `The server ended before it was up (exit code ${code}).${where}`,
  );
}
