import { chmodSync, existsSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { openCluster } from '../../database/cluster.mjs';
import { processBirth, processCommand, signal, waitForEnd } from '../../server/toolbox/processes.mjs';

const PREFIX = 'sixteenfold-test-';

/**
 * A cluster for one run of the tests, in a folder that names its process, so that a later run can tell what a
 * killed one left behind.
 * @param {import('../../server/toolbox/children.mjs').Children} children
 * @param {(percent: number | null, text: string) => void} [progress]
 */
export async function openThrowAway(children, progress) {
  await sweep();
  const dataDir = mkdtempSync(join(tmpdir(), `${PREFIX}${process.pid}-${processBirth(process.pid)}-`));
  // PostgreSQL's user must be let through.
  chmodSync(dataDir, 0o711);
  const cluster = await openCluster({ dataDir, children, throwAway: true, progress });
  return {
    cluster,
    dataDir,
    async stop() {
      await cluster.stop();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}

/** Ends and removes the clusters of runs that are no more. */
async function sweep() {
  for (const name of readdirSync(tmpdir()).filter((each) => each.startsWith(PREFIX))) {
    const [pid, birth] = name.slice(PREFIX.length).split('-');
    if (birth !== '' && processBirth(Number(pid)) === birth) continue;
    const folder = join(tmpdir(), name);
    const pidFile = join(folder, 'cluster', 'pgdata', 'postmaster.pid');
    const server = existsSync(pidFile) ? Number(readFileSync(pidFile, 'utf8').split('\n')[0]) : 0;
    if (processCommand(server).includes(folder)) {
      signal(server, 'SIGQUIT');
      await waitForEnd(server, 5_000);
    }
    rmSync(folder, { recursive: true, force: true });
  }
}
