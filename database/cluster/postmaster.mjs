import { closeSync, existsSync, openSync, readFileSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { processBirth, processCommand, signal, waitForEnd } from '../../server/toolbox/processes.mjs';

/** PostgreSQL's programs speak English here, so that their complaints can be told apart. */
export const SPOKEN = { ...process.env, LC_ALL: 'C', LANGUAGE: 'C', PGCLIENTENCODING: 'UTF8' };

/** Settings for a small machine: no sockets on disk, loopback only, times in UTC. */
const SETTINGS = {
  listen_addresses: '127.0.0.1',
  unix_socket_directories: '',
  max_connections: '100',
  shared_buffers: '64MB',
  // Queries here are short: compiling them costs more than it saves.
  jit: 'off',
  timezone: 'UTC',
  log_timezone: 'UTC',
  password_encryption: 'scram-sha-256',
};

/** What a cluster that is thrown away after the tests need not do: survive a power cut. */
const CARELESS = { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off' };

/** A log longer than this is begun again at a start. */
const LONGEST_LOG = 5_000_000;

/** What postmaster.pid says (line 1 process, 2 folder, 8 status), or null without one. */
function readPidFile(pgdata) {
  try {
    const lines = readFileSync(join(pgdata, 'postmaster.pid'), 'utf8').split('\n');
    return { pid: Number(lines[0]), folder: lines[1] ?? '', status: (lines[7] ?? '').trim() };
  } catch {
    return null;
  }
}

/**
 * Stops the server that runs on a cluster from an earlier start, if there is one, and removes the process file
 * that a killed one or a copy of the folder left behind.
 */
export async function clearPostmaster(pgdata) {
  const noted = readPidFile(pgdata);
  if (noted) {
    const ours = noted.folder === pgdata && processCommand(noted.pid).includes(pgdata);
    if (ours) await stopPostmaster(noted.pid);
  }
  rmSync(join(pgdata, 'postmaster.pid'), { force: true });
}

/** Stops a server: its connections are cut and what is committed is kept. */
export async function stopPostmaster(pid) {
  // SIGINT is PostgreSQL's fast shutdown, SIGQUIT the immediate one (recovers at the next start).
  signal(pid, 'SIGINT');
  if (await waitForEnd(pid, 10_000)) return;
  signal(pid, 'SIGQUIT');
  if (await waitForEnd(pid, 5_000)) return;
  signal(-pid, 'SIGKILL');
  await waitForEnd(pid, 2_000);
}

/**
 * Starts the server and waits until it takes connections.
 * @param {{bin: string, pgdata: string, port: number, logFile: string, throwAway: boolean,
 *   user: {uid: number, gid: number} | null, children: import('../../server/toolbox/children.mjs').Children}} how
 * @returns {Promise<{child: import('node:child_process').ChildProcess} | {complaint: string}>} The running
 *   server, or what it wrote into its log before it ended.
 */
export async function startPostmaster({ bin, pgdata, port, logFile, throwAway, user, children }) {
  const settings = { ...SETTINGS, ...(throwAway ? CARELESS : {}), port: String(port) };
  const args = Object.entries(settings).flatMap(([name, value]) => ['-c', `${name}=${value}`]);
  const long = existsSync(logFile) && statSync(logFile).size > LONGEST_LOG;
  const log = openSync(logFile, long ? 'w' : 'a', 0o600);
  const from = statSync(logFile).size;
  const child = children.start(join(bin, 'postgres'), ['-D', pgdata, ...args], {
    ...user,
    cwd: '/',
    env: SPOKEN,
    stdio: ['ignore', log, log],
  });
  closeSync(log);
  let ended = false;
  const end = () => {
    ended = true;
  };
  child.once('exit', end).once('error', end);
  while (!ended) {
    const noted = readPidFile(pgdata);
    if (noted?.pid === child.pid && noted.status === 'ready') return { child };
    await sleep(15);
  }
  return { complaint: readFileSync(logFile).subarray(from).toString('utf8') };
}

/** Whether the server that a start began is still that one and alive. */
export function isAlive(child) {
  return child.exitCode === null && child.signalCode === null && processBirth(child.pid) !== '';
}
