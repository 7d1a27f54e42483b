import { runCommand } from './command.mjs';
import { readyDatabase } from './database-ready.mjs';
import { ensurePackages } from './packages.mjs';
import { explain } from './plain-error.mjs';
import { startServer } from './server-process.mjs';
import { tellPeople } from './start-command.mjs';
import { watchSources } from './watch.mjs';
import { dataFolder, root, takeWorkplace } from './workplace.mjs';

/** What the server process is made of; pages and renderer reload in the browser by themselves. */
const SERVER_SOURCES = ['server', 'database', 'shared'];

/** Everything `npm run dev` does; ends with the process. */
export function develop() {
  return runCommand({
    place: dataFolder(),
    async body(command) {
      const { steps, children, onEnd } = command;
      steps.line('Sixteenfold, for development');
      const { dataDir, host, port, env } = await takeWorkplace(command);
      await steps.run('Packages', (progress) => ensurePackages({ root, children, progress }));
      const { ownerUrl, appUrl } = await readyDatabase({ root, dataDir, env, command });
      const how = {
        root,
        env: { ...env, NODE_ENV: 'development', DATABASE_URL: appUrl, DATABASE_OWNER_URL: ownerUrl },
        logFile: null,
        host,
        port,
        children,
      };

      let server;
      let stopped = false;
      /** Starts are queued: a change during a restart is followed by one more. */
      let queue = Promise.resolve();
      const restart = (reason) => {
        queue = queue.then(async () => {
          if (stopped) return;
          const began = performance.now();
          const old = server;
          server = undefined;
          await old?.stop();
          try {
            const started = await startServer(how);
            server = started;
            started.ended.then((code) => {
              if (server === started && !stopped)
                steps.line(`  The server ended by itself (exit code ${code}). Waiting for a change.`);
            });
            if (reason) steps.line(`  ${reason} changed: up again in ${seconds(began)} s`);
          } catch (error) {
            if (!stopped) steps.line(`  ${explain(error, dataDir)} Waiting for a change.`);
          }
        });
        return queue;
      };
      onEnd(async () => {
        stopped = true;
        await server?.stop();
      });
      await restart('');
      onEnd(watchSources(root, SERVER_SOURCES, restart));
      if (server) tellPeople(steps, server.address, env.DEMO === '1');
      return new Promise(() => {});
    },
  });
}

function seconds(began) {
  return ((performance.now() - began) / 1000).toFixed(1);
}
