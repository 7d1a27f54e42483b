// npm start: from a fresh clone to a running product, and again in a few seconds the next time.
import { checkNode } from './toolbox/node-version.mjs';

const wrong = checkNode(process.versions.node);
if (wrong) {
  console.error(wrong);
  process.exit(1);
}
// Only now: the rest is written for the Node just checked.
import('./toolbox/start-command.mjs').then(({ start }) => start());
