import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { checkDocuments } from '#tests/verify/docs.mjs';
import { checkHonesty, checkLock, checkTop } from '#tests/verify/house.mjs';
import { checkImports } from '#tests/verify/imports.mjs';

let repository: string;

beforeEach(() => {
  repository = mkdtempSync(join(tmpdir(), 'sixteenfold-verify-'));
});

afterEach(() => rmSync(repository, { recursive: true }));

function write(file: string, text: string): void {
  mkdirSync(dirname(join(repository, file)), { recursive: true });
  writeFileSync(join(repository, file), text);
}

it('finds paths and scripts in the documents that are not there', () => {
  write('package.json', '{"scripts": {"dev": "x"}}');
  write('server/main.ts', '');
  write(
    'README.md',
    'See `server/main.ts`, `main.ts`, `./x.ts`, `none.ts`, `server/gone.ts`, `/today`, `text/csv` and `.data/x`.\n`npm run dev`',
  );
  write('DEVELOPERS.md', '[look](server/main.ts) ![picture](public/none.png)\n`npm run -s nothing`');
  expect(checkDocuments(repository)).toEqual([
    'README.md:1: none.ts does not exist',
    'README.md:1: server/gone.ts does not exist',
    'DEVELOPERS.md:1: public/none.png does not exist',
    'DEVELOPERS.md:2: there is no npm script nothing',
  ]);
});

it('finds imports that go the wrong way', () => {
  write('shared/rule.ts', "import { query } from '#database/query.ts';\n");
  write('database/query.ts', "import { rule } from '../shared/rule.ts';\n");
  write('server/app.ts', "import './gone.ts';\nimport { query } from '#database/query';\n");
  write(
    'pages/page.tsx',
    "import type { App } from '#server/app.ts';\nimport { app } from '#server/app.ts';\n",
  );
  write('server/start.mjs', "import pg from 'pg';\n");
  write('shared/contracts/thing.ts', "import { z } from 'zod';\n");
  write('shared/contracts/sizes.ts', 'export const MOST = 5;\n');
  write(
    'renderer/thing.tsx',
    "import type { Thing } from '#shared/contracts/thing.ts';\nimport { type Thing, thing } from '#shared/contracts/thing.ts';\nimport { MOST } from '#shared/contracts/sizes.ts';\n",
  );
  write('pages/+data.server.ts', "import { thing } from '#shared/contracts/thing.ts';\n");
  expect(checkImports(repository)).toEqual([
    'pages/page.tsx:2: pages/ may not import from server/',
    "renderer/thing.tsx:2: '#shared/contracts/thing.ts' brings the schema library to the browser: import its types, or a file without schemas",
    "server/app.ts:1: './gone.ts' does not exist",
    "server/app.ts:2: '#database/query' has no file extension",
    "server/start.mjs:1: 'pg': this script runs before the packages are installed, it may only import from Node",
    'shared/rule.ts:1: shared/ may not import from database/',
    "database/query.ts:1: '../shared/rule.ts' goes into another top folder: write '#shared/rule.ts'",
  ]);
});

it('finds skipped tests, silenced checks, strangers at the top and a lock file that names its source', () => {
  // In pieces: this very file is looked at too.
  write('tests/a.test.ts', ['it', "skip('x', () => {})"].join('.'));
  write('server/a.ts', ['// @ts', 'ignore'].join('-'));
  write('notes.txt', '');
  write('package-lock.json', '{\n"resolved": "x" }');
  expect(checkHonesty(repository)).toEqual([
    'server/a.ts:1: @ts-' + 'ignore',
    'tests/a.test.ts:1: it.' + 'skip',
  ]);
  expect(checkTop(repository)).toEqual([expect.stringMatching(/^notes\.txt: /)]);
  expect(checkLock(repository)).toEqual(['package-lock.json:2: names where a package came from']);
});
