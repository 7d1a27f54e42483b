import type { TestProject } from 'vitest/node';
import { Children } from '#server/toolbox/children.mjs';
import { ensureTemplate } from './templates.ts';
import { openThrowAway } from './throw-away.mjs';

/** The addresses of the test cluster's three roles; the database in owner's and app's is not used. */
export interface TestCluster {
  readonly adminUrl: string;
  readonly ownerUrl: string;
  readonly appUrl: string;
}

declare module 'vitest' {
  export interface ProvidedContext {
    cluster: TestCluster;
  }
}

/**
 * Before the first test that needs PostgreSQL: a cluster (the one `npm test` started, or a throw-away one) with a
 * template database, which every test file then copies. See database.ts.
 */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { cluster, stop } = fromEnvironment() ?? (await throwAway());
  try {
    await ensureTemplate(cluster);
  } catch (error) {
    await stop();
    throw error;
  }
  project.provide('cluster', cluster);
  return stop;
}

function fromEnvironment(): { cluster: TestCluster; stop(): Promise<void> } | undefined {
  const { TEST_DATABASE_ADMIN_URL, TEST_DATABASE_OWNER_URL, TEST_DATABASE_APP_URL } = process.env;
  if (!TEST_DATABASE_ADMIN_URL || !TEST_DATABASE_OWNER_URL || !TEST_DATABASE_APP_URL) return undefined;
  return {
    cluster: {
      adminUrl: TEST_DATABASE_ADMIN_URL,
      ownerUrl: TEST_DATABASE_OWNER_URL,
      appUrl: TEST_DATABASE_APP_URL,
    },
    stop: async () => {},
  };
}

async function throwAway(): Promise<{ cluster: TestCluster; stop(): Promise<void> }> {
  const { cluster, stop } = await openThrowAway(new Children());
  const { adminUrl, ownerUrl, appUrl } = cluster;
  return { cluster: { adminUrl, ownerUrl, appUrl }, stop };
}
