import { join } from 'node:path';
import { openCluster } from '../../database/cluster.mjs';
import { readJson, writeJson } from './files.mjs';
import { fingerprint } from './fingerprint.mjs';
import { diskFull, PlainError, saysDiskFull } from './plain-error.mjs';

/**
 * Starts the database and brings it up to date: tables, catalogue and, in a demonstration, its people.
 * @param {{root: string, dataDir: string, env: NodeJS.ProcessEnv, command: import('./command.mjs').Command}} work
 * @returns {Promise<{ownerUrl: string, appUrl: string}>}
 */
export async function readyDatabase({ root, dataDir, env, command }) {
  const { steps, children, onEnd, fail } = command;
  const cluster = await steps.run('PostgreSQL', async (progress) => {
    const notices = [];
    const opened = await openCluster({ dataDir, children, progress, notice: (text) => notices.push(text) });
    const said = [`${opened.version} on 127.0.0.1:${opened.port}`, ...notices].join('. ');
    return [said, opened];
  });
  let stopping = false;
  onEnd(() => {
    stopping = true;
    return cluster.stop();
  });
  cluster.server.once('exit', () => {
    if (!stopping) fail(`PostgreSQL ended by itself. Its log is ${cluster.logFile}.`);
  });

  // What was done to this very cluster and need not be looked at again.
  const marksFile = join(dataDir, 'marks.json');
  const known = readJson(marksFile);
  const marks = known?.cluster === cluster.id && !cluster.made ? known : { cluster: cluster.id };
  const urls = { ownerUrl: cluster.ownerUrl, appUrl: cluster.appUrl };
  const script = {
    cwd: root,
    env: { ...env, DATABASE_OWNER_URL: cluster.ownerUrl, DATABASE_URL: cluster.appUrl },
  };
  const todo = [
    // With the month: migrating also makes the coming months' partitions.
    [
      'tables',
      'Tables',
      'database/migrate.ts',
      `${fingerprint(root, ['database/migrations'])} ${thisMonth()}`,
    ],
    [
      'seed',
      'Catalogue and people',
      'server/demo/run.ts',
      `${fingerprint(root, ['database/seed'])} demo ${env.DEMO}`,
    ],
  ];
  for (const [key, name, file, mark] of todo) {
    if (marks[key] === mark) continue;
    await steps.run(name, (progress) => runScript({ children, file, script, progress, place: dataDir }));
    marks[key] = mark;
    writeJson(marksFile, marks);
  }
  return urls;
}

function thisMonth() {
  return new Date().toISOString().slice(0, 7);
}

/** Runs one of the database's scripts, which may print lines like "progress 40 answers of Tobi". */
async function runScript({ children, file, script, progress, place }) {
  const { code, output } = await children.run(process.execPath, ['--import', 'tsx', file], {
    ...script,
    onLine: (line) => {
      const [, percent, text] = /^progress (\d+(?:\.\d+)?)\s*(.*)$/.exec(line) ?? [];
      if (percent) progress(Number(percent), text);
    },
  });
  if (code === 0) return 'ready';
  if (saysDiskFull(output)) throw diskFull(place);
  const said = output.split('\n').findLast((line) => /^\S*(error|Error)\b.*: /.test(line.trim()));
  throw new PlainError(
    `${file} failed${said ? `: ${said.trim()}` : ` with ${code}`}. Run the command again; if it fails again, start with empty data: DATA_DIR=.data2 npm start`,
  );
}
