import { describe, expect, it } from 'vitest';
import { reasonIn, sortComplaint } from '#database/cluster/damage.mjs';
import { aptCommands, asAdministrator, withoutMainCluster } from '#server/toolbox/debian.mjs';
import { checkNode } from '#server/toolbox/node-version.mjs';
import { explain, PlainError } from '#server/toolbox/plain-error.mjs';
import { portProblem, readPort } from '#server/toolbox/ports.mjs';

describe('the check of Node', () => {
  // package.json, "engines": >=20.12 <23
  it.each(['20.12.0', '20.20.2', '21.7.3', '22.23.0'])('lets %s pass', (version) => {
    expect(checkNode(version)).toBe('');
  });
  it.each(['8.17.0', '18.20.4', '20.11.1', '23.0.0', '24.1.0'])(
    'refuses %s in a sentence that names it',
    (version) => {
      expect(checkNode(version)).toMatch(
        /^Sixteenfold needs Node 20 .* Install Node 20 and run the command again\.$/,
      );
      expect(checkNode(version)).toContain(`this is Node ${version}.`);
    },
  );
});

describe('PORT', () => {
  it('is 3000 unless told', () => {
    expect([readPort(undefined), readPort(''), readPort('0'), readPort('65535')]).toEqual([
      3000, 3000, 0, 65_535,
    ]);
  });
  it.each(['65536', '-1', '3000x', ' 3000', '3e3', '1.5'])('may not be "%s"', (text) => {
    expect(() => readPort(text)).toThrow(`not "${text}". For example: PORT=3001 npm start`);
  });
  it('says how to choose another when it is taken', () => {
    expect(portProblem('EADDRINUSE', '127.0.0.1', 3000).message).toBe(
      'Port 3000 is taken by another program. Choose another one: PORT=3001 npm start',
    );
    expect(portProblem('EADDRINUSE', '127.0.0.1', 65_535).message).toContain('PORT=3000 npm start');
    expect(portProblem('EACCES', '127.0.0.1', 80).message).toContain('above 1023');
    expect(portProblem('ENOTFOUND', 'nowhere', 3000).message).toContain('no address "nowhere"');
  });
});

describe('a problem', () => {
  it('is told in one sentence, without a stack', () => {
    const full = Object.assign(new Error('ENOSPC: no space left on device, write'), { code: 'ENOSPC' });
    expect(explain(full, '/data')).toMatch(/^The disk that holds \/data is full\./);
    const barred = Object.assign(new Error('EACCES'), { code: 'EACCES', path: '/data/lock.json' });
    expect(explain(barred, '/data')).toMatch(/^This user may not write \/data\/lock\.json\./);
    expect(explain(new PlainError('Plainly.'), '/data')).toBe('Plainly.');
    expect(explain(new TypeError('x is not a function\n    at there'), '/data')).toBe(
      'Something unforeseen went wrong: x is not a function',
    );
    expect(explain('thrown text', '/data')).toBe('Something unforeseen went wrong: thrown text');
  });
});

describe('what PostgreSQL says when it gives up', () => {
  // Words of PostgreSQL 15, taken from its log after each fault was made on purpose.
  it.each([
    [
      'FATAL:  could not create any TCP/IP sockets\nLOG:  could not bind IPv4 address "127.0.0.1": Address already in use',
      'taken',
    ],
    ['FATAL:  lock file "postmaster.pid" already exists', 'held'],
    ['FATAL:  pre-existing shared memory block (key 1, ID 2) is still in use', 'held'],
    ['psql: error: FATAL:  password authentication failed for user "sixteenfold_admin"', 'password'],
    ['PANIC:  could not locate a valid checkpoint record', 'damage'],
    ['FATAL:  "/data/pgdata" is not a valid data directory', 'damage'],
    ['FATAL:  could not open directory "pg_notify": No such file or directory', 'damage'],
    ['FATAL:  could not map anonymous shared memory: Cannot allocate memory', 'other'],
  ])('"%s" means: %s', (text, sort) => {
    expect(sortComplaint(text)).toBe(sort);
  });
  it('is cut down to its reason', () => {
    const log =
      '2026-01-01 UTC [1] LOG:  starting\n2026-01-01 UTC [1] FATAL:  could not open file "x"\n2026-01-01 UTC [1] LOG:  shut down\n';
    expect(reasonIn(log)).toBe('could not open file "x"');
    expect(reasonIn('')).toBe('it gave no reason');
  });
});

describe('installing a Debian package', () => {
  const machine = (uid: number, working: readonly string[]) => ({
    uid,
    has: async (command: string) => working.includes(command),
  });

  it('works as root and through sudo, and nowhere without apt', async () => {
    expect(await asAdministrator(machine(0, ['apt-get']))).toEqual([]);
    expect(await asAdministrator(machine(1000, ['apt-get', 'sudo']))).toEqual(['sudo', '-n']);
    expect(await asAdministrator(machine(1000, ['apt-get']))).toBeNull();
    expect(await asAdministrator(machine(0, []))).toBeNull();
  });

  it('asks nothing and waits for another apt', () => {
    const [update, install] = aptCommands(['sudo', '-n'], ['postgresql']);
    expect(update?.join(' ')).toBe(
      'sudo -n env DEBIAN_FRONTEND=noninteractive UCF_FORCE_CONFFOLD=1 apt-get update',
    );
    expect(install?.join(' ')).toBe(
      'sudo -n env DEBIAN_FRONTEND=noninteractive UCF_FORCE_CONFFOLD=1 apt-get install -y --no-install-recommends -o DPkg::Lock::Timeout=300 -o Dpkg::Options::=--force-confold postgresql',
    );
  });

  it('keeps PostgreSQL’s package from making a cluster of its own', () => {
    const said = 'create_main_cluster = false';
    expect(withoutMainCluster()).toContain(`\n${said}\n`);
    // The file as Debian ships it has the line as a comment.
    const shipped = "ssl = on\n#create_main_cluster = true\n#start_conf = 'auto'";
    expect(withoutMainCluster(shipped)).toMatch(
      /^ssl = on\n#create_main_cluster = true\n[\s\S]*\ncreate_main_cluster = false\n$/,
    );
    expect(withoutMainCluster('create_main_cluster = true\n')).toMatch(/^# create_main_cluster = true\n/);
    expect(withoutMainCluster(`${said}\n`)).toBeNull();
  });
});
