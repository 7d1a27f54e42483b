import { run, Logger as WorkerLogger } from 'graphile-worker';
import type { Logger } from 'pino';
import { openDatabase } from '#database/client.ts';
import type { Clock } from '../services/context.ts';
import { tasksOf } from './tasks.ts';

/** Cron lines of graphile-worker, in UTC: rollovers fall on any quarter of an hour somewhere. */
const CRONTAB = ['17 3 * * * makePartitions ?fill=1d', '*/15 * * * * completeDays ?fill=1h'].join('\n');

export interface JobsNeeds {
  readonly databaseUrl: string;
  readonly clock: Clock;
  readonly log: Logger;
}

/** Runs background work from the same database. `stop()` lets running tasks finish. */
export async function startJobs({ databaseUrl, clock, log }: JobsNeeds): Promise<{ stop(): Promise<void> }> {
  // Nobody waits for a job: it may wait for a connection.
  const { pool, db } = openDatabase(databaseUrl, { max: 2, waitMs: 20_000 });
  const runner = await run({
    connectionString: databaseUrl,
    concurrency: 1,
    maxPoolSize: 3,
    noHandleSignals: true,
    crontab: CRONTAB,
    taskList: tasksOf({ owner: db, clock }),
    logger: new WorkerLogger(() => (level, message, meta) => {
      if (level === 'error' || level === 'warning') log.warn({ meta }, message);
    }),
  });
  // A server that was off for days shows today's figures from its first minute.
  await runner.addJob('completeDays', {}, { jobKey: 'completeDays' });
  return {
    async stop() {
      await runner.stop();
      await pool.end();
    },
  };
}
