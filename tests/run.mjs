// npm test: every check and every test, on a machine that has Node and nothing else of ours.
import { checkNode } from '../server/toolbox/node-version.mjs';

const wrong = checkNode(process.versions.node);
if (wrong) {
  console.error(wrong);
  process.exit(1);
}
// Only now: the rest is written for the Node just checked.
import('./run/test-command.mjs').then(({ test }) => test(process.argv.slice(2)));
