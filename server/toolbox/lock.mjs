import { linkSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { endGroup } from './children.mjs';
import { readJson, writeJson } from './files.mjs';
import { PlainError } from './plain-error.mjs';
import { processBirth } from './processes.mjs';

/**
 * Makes this process the only one that works in a data folder, and ends what an earlier one left running
 * when it was killed.
 * @param {string} dataDir Absolute and real (no links), existing.
 * @returns {Promise<{keep: (children: {pid: number, birth: string}[]) => void, release: () => void}>}
 *   `keep` notes the processes that the next owner must end should this one be killed.
 * @throws {PlainError} if another living process holds the folder.
 */
export async function lockFolder(dataDir) {
  const file = join(dataDir, 'lock.json');
  const mine = { dataDir, pid: process.pid, birth: processBirth(process.pid), children: [] };
  for (let attempt = 0; !take(file, mine); attempt++) {
    const other = readJson(file);
    // A folder copied from elsewhere brings a lock that speaks of the other folder's processes.
    const here = other?.dataDir === dataDir;
    if (here && processBirth(other.pid) === other.birth)
      throw new PlainError(
        `Sixteenfold is already running from this folder (process ${other.pid}). Stop that one first, or run a second one with data of its own: DATA_DIR=.data2 PORT=3001 npm start`,
      );
    if (attempt > 3) throw new PlainError(`The file ${file} cannot be replaced. Remove it and try again.`);
    if (here) await Promise.all(other.children.map((child) => endGroup(child, 8_000)));
    // Only the lock that was looked at is removed, not one that a third process has taken meanwhile.
    if (readJson(file)?.birth === other?.birth) rmSync(file, { force: true });
  }
  let released = false;
  return {
    keep(children) {
      if (released) return;
      mine.children = children;
      writeJson(file, mine);
    },
    release() {
      released = true;
      if (readJson(file)?.birth === mine.birth) rmSync(file, { force: true });
    },
  };
}

/** Puts the lock in place if there is none: a hard link is made once or not at all. */
function take(file, mine) {
  const draft = `${file}.${process.pid}`;
  writeJson(draft, mine);
  try {
    linkSync(draft, file);
    return true;
  } catch (error) {
    if (error.code !== 'EEXIST') throw error;
    return false;
  } finally {
    rmSync(draft, { force: true });
  }
}
