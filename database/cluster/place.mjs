import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chownSync, lstatSync, mkdirSync, readFileSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { PlainError } from '../../server/toolbox/plain-error.mjs';

/**
 * The user that PostgreSQL's programs run as: they refuse to run as root.
 * @returns {{uid: number, gid: number} | null} null: the one who runs this program.
 * @throws {PlainError} for root on a machine without the user `postgres`.
 */
export function serverUser() {
  if (process.getuid?.() !== 0) return null;
  // passwd(5): name:password:uid:gid:…
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((each) => each.startsWith('postgres:'));
  if (!line)
    throw new PlainError(
      'PostgreSQL does not run as root, and this machine has no user "postgres" to run it as. Run this command as an ordinary user.',
    );
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
}

/** Whether a user can step into a folder: each folder above must let it through too. */
function canEnter(folder, user) {
  return spawnSync('/bin/sh', ['-c', 'cd -- "$1"', 'sh', folder], { ...user, cwd: '/' }).status === 0;
}

/**
 * Chooses the folder that holds the cluster: inside the data folder, or where the server's user cannot reach
 * that, one under /var/tmp that belongs to this data folder alone.
 * @param {string} dataDir Absolute, real, existing.
 * @param {{uid: number, gid: number} | null} user From `serverUser`.
 * @param {string} [common] A folder that everyone may pass through.
 * @returns {{folder: string, user: {uid: number, gid: number} | null}} An existing folder and the user who
 *   owns it and runs the server; the cluster is its folder `pgdata`.
 */
export function placeFor(dataDir, user, common = '/var/tmp') {
  const inside = join(dataDir, 'cluster');
  mkdirSync(inside, { recursive: true, mode: 0o700 });
  if (!user) return { folder: inside, user };
  // Root may be starting what an ordinary user made: it goes on under that user.
  const owner = lstatSync(inside);
  const insideUser = owner.uid === 0 ? user : { uid: owner.uid, gid: owner.gid };
  chownSync(inside, insideUser.uid, insideUser.gid);
  if (canEnter(inside, insideUser)) return { folder: inside, user: insideUser };

  const key = createHash('sha256').update(dataDir).digest('hex').slice(0, 16);
  const outside = join(common, `sixteenfold-${key}`);
  mkdirSync(outside, { recursive: true, mode: 0o700 });
  // Others may write in such a folder: what they put there under our name is not used.
  const about = lstatSync(outside);
  if (!about.isDirectory() || (about.uid !== 0 && about.uid !== user.uid))
    throw new PlainError(`${outside} belongs to someone else; move it away and run the command again.`);
  chownSync(outside, user.uid, user.gid);
  if (canEnter(outside, user)) return { folder: outside, user };
  throw new PlainError(
    `The user "postgres" can enter neither ${dataDir} nor ${common}. Choose a folder that everyone may pass through: DATA_DIR=… before the command.`,
  );
}

/** A name beside `folder` to move it to, with the time, so that nothing is ever overwritten. */
export function asideName(folder, now = new Date()) {
  const time = now.toISOString().slice(0, 19).replaceAll(/[:T]/g, '-');
  return join(dirname(folder), `${basename(folder)}.broken-${time}`);
}
