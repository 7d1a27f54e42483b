import type { TaskList } from 'graphile-worker';
import type { Database } from '#database/client.ts';
import type { Clock } from '../services/context.ts';
import { completeClubDays } from '../services/rollups/complete-club-days.ts';

export interface TaskNeeds {
  /** The owner's connection: jobs go from club to club. */
  readonly owner: Database;
  readonly clock: Clock;
}

/** Every background task by name. */
export function tasksOf({ owner, clock }: TaskNeeds): TaskList {
  return {
    async makePartitions(_payload, helpers) {
      await helpers.query(
        "select ensure_review_partitions(now() - interval '1 month', now() + interval '3 months')",
      );
    },
    async completeDays(_payload, helpers) {
      const { rows, teams } = await completeClubDays(owner, clock);
      helpers.logger.info(`${rows} rollup rows, ${teams} team rows`);
    },
  };
}
