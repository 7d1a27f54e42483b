import { run } from 'graphile-worker';
import type { Logger } from 'pino';
import { tasks } from './tasks.ts';

/** Cron lines of graphile-worker, in UTC. */
const CRONTAB = ['17 3 * * * makePartitions'].join('\n');

/** Runs background work from the same database. `stop()` lets running tasks finish. */
export async function startJobs({
  databaseUrl,
  log,
}: {
  databaseUrl: string;
  log: Logger;
}): Promise<{ stop(): Promise<void> }> {
  const runner = await run({
    connectionString: databaseUrl,
    concurrency: 2,
    maxPoolSize: 4,
    noHandleSignals: true,
    crontab: CRONTAB,
    taskList: tasks,
    logger: new (await import('graphile-worker')).Logger(() => (level, message, meta) => {
      if (level === 'error' || level === 'warning') log.warn({ meta }, message);
    }),
  });
  return { stop: () => runner.stop() };
}
