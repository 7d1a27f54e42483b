// npm run dev: the product with its pages from their sources, and reload.
import { checkNode } from './toolbox/node-version.mjs';

const wrong = checkNode(process.versions.node);
if (wrong) {
  console.error(wrong);
  process.exit(1);
}
// Only now: the rest is written for the Node just checked.
import('./toolbox/dev-command.mjs').then(({ develop }) => develop());
