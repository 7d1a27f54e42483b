import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { checkDocuments } from './verify/docs.mjs';
import { checkHonesty, checkLock, checkTop } from './verify/house.mjs';
import { checkImports } from './verify/imports.mjs';

const root = fileURLToPath(new URL('..', import.meta.url)).replace(/\/$/, '');

/** The checks that need no program beside Node: what each proves, and the faults that it finds. */
export const CHECKS = [
  ['What the documents name is there', checkDocuments],
  ['Imports go the right way', checkImports],
  ['The lock file names no registry', checkLock],
  ['Nothing new lies at the top', checkTop],
  ['No test is skipped, no check silenced', checkHonesty],
];

/** npm run verify: everything about the code that can be said without running it. */
function verify() {
  let failed = 0;
  const tell = (name, faults) => {
    console.log(`${faults.length === 0 ? 'ok    ' : 'FAILED'} ${name}`);
    for (const fault of faults) console.log(`         ${fault}`);
    failed += faults.length === 0 ? 0 : 1;
  };
  for (const [name, check] of CHECKS) tell(name, check(root));
  for (const [name, args] of [
    ['Types', ['tests/types.mjs']],
    ['Lint', ['node_modules/@biomejs/biome/bin/biome', 'check', '.']],
  ]) {
    const { status } = spawnSync(process.execPath, args, { cwd: root, stdio: 'inherit' });
    tell(name, status === 0 ? [] : ['see above']);
  }
  process.exitCode = failed > 0 ? 1 : 0;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) verify();
