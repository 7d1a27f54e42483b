import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { PlainError } from './plain-error.mjs';

/**
 * How to install a Debian package here.
 * @param {{uid: number, has: (command: string, args: string[]) => Promise<boolean>}} machine `has` runs a
 *   command and says whether it ended well.
 * @returns {Promise<string[] | null>} The words to put before `apt-get`, or null where it cannot be done.
 */
export async function asAdministrator({ uid, has }) {
  if (!(await has('apt-get', ['--version']))) return null;
  if (uid === 0) return [];
  // -n: never ask for a password, fail instead.
  return (await has('sudo', ['-n', 'true'])) ? ['sudo', '-n'] : null;
}

/** The two commands that install packages without asking anything. */
export function aptCommands(before, packages) {
  const quiet = ['env', 'DEBIAN_FRONTEND=noninteractive', 'UCF_FORCE_CONFFOLD=1', 'apt-get'];
  // Another apt may be running: wait for it instead of failing.
  const patient = ['-o', 'DPkg::Lock::Timeout=300', '-o', 'Dpkg::Options::=--force-confold'];
  return [
    [...before, ...quiet, 'update'],
    [...before, ...quiet, 'install', '-y', '--no-install-recommends', ...patient, ...packages],
  ];
}

/**
 * Installs Debian packages.
 * @param {{packages: string[], what: string, children: import('./children.mjs').Children,
 *   progress?: (percent: number | null, text: string) => void, prepare?: (before: string[]) => Promise<void>}} job
 *   `what` names what is missing in the sentence for a person; `prepare` runs first.
 * @throws {PlainError} with the command to run by hand, if it cannot be done here.
 */
export async function installPackages({ packages, what, children, progress = () => {}, prepare }) {
  const byHand = `sudo apt-get install ${packages.join(' ')}`;
  const before = await asAdministrator({
    uid: process.getuid?.() ?? -1,
    has: async (command, args) => (await children.run(command, args)).code === 0,
  });
  if (!before)
    throw new PlainError(
      `${what} not found, and only an administrator can install it. Run: ${byHand} (or your system's package of that name), then run this command again.`,
    );
  await prepare?.(before);
  const [update, install] = aptCommands(before, packages);
  progress(null, 'reading the list of packages');
  // A failed update is not the end: the lists that are there may do.
  await children.run(update[0], update.slice(1));
  progress(null, `installing ${packages.join(', ')}`);
  const { code, output } = await children.run(install[0], install.slice(1), {
    onLine: (line) => /^(Unpacking|Setting up)/.test(line) && progress(null, line.replace(/ \.\.\.$/, '')),
  });
  if (code !== 0) {
    const said = output.split('\n').findLast((line) => /^E: /.test(line)) ?? 'it gave no reason';
    throw new PlainError(`Installing ${packages.join(', ')} failed (${said}). Try it by hand: ${byHand}`);
  }
}

const CLUSTER_CONF = '/etc/postgresql-common/createcluster.conf';

/**
 * Debian's server package makes and starts a cluster of its own on port 5432 unless this file says no.
 * @param {string} [existing] What the file holds so far.
 * @returns {string | null} What it should hold while the package is installed; null to leave it as it is.
 */
export function withoutMainCluster(existing = '') {
  if (/^\s*create_main_cluster\s*=\s*(false|off|no|0)\s*$/m.test(existing)) return null;
  const rest = existing.replace(/^\s*create_main_cluster\s*=.*$/gm, '# $&');
  return `${rest}${rest && !rest.endsWith('\n') ? '\n' : ''}# No cluster beside the ones that programs make for themselves.\ncreate_main_cluster = false\n`;
}

/** Tells Debian's package not to make a cluster. Written as root, or through sudo. */
export async function refuseMainCluster(before, children) {
  const text = withoutMainCluster(existsSync(CLUSTER_CONF) ? readFileSync(CLUSTER_CONF, 'utf8') : '');
  if (text === null) return;
  if (before.length === 0) {
    mkdirSync('/etc/postgresql-common', { recursive: true });
    writeFileSync(CLUSTER_CONF, text);
    return;
  }
  await children.run(before[0], [...before.slice(1), 'mkdir', '-p', '/etc/postgresql-common']);
  await children.run(before[0], [...before.slice(1), 'tee', CLUSTER_CONF], { input: text });
}
