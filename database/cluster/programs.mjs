import { accessSync, constants, existsSync, readdirSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { installPackages, refuseMainCluster } from '../../server/toolbox/debian.mjs';
import { PlainError } from '../../server/toolbox/plain-error.mjs';

/** The oldest PostgreSQL that will do. */
const OLDEST = 14;
const NEEDED = ['postgres', 'initdb', 'psql'];

/** Where PostgreSQL's programs are looked for. */
export const USUAL_PLACES = {
  /** Folders with one folder per major version, each with a bin: Debian's, Red Hat's, Homebrew's. */
  versioned: ['/usr/lib/postgresql', '/usr/pgsql', '/opt/homebrew/opt', '/usr/local/opt'],
  path: process.env.PATH ?? '',
};

function complete(folder) {
  return NEEDED.every((program) => {
    try {
      accessSync(join(folder, program), constants.X_OK);
      return true;
    } catch {
      return false;
    }
  });
}

function foldersOfVersions(parent) {
  if (!existsSync(parent)) return [];
  return readdirSync(parent)
    .filter((name) => /^(postgresql@)?\d+$/.test(name))
    .map((name) => join(parent, name, 'bin'));
}

/**
 * All usable installations, newest first.
 * @param {import('../../server/toolbox/children.mjs').Children} children
 * @param {{versioned: string[], path: string}} [places]
 * @returns {Promise<{bin: string, version: number}[]>} Folder of the programs and major version.
 */
export async function findPrograms(children, places = USUAL_PLACES) {
  const onPath = places.path.split(delimiter).filter(Boolean);
  const folders = [...places.versioned.flatMap(foldersOfVersions), ...onPath];
  for (const folder of onPath.filter((each) => existsSync(join(each, 'pg_config')))) {
    const { code, output } = await children.run(join(folder, 'pg_config'), ['--bindir']);
    if (code === 0) folders.push(output.trim());
  }
  const found = [];
  for (const bin of new Set(folders)) {
    if (!complete(bin)) continue;
    const { output } = await children.run(join(bin, 'postgres'), ['--version']);
    // "postgres (PostgreSQL) 15.18 (Debian 15.18-0+deb12u1)"
    const version = Number(/\(PostgreSQL\) (\d+)/.exec(output)?.[1]);
    if (version >= OLDEST) found.push({ bin, version });
  }
  return found.sort((a, b) => b.version - a.version);
}

/**
 * Finds PostgreSQL's programs, or installs them.
 * @param {{children: import('../../server/toolbox/children.mjs').Children, wanted?: number,
 *   progress?: (percent: number | null, text: string) => void, places?: {versioned: string[], path: string}}} need
 *   `wanted` is the major version that existing data was made with.
 * @returns {Promise<{bin: string, version: number}>}
 * @throws {PlainError} if there are none and they cannot be installed, or not of the wanted version.
 */
export async function ensurePrograms({ children, wanted, progress, places }) {
  let found = await findPrograms(children, places);
  if (found.length === 0) {
    await installPackages({
      packages: ['postgresql'],
      what: `PostgreSQL (${OLDEST} or newer) was`,
      children,
      progress,
      prepare: (before) => refuseMainCluster(before, children),
    });
    found = await findPrograms(children, places);
    if (found.length === 0)
      throw new PlainError(
        `PostgreSQL was installed, but its programs (${NEEDED.join(', ')}) were not found.`,
      );
  }
  const fit = wanted === undefined ? found[0] : found.find(({ version }) => version === wanted);
  if (!fit)
    throw new PlainError(
      `The data here was made by PostgreSQL ${wanted}, and only ${found.map((each) => each.version).join(', ')} is installed. Run: sudo apt-get install postgresql-${wanted}, or start with empty data: DATA_DIR=.data2 before the command.`,
    );
  return fit;
}
