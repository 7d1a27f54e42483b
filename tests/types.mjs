import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

// Two compile checks: everything with the DOM's and Node's types, and shared/ once more with neither, which
// proves that it needs neither.
const root = fileURLToPath(new URL('..', import.meta.url));
let failed = false;
for (const project of ['.', 'shared']) {
  const { status } = spawnSync(process.execPath, ['node_modules/typescript/bin/tsc', '-p', project], {
    cwd: root,
    stdio: 'inherit',
  });
  failed ||= status !== 0;
}
process.exitCode = failed ? 1 : 0;
