import { existsSync } from 'node:fs';
import { join } from 'node:path';

/** What PostgreSQL says of files that are missing, cut off or scrambled. */
const DAMAGE =
  /No such file or directory|could not (open|read|access|find|locate)|is missing|invalid (page|checkpoint|primary|magic|data)|incorrect checksum|cache lookup failed|PANIC|corrupt|is not a database cluster|not a valid|is not a valid data directory|does not exist/i;

/** Sorts what a server or psql said before it gave up. @returns {'taken' | 'held' | 'password' | 'damage' | 'other'} */
export function sortComplaint(text) {
  if (/could not bind|Address already in use/.test(text)) return 'taken';
  // The processes of a killed server need a moment to notice.
  if (/pre-existing shared memory|lock file .* already exists/.test(text)) return 'held';
  if (/password authentication failed|no password supplied/.test(text)) return 'password';
  return DAMAGE.test(text) ? 'damage' : 'other';
}

/** The first sentence of a complaint that says why. */
export function reasonIn(text) {
  const lines = text.split('\n');
  const worst = lines.findLast((line) => /(FATAL|PANIC|ERROR|error):/.test(line)) ?? lines.findLast(Boolean);
  return (worst ?? 'it gave no reason').replace(/^.*?(FATAL|PANIC|ERROR|error):\s*/, '').trim();
}

/** The files that a database should have and has not. */
export function missingFiles(pgdata, files) {
  return files.filter((file) => !existsSync(join(pgdata, file)));
}
