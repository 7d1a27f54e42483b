import type { TaskList } from 'graphile-worker';

/** Every background task by name. */
export const tasks: TaskList = {
  async makePartitions(_payload, helpers) {
    await helpers.query(
      "select ensure_review_partitions(now() - interval '1 month', now() + interval '3 months')",
    );
  },
};
