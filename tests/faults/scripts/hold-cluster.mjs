// Takes the data folder named on the command line, opens its cluster, says so and waits to be killed.
import { mkdirSync, realpathSync } from 'node:fs';
import { openCluster } from '../../../database/cluster.mjs';
import { Children } from '../../../server/toolbox/children.mjs';
import { lockFolder } from '../../../server/toolbox/lock.mjs';

mkdirSync(process.argv[2], { recursive: true, mode: 0o711 });
const dataDir = realpathSync(process.argv[2]);
const lock = await lockFolder(dataDir);
const cluster = await openCluster({ dataDir, children: new Children(lock.keep), throwAway: true });
console.log(`open ${cluster.server.pid}`);
setInterval(() => {}, 60_000);
