import { randomUUID } from 'node:crypto';
import { chownSync, existsSync, mkdirSync, readFileSync, realpathSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { readJson, writeJson } from '../server/toolbox/files.mjs';
import { diskFull, PlainError, saysDiskFull } from '../server/toolbox/plain-error.mjs';
import { freePort } from '../server/toolbox/ports.mjs';
import { missingFiles, reasonIn, sortComplaint } from './cluster/damage.mjs';
import { giveTo, isEmpty, makeCluster, moveAside, newPassword } from './cluster/make.mjs';
import { placeFor, serverUser } from './cluster/place.mjs';
import { clearPostmaster, isAlive, startPostmaster, stopPostmaster } from './cluster/postmaster.mjs';
import { ensurePrograms } from './cluster/programs.mjs';
import { ADMIN, APP, addressOf, ensureDatabase, OWNER, resetAdmin } from './cluster/roles.mjs';

/**
 * Starts this program's own PostgreSQL server on its own cluster, made if there is none. A cluster whose making
 * was cut short is made again; one that lost files is moved aside and a new one made. Whoever calls holds the
 * data folder's lock (server/toolbox/lock.mjs) or is alone in it otherwise.
 * @param {{dataDir: string, children: import('../server/toolbox/children.mjs').Children, throwAway?: boolean,
 *   progress?: (percent: number | null, text: string) => void, notice?: (sentence: string) => void,
 *   places?: {versioned: string[], path: string}}} wish
 *   `throwAway`: for tests, does not survive a power cut; `notice` hears what was repaired, a sentence each.
 * @returns {Promise<{adminUrl: string, ownerUrl: string, appUrl: string, port: number, version: number,
 *   id: string, made: boolean, pgdata: string, logFile: string, server: import('node:child_process').ChildProcess,
 *   stop: () => Promise<void>}>} `id` names this cluster for good; `made`: the database is new and has no tables.
 * @throws {PlainError} with one clear sentence when it cannot be had.
 */
export async function openCluster(wish) {
  const { children, throwAway = false, progress = () => {}, notice = () => {} } = wish;
  mkdirSync(wish.dataDir, { recursive: true, mode: 0o711 });
  const dataDir = realpathSync(wish.dataDir);
  const { folder, user } = placeFor(dataDir, serverUser());
  const pgdata = join(folder, 'pgdata');
  const at = {
    children,
    throwAway,
    user,
    pgdata,
    logFile: join(dataDir, 'postgres.log'),
    connectionFile: join(dataDir, 'connection.json'),
    markFile: join(pgdata, 'sixteenfold.json'),
  };
  const connection = readJson(at.connectionFile);
  await clearPostmaster(pgdata);
  await clearUnusable(at, connection, notice);

  const wanted = Number(existsSync(at.markFile) && read(join(pgdata, 'PG_VERSION'))) || undefined;
  const { bin, version } = await ensurePrograms({ children, wanted, progress, places: wish.places });
  at.bin = bin;

  let opened = existsSync(at.markFile) ? await openExisting(at, connection) : await openNew(at, progress);
  if (opened.damage) {
    await clearPostmaster(pgdata);
    const aside = moveAside(pgdata);
    notice(`The database was damaged (${opened.damage}). It was moved to ${aside} and a new one made.`);
    opened = await openNew(at, progress);
    if (opened.damage)
      throw new PlainError(`PostgreSQL does not start: ${opened.damage}. Its log is ${at.logFile}.`);
  }
  const { child, port, passwords, id, made } = opened;
  return {
    adminUrl: addressOf(ADMIN, passwords.admin, port, 'postgres'),
    ownerUrl: addressOf(OWNER, passwords.owner, port),
    appUrl: addressOf(APP, passwords.app, port),
    port,
    version,
    id,
    made,
    pgdata,
    logFile: at.logFile,
    server: child,
    stop: () => (isAlive(child) ? stopPostmaster(child.pid) : Promise.resolve()),
  };
}

function read(file) {
  return existsSync(file) ? readFileSync(file, 'utf8').trim() : '';
}

/** Removes a cluster that was never finished; moves aside one that is not known to be unfinished. */
async function clearUnusable({ pgdata, markFile }, connection, notice) {
  if (existsSync(markFile)) return;
  if (connection?.state === 'making') {
    notice('An earlier first start was cut short. It is done again.');
    rmSync(pgdata, { recursive: true, force: true });
  } else if (isEmpty(pgdata)) {
    if (connection?.state === 'complete')
      notice("The database's folder was gone. A new one is made and filled again.");
    rmSync(pgdata, { recursive: true, force: true });
  } else {
    notice(
      `The database was damaged (files are missing). It was moved to ${moveAside(pgdata)} and a new one made.`,
    );
  }
}

/** Makes a cluster, its roles and its database, and only then marks it as complete. */
async function openNew(at, progress) {
  progress(null, 'making the database');
  const passwords = { admin: newPassword(), owner: newPassword(), app: newPassword() };
  const id = randomUUID();
  writeJson(at.connectionFile, { state: 'making', folder: at.pgdata });
  await makeCluster({ ...at, password: passwords.admin });
  const opened = await open(at, { id, passwords, wish: 0 });
  if (opened.damage) return opened;
  writeJson(at.markFile, { id });
  if (at.user) chownSync(at.markFile, at.user.uid, at.user.gid);
  remember(at, opened);
  return opened;
}

/** Starts a complete cluster; with new passwords if the old ones were lost. */
async function openExisting(at, connection) {
  await giveTo(at.user, at.pgdata, at.children);
  const { id } = readJson(at.markFile) ?? {};
  const known = connection?.state === 'complete' ? connection : undefined;
  const passwords = known?.passwords ?? { admin: newPassword(), owner: newPassword(), app: newPassword() };
  if (!id) return { damage: 'its mark is not whole' };
  if (!known) {
    const { code, output } = await resetAdmin({ ...at, password: passwords.admin });
    if (code !== 0) return failure(at, output);
  }
  const opened = await open(at, { id, passwords, wish: known?.port ?? 0 });
  if (opened.damage === undefined) remember(at, opened);
  return opened;
}

function remember({ connectionFile, pgdata }, { id, port, passwords }) {
  writeJson(connectionFile, { state: 'complete', folder: pgdata, id, port, passwords });
}

/** Starts the server and sees that roles, database and all files are there. */
async function open(at, { id, passwords, wish }) {
  const started = await startOnFreePort(at, wish);
  if (started.damage) return started;
  const { child, port } = started;
  const checked = await ensureDatabase({ ...at, port, passwords });
  const lost = checked.code === 0 ? missingFiles(at.pgdata, checked.files) : [];
  if (checked.code === 0 && lost.length === 0) return { child, port, passwords, id, made: checked.made };
  await stopPostmaster(child.pid);
  if (lost.length > 0) return { damage: `${lost.length} of ${checked.files.length} files are missing` };
  if (sortComplaint(checked.output) === 'password') {
    const reset = await resetAdmin({ ...at, password: passwords.admin });
    // Once: a second refusal has another cause.
    if (reset.code === 0 && !at.wasReset)
      return open({ ...at, wasReset: true }, { id, passwords, wish: port });
  }
  return failure(at, checked.output);
}

async function startOnFreePort(at, wish) {
  const giveUp = Date.now() + 15_000;
  let port = await freePort(wish);
  for (;;) {
    const { child, complaint } = await startPostmaster({ ...at, port });
    if (child) return { child, port };
    const sort = sortComplaint(complaint);
    if ((sort !== 'taken' && sort !== 'held') || Date.now() > giveUp) return failure(at, complaint);
    if (sort === 'taken') port = await freePort();
    else await sleep(300);
  }
}

/** Damage is told to the caller, who can do something about it; a full disk and the unforeseen are thrown. */
function failure(at, text) {
  if (saysDiskFull(text)) throw diskFull(at.pgdata);
  if (sortComplaint(text) === 'damage') return { damage: reasonIn(text) };
  throw new PlainError(`PostgreSQL does not start: ${reasonIn(text)} Its log is ${at.logFile}.`);
}
