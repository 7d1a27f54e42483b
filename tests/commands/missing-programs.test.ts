import { chmodSync, existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ensurePrograms, findPrograms } from '#database/cluster/programs.mjs';
import { Children } from '#server/toolbox/children.mjs';
import { installPackages } from '#server/toolbox/debian.mjs';
import { findChromium } from '#tests/support/chromium.mjs';

let folder: string;
const path = process.env.PATH;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'sixteenfold-programs-'));
});

afterEach(() => {
  process.env.PATH = path;
  rmSync(folder, { recursive: true });
});

/** Writes a small shell program. */
function program(file: string, body: string): void {
  mkdirSync(join(folder, file, '..'), { recursive: true });
  writeFileSync(join(folder, file), `#!/bin/sh\n${body}\n`);
  chmodSync(join(folder, file), 0o755);
}

function postgres(place: string, version: string): void {
  program(`${place}/postgres`, `echo 'postgres (PostgreSQL) ${version}'`);
  program(`${place}/initdb`, 'exit 1');
  program(`${place}/psql`, 'exit 1');
}

describe('finding PostgreSQL', () => {
  it('takes the newest of those that are whole and new enough', async () => {
    postgres('lib/13/bin', '13.11 (Debian 13.11-0)');
    postgres('lib/15/bin', '15.18 (Debian 15.18-0+deb12u1)');
    postgres('lib/9/bin', '9.6.24');
    program('lib/17/bin/psql', 'exit 0');
    postgres('own', '16.2');
    const found = await findPrograms(new Children(), {
      versioned: [join(folder, 'lib'), join(folder, 'none')],
      path: join(folder, 'own'),
    });
    expect(found.map(({ version }) => version)).toEqual([16, 15]);
  });

  it('asks pg_config where they are', async () => {
    postgres('elsewhere', '15.1');
    program('bin/pg_config', `echo '${join(folder, 'elsewhere')}'`);
    const found = await findPrograms(new Children(), { versioned: [], path: join(folder, 'bin') });
    expect(found).toEqual([{ bin: join(folder, 'elsewhere'), version: 15 }]);
  });

  it('says which command to run where it may not install it', async () => {
    // No apt on this path, so nothing can be installed.
    process.env.PATH = join(folder, 'nothing');
    const nowhere = { versioned: [join(folder, 'lib')], path: join(folder, 'nothing') };
    await expect(ensurePrograms({ children: new Children(), places: nowhere })).rejects.toThrow(
      /^PostgreSQL \(14 or newer\) was not found, and only an administrator can install it\. Run: sudo apt-get install postgresql .*then run this command again\.$/,
    );
  });
});

describe('installing what is missing', () => {
  it('reads the lists, then installs, with the preparation first', async () => {
    const log = join(folder, 'log');
    program('bin/apt-get', `echo "apt-get $*" >> ${log}; echo 'Setting up things (1.0) ...'`);
    program('bin/sudo', 'shift; exec "$@"');
    process.env.PATH = `${join(folder, 'bin')}:${path}`;
    const heard: string[] = [];
    await installPackages({
      packages: ['things'],
      what: 'Things were',
      children: new Children(),
      progress: (_percent: number | null, text: string) => heard.push(text),
      prepare: async () => writeFileSync(log, 'prepared\n', { flag: 'a' }),
    });
    expect(readFileSync(log, 'utf8').trim().split('\n')).toEqual([
      expect.stringContaining('apt-get --version'),
      'prepared',
      'apt-get update',
      expect.stringMatching(/^apt-get install -y .*things$/),
    ]);
    expect(heard).toEqual(['reading the list of packages', 'installing things', 'Setting up things (1.0)']);
  });

  it('says why it failed and what to try', async () => {
    program(
      'bin/apt-get',
      `[ "$1" = install ] && { echo 'E: Unable to locate package things' >&2; exit 100; }; exit 0`,
    );
    program('bin/sudo', 'shift; exec "$@"');
    process.env.PATH = `${join(folder, 'bin')}:${path}`;
    const job = { packages: ['things'], what: 'Things were', children: new Children() };
    await expect(installPackages(job)).rejects.toThrow(
      'Installing things failed (E: Unable to locate package things). Try it by hand: sudo apt-get install things',
    );
  });
});

describe('finding Chromium', () => {
  it('goes by CHROMIUM_PATH, then by the usual places, then by the path', () => {
    program('own/chromium', 'exit 0');
    program('usual', 'exit 0');
    const own = join(folder, 'own/chromium');
    const usual = join(folder, 'usual');
    expect(findChromium({ CHROMIUM_PATH: own }, [usual])).toBe(own);
    expect(findChromium({ PATH: join(folder, 'own') }, [usual])).toBe(usual);
    expect(findChromium({ PATH: join(folder, 'own') }, [])).toBe(own);
    expect(findChromium({ PATH: folder }, [])).toBeUndefined();
    expect(() => findChromium({ CHROMIUM_PATH: join(folder, 'none') }, [usual])).toThrow(
      /is not a program\.$/,
    );
    expect(existsSync(own)).toBe(true);
  });
});
