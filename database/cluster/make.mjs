import { randomBytes } from 'node:crypto';
import {
  chmodSync,
  chownSync,
  existsSync,
  lstatSync,
  readdirSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join } from 'node:path';
import { diskFull, PlainError, saysDiskFull } from '../../server/toolbox/plain-error.mjs';
import { reasonIn } from './damage.mjs';
import { asideName } from './place.mjs';
import { SPOKEN } from './postmaster.mjs';
import { ADMIN } from './roles.mjs';

/** A password of 32 random letters of base64url. */
export function newPassword() {
  return randomBytes(24).toString('base64url');
}

/** Whether a folder holds nothing, or is not there. */
export function isEmpty(folder) {
  return !existsSync(folder) || readdirSync(folder).length === 0;
}

/**
 * Makes an empty cluster whose superuser has the given password.
 * @throws {PlainError} if initdb fails.
 */
export async function makeCluster({ bin, pgdata, password, user, throwAway, children }) {
  const passwordFile = `${pgdata}.password`;
  writeFileSync(passwordFile, password, { mode: 0o600 });
  if (user) chownSync(passwordFile, user.uid, user.gid);
  const args = ['-D', pgdata, '-U', ADMIN, `--pwfile=${passwordFile}`, '--auth=scram-sha-256', '-E', 'UTF8'];
  args.push('--lc-messages=C', '--no-instructions', ...(throwAway ? ['--no-sync'] : []));
  const options = { ...user, cwd: '/', env: SPOKEN };
  try {
    // Letters beyond ASCII have upper and lower case in C.UTF-8; not every system knows it.
    let made = await children.run(join(bin, 'initdb'), [...args, '--locale=C.UTF-8'], options);
    if (made.code !== 0 && /locale/.test(made.output)) {
      rmSync(pgdata, { recursive: true, force: true });
      made = await children.run(join(bin, 'initdb'), [...args, '--no-locale'], options);
    }
    if (made.code !== 0) {
      if (saysDiskFull(made.output)) throw diskFull(dirname(pgdata));
      throw new PlainError(`PostgreSQL could not make its data folder: ${reasonIn(made.output)}`);
    }
  } finally {
    rmSync(passwordFile, { force: true });
  }
}

/** Moves a folder aside, kept for whoever wants to look. @returns {string} Where it is now. */
export function moveAside(pgdata) {
  const aside = asideName(pgdata);
  renameSync(pgdata, aside);
  return aside;
}

/** Gives a cluster that was copied by another user back to the one who runs the server. */
export async function giveTo(user, pgdata, children) {
  if (user && lstatSync(pgdata).uid !== user.uid)
    await children.run('chown', ['-R', `${user.uid}:${user.gid}`, pgdata]);
  chmodSync(pgdata, 0o700);
}
