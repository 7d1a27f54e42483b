import { type ChildProcess, spawn } from 'node:child_process';
import {
  chmodSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  realpathSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import pg from 'pg';
import { afterAll, afterEach, beforeAll, beforeEach, expect, it, vi } from 'vitest';
import { openCluster } from '#database/cluster.mjs';
import { Children } from '#server/toolbox/children.mjs';
import { filesUnder } from '#server/toolbox/fingerprint.mjs';
import { lockFolder } from '#server/toolbox/lock.mjs';
import { processBirth } from '#server/toolbox/processes.mjs';

const script = fileURLToPath(new URL('scripts/hold-cluster.mjs', import.meta.url));

let folder: string;
let undo: (() => unknown)[];

/** A complete data folder with a note in it, stopped; each test that needs one takes a copy. */
let complete: string;
let about: { id: string; port: number; ownerUrl: string };

beforeAll(async () => {
  complete = realpathSync(mkdtempSync(join(tmpdir(), 'sixteenfold-fault-')));
  chmodSync(complete, 0o711);
  const cluster = await openCluster({ dataDir: complete, children: new Children(), throwAway: true });
  await keepNote(cluster.ownerUrl);
  await cluster.stop();
  about = { id: cluster.id, port: cluster.port, ownerUrl: cluster.ownerUrl };
});

afterAll(() => rmSync(complete, { recursive: true }));

beforeEach(() => {
  folder = realpathSync(mkdtempSync(join(tmpdir(), 'sixteenfold-fault-')));
  // The server's user must be let through.
  chmodSync(folder, 0o711);
  undo = [];
});

afterEach(async () => {
  for (const step of undo.reverse()) await step();
  rmSync(folder, { recursive: true, force: true });
});

/** Opens the cluster of a data folder as a start does: with the lock, and hearing what was repaired. */
async function open(dataDir = join(folder, 'data')) {
  const notices: string[] = [];
  const cluster = await openCluster({
    dataDir,
    children: new Children(),
    throwAway: true,
    notice: (sentence: string) => notices.push(sentence),
  });
  undo.push(cluster.stop);
  return { ...cluster, notices };
}

/** Puts a copy of the complete cluster into this test's data folder. @returns the folder PostgreSQL knows. */
async function haveCluster(): Promise<string> {
  await new Children().run('cp', ['-a', complete, join(folder, 'data')]);
  return join(folder, 'data/cluster/pgdata');
}

async function query(url: string, sql: string): Promise<Record<string, unknown>[]> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query(sql)).rows as Record<string, unknown>[];
  } finally {
    await client.end();
  }
}

/** Keeps a note in the database, to see later whether the data is still there. */
const keepNote = (ownerUrl: string) =>
  query(ownerUrl, "CREATE TABLE note (said text); INSERT INTO note VALUES ('kept')");
const readNote = (ownerUrl: string) => query(ownerUrl, 'SELECT said FROM note');

/** Runs the script that takes the folder and opens its cluster, to be killed. */
function hold(dataDir: string): ChildProcess {
  const child = spawn(process.execPath, [script, dataDir], { stdio: ['ignore', 'pipe', 'inherit'] });
  undo.push(() => child.kill('SIGKILL'));
  return child;
}

async function killed(child: ChildProcess): Promise<void> {
  const gone = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGKILL');
  await gone;
}

/** What the next start does first: takes the folder, and with it ends what the killed one left running. */
async function takeOver(dataDir: string): Promise<void> {
  const lock = await lockFolder(dataDir);
  undo.push(lock.release);
}

it('makes a cluster that only this program can enter', async () => {
  const cluster = await open();
  expect(cluster).toMatchObject({ made: true, notices: [] });
  const [roles] = await query(
    cluster.adminUrl,
    `SELECT bool_and(rolpassword LIKE 'SCRAM-SHA-256%') AS scram,
       array_agg(rolname::text ORDER BY rolname) FILTER (WHERE rolsuper) AS super,
       array_agg(rolname::text ORDER BY rolname) FILTER (WHERE rolbypassrls) AS past_walls
     FROM pg_authid WHERE rolcanlogin`,
  );
  expect(roles).toEqual({ scram: true, super: ['sixteenfold_admin'], past_walls: ['sixteenfold_admin'] });
  const [where] = await query(
    cluster.adminUrl,
    `SELECT current_setting('listen_addresses') AS listens, current_setting('unix_socket_directories') AS sockets`,
  );
  expect(where).toEqual({ listens: '127.0.0.1', sockets: '' });
  const [owner] = await query(
    cluster.appUrl,
    'SELECT pg_get_userbyid(datdba)::text AS owner FROM pg_database WHERE datname = current_database()',
  );
  expect(owner).toEqual({ owner: 'sixteenfold_owner' });
  expect(statSync(join(folder, 'data/connection.json')).mode & 0o777).toBe(0o600);
  const strangers = new URL(cluster.appUrl);
  strangers.password = 'guessed';
  await expect(query(strangers.href, 'SELECT 1')).rejects.toThrow(/password authentication failed/);
});

it('finds its data, its passwords and its port again', async () => {
  await haveCluster();
  const second = await open();
  expect(second).toMatchObject({ ...about, made: false, notices: [] });
  expect(await readNote(second.ownerUrl)).toEqual([{ said: 'kept' }]);
});

it('takes another port when its own is taken meanwhile', async () => {
  await haveCluster();
  const stranger = createServer();
  await new Promise<void>((resolve) => stranger.listen(about.port, '127.0.0.1', resolve));
  undo.push(() => stranger.close());
  const second = await open();
  expect(second.port).not.toBe(about.port);
  expect(await readNote(second.ownerUrl)).toEqual([{ said: 'kept' }]);
});

it('runs beside another clone’s', async () => {
  const [one, other] = await Promise.all([open(join(folder, 'one')), open(join(folder, 'other'))]);
  expect(one.port).not.toBe(other.port);
  await keepNote(one.ownerUrl);
  await expect(readNote(other.ownerUrl)).rejects.toThrow(/does not exist/);
  await expect(query(other.ownerUrl.replace(`:${other.port}/`, `:${one.port}/`), 'SELECT 1')).rejects.toThrow(
    /password authentication failed/,
  );
});

it('goes elsewhere when the server’s user is not let through, and finds that again', async () => {
  chmodSync(folder, 0o700);
  const first = await open();
  const inside = join(realpathSync(folder), 'data/cluster/pgdata');
  // Only root runs the server as another user; for anyone else there is nothing to go around.
  if (process.getuid?.() === 0) {
    expect(first.pgdata).toMatch(/^\/var\/tmp\/sixteenfold-[0-9a-f]{16}\/pgdata$/);
    undo.unshift(() => rmSync(join(first.pgdata, '..'), { recursive: true }));
  } else expect(first.pgdata).toBe(inside);
  await keepNote(first.ownerUrl);
  await first.stop();
  const second = await open();
  expect(second.pgdata).toBe(first.pgdata);
  expect(await readNote(second.ownerUrl)).toEqual([{ said: 'kept' }]);
});

it('makes the database when only that is missing', async () => {
  await haveCluster();
  const first = await open();
  await query(first.adminUrl, 'DROP DATABASE sixteenfold');
  await first.stop();
  expect(await open()).toMatchObject({ id: first.id, made: true });
});

it('does a first start over that was killed while the cluster was made', async () => {
  const dataDir = join(folder, 'data');
  const child = hold(dataDir);
  await vi.waitUntil(() => existsSync(join(dataDir, 'cluster/pgdata/global')), {
    timeout: 20_000,
    interval: 5,
  });
  await killed(child);
  // As in a power cut: what it had started is gone too, and tidies nothing up.
  const lock = JSON.parse(readFileSync(join(dataDir, 'lock.json'), 'utf8')) as {
    children: { pid: number }[];
  };
  for (const { pid } of lock.children) process.kill(-pid, 'SIGKILL');
  expect(readdirSync(join(dataDir, 'cluster/pgdata'))).not.toContain('sixteenfold.json');
  await takeOver(dataDir);
  const next = await open(dataDir);
  expect(next.made).toBe(true);
  expect(next.notices).toEqual(['An earlier first start was cut short. It is done again.']);
});

it('ends the server that a killed start left running, and keeps its data', async () => {
  const dataDir = join(folder, 'data');
  await haveCluster();
  const child = hold(dataDir);
  const orphan = await new Promise<number>((resolve) => {
    child.stdout?.on('data', (text: Buffer) => resolve(Number(/open (\d+)/.exec(String(text))?.[1])));
  });
  await killed(child);
  expect(processBirth(orphan)).not.toBe('');
  await takeOver(dataDir);
  const next = await open(dataDir);
  expect(processBirth(orphan)).toBe('');
  expect(await readNote(next.ownerUrl)).toEqual([{ said: 'kept' }]);
});

it('does not take the process of another clone for its own after a copy', async () => {
  const dataDir = join(folder, 'data');
  await haveCluster();
  const first = await open(dataDir);
  const copy = join(folder, 'copy');
  await new Children().run('cp', ['-a', dataDir, copy]);
  const second = await open(copy);
  expect(second.port).not.toBe(first.port);
  expect(await readNote(first.ownerUrl)).toEqual([{ said: 'kept' }]);
});

it('keeps the data when the file with the passwords is lost', async () => {
  await haveCluster();
  rmSync(join(folder, 'data/connection.json'));
  const second = await open();
  expect(second).toMatchObject({ id: about.id, made: false });
  expect(await readNote(second.ownerUrl)).toEqual([{ said: 'kept' }]);
});

it('moves a half-deleted cluster aside and makes a new one', async () => {
  const pgdata = await haveCluster();
  const files = filesUnder(pgdata, '.').filter((file) => !file.endsWith('sixteenfold.json'));
  for (const file of files.filter((_, index) => index % 2 === 0)) rmSync(join(pgdata, file));
  const second = await open();
  expect(second.made).toBe(true);
  expect(second.notices).toHaveLength(1);
  const aside = /moved to (\S+\.broken-[\d-]+)/.exec(second.notices[0] ?? '')?.[1];
  expect(readdirSync(aside ?? '')).not.toHaveLength(0);
});

it.each([
  ['its control file', (pgdata: string) => join(pgdata, 'global/pg_control')],
  ['the files of its tables', (pgdata: string) => newest(join(pgdata, 'base'))],
  ['its log of transactions', (pgdata: string) => join(pgdata, 'pg_wal')],
  ['the record of what was committed', (pgdata: string) => join(pgdata, 'pg_xact')],
  ['this program’s mark', (pgdata: string) => join(pgdata, 'sixteenfold.json')],
])('notices a complete cluster that lost %s', async (_what, lost) => {
  rmSync(lost(await haveCluster()), { recursive: true });
  const second = await open();
  expect(second.made).toBe(true);
  expect(second.notices).toEqual([
    expect.stringMatching(/^The database was damaged .* moved to .* and a new one made\.$/),
  ]);
});

/** The folder of the database that was made last: they are named by rising numbers. */
function newest(base: string): string {
  const numbers = readdirSync(base).map(Number);
  return join(base, String(Math.max(...numbers)));
}

it('says so when its folder is gone altogether', async () => {
  await haveCluster();
  rmSync(join(folder, 'data/cluster'), { recursive: true });
  const second = await open();
  expect(second).toMatchObject({
    made: true,
    notices: ["The database's folder was gone. A new one is made and filled again."],
  });
});

it('says in one sentence that PostgreSQL of the right version is missing, and touches nothing', async () => {
  const versionFile = join(await haveCluster(), 'PG_VERSION');
  const version = readFileSync(versionFile, 'utf8');
  writeFileSync(versionFile, '9\n');
  await expect(open()).rejects.toThrow(
    /made by PostgreSQL 9, and only .* installed\. Run: sudo apt-get install/,
  );
  writeFileSync(versionFile, version);
  expect(await readNote((await open()).ownerUrl)).toEqual([{ said: 'kept' }]);
});

it('says in one sentence that the disk is full, and begins again when it is not', async () => {
  // Programs that fail as PostgreSQL 15's did on a disk of 20 MB.
  const bin = join(folder, 'bin');
  mkdirSync(bin);
  const program = (name: string, body: string) =>
    writeFileSync(join(bin, name), `#!/bin/sh\n${body}\n`, { mode: 0o755 });
  program('postgres', "echo 'postgres (PostgreSQL) 15.18'");
  program('psql', 'exit 1');
  program(
    'initdb',
    `mkdir -p "$2/base"; echo 'initdb: error: could not write file "$2/base/1": No space left on device' >&2; exit 1`,
  );
  const dataDir = join(folder, 'data');
  const full = openCluster({ dataDir, children: new Children(), places: { versioned: [], path: bin } });
  await expect(full).rejects.toThrow(/^The disk that holds .*data\/cluster is full\. Free some space/);
  expect(await open()).toMatchObject({ made: true });
});
