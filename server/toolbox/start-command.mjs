import { join } from 'node:path';
import { accountLines, addressToType } from './accounts.mjs';
import { runCommand } from './command.mjs';
import { readyDatabase } from './database-ready.mjs';
import { ensurePackages } from './packages.mjs';
import { ensurePages } from './pages.mjs';
import { startServer } from './server-process.mjs';
import { dataFolder, root, takeWorkplace } from './workplace.mjs';

/** Everything `npm start` does; ends with the process. */
export function start() {
  return runCommand({
    place: dataFolder(),
    async body(command) {
      const { steps, children, onEnd } = command;
      steps.line('Sixteenfold');
      const { dataDir, host, port, env } = await takeWorkplace(command);
      await steps.run('Packages', (progress) => ensurePackages({ root, children, progress }));
      const { ownerUrl, appUrl } = await readyDatabase({ root, dataDir, env, command });
      await steps.run('Pages', (progress) => ensurePages({ root, children, progress }));
      const logFile = join(dataDir, 'server.log');
      const server = await steps.run('Server', async () => {
        const started = await startServer({
          root,
          env: { ...env, NODE_ENV: 'production', DATABASE_URL: appUrl, DATABASE_OWNER_URL: ownerUrl },
          logFile,
          host,
          port,
          children,
        });
        return [`up, its log is ${logFile}`, started];
      });
      let stopping = false;
      onEnd(() => {
        stopping = true;
        return server.stop();
      });
      tellPeople(steps, server.address, env.DEMO === '1');
      const code = await server.ended;
      if (!stopping) command.fail(`The server ended by itself (exit code ${code}). Its log is ${logFile}.`);
      return 0;
    },
  });
}

/** Where to go and who to be. */
export function tellPeople(steps, address, demo) {
  steps.line();
  steps.line(`Open ${addressToType(address)}`);
  if (demo) {
    steps.line('Sign in as one of these (sign-in, password):');
    for (const line of accountLines(root)) steps.line(line);
  }
  steps.line();
  steps.line('Ctrl-C stops it.');
}
