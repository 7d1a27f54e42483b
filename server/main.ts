import { readFileSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { pino } from 'pino';
import { openDatabase } from '#database/client.ts';
import { createApp } from './app.ts';
import { readSigningKeys } from './auth/tokens.ts';
import { readSettings } from './http/settings.ts';
import { startJobs } from './jobs/start-jobs.ts';
import { builtPages, livePages } from './pages.ts';

/** One line of JSON on standard output: how whoever started this process learns how it went. */
function say(line: Record<string, unknown>): void {
  process.stdout.write(`${JSON.stringify(line)}\n`);
}

/** A request is turned away after a second; a start on a busy machine, or beside a cluster's own, may wait longer. */
const START_WAIT_MS = 20_000;

async function waitForDatabase(url: string): Promise<void> {
  const { pool } = openDatabase(url, { max: 1, waitMs: START_WAIT_MS });
  try {
    await pool.query('select 1');
  } finally {
    await pool.end();
  }
}

async function main(): Promise<void> {
  const settings = readSettings(process.env);
  const log = pino({ level: settings.logLevel }, pino.destination(2));
  const keys = readSigningKeys(readFileSync(join(settings.secretsDir, 'keys.json'), 'utf8'));
  await waitForDatabase(settings.databaseUrl);
  const { pool, db } = openDatabase(settings.databaseUrl);
  const deps = { db, clock: { now: () => Date.now() }, random: Math.random };
  const { development, demo, secure } = settings;
  const mountPages = await (development ? livePages(demo) : builtPages(demo));
  const app = createApp({ deps, pool, keys, log, demo, secure, development, mountPages });
  const jobs = await startJobs({ databaseUrl: settings.databaseOwnerUrl, clock: deps.clock, log });

  const server = app.listen(settings.port, settings.host);
  await new Promise<void>((resolve, reject) => {
    server.once('listening', resolve);
    server.once('error', reject);
  });
  const { address, port } = server.address() as AddressInfo;
  say({ listening: `http://${address.includes(':') ? `[${address}]` : address}:${port}` });

  let stopping = false;
  const stop = (): void => {
    if (stopping) return;
    stopping = true;
    app.locals.stopping = true;
    // What is in flight gets eight seconds; idle connections none.
    const hurry = setTimeout(() => server.closeAllConnections(), 8_000);
    server.close(async () => {
      clearTimeout(hurry);
      await jobs.stop();
      await pool.end();
      process.exit(0);
    });
    server.closeIdleConnections();
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
}

main().catch((error: unknown) => {
  const { code, port, message } = error as NodeJS.ErrnoException & { port?: number };
  say({
    problem:
      code === 'EADDRINUSE'
        ? `Port ${port} is taken.`
        : code === 'ECONNREFUSED'
          ? 'The database does not answer.'
          : message,
    ...(code ? { code } : {}),
  });
  process.exit(1);
});
