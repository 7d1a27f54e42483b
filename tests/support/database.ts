import { randomBytes } from 'node:crypto';
import { afterAll, beforeAll, inject } from 'vitest';
import { asAdmin, CATALOGUE, copyDatabase, DEMO, ensureDemoTemplate, onDatabase } from './templates.ts';

/** One database and the three roles that reach it. */
export interface DatabaseUrls {
  /** The owner of the tables: migrations, jobs, and what a test prepares behind the walls. */
  readonly ownerUrl: string;
  /** The role the application runs as, behind row-level security. */
  readonly appUrl: string;
  /** The superuser, for looking past every wall. */
  readonly adminUrl: string;
}

/**
 * A fresh database for this test file (or this `describe`), with the schema and the catalogue but no people; it is
 * there in every hook and test that comes after, and dropped at the end. Call it at the top of the file.
 */
export function useDatabase(): DatabaseUrls {
  return useCopy(CATALOGUE, async () => {});
}

/** The same with the whole demonstration in it. The first use of a run takes as long as a first start. */
export function useDemoDatabase(): DatabaseUrls {
  return useCopy(DEMO, () => ensureDemoTemplate(inject('cluster')));
}

function useCopy(template: string, prepare: () => Promise<void>): DatabaseUrls {
  const cluster = inject('cluster');
  const name = `test_${randomBytes(8).toString('hex')}`;
  beforeAll(async () => {
    await prepare();
    await asAdmin(cluster.adminUrl, (client) => copyDatabase(client, template, name));
  }, 600_000);
  afterAll(async () => {
    // By force: a pool that a failed test left open must not keep the database.
    await asAdmin(cluster.adminUrl, async (client) => {
      await client.query(`DROP DATABASE IF EXISTS "${name}" WITH (FORCE)`);
    });
  });
  return {
    ownerUrl: onDatabase(cluster.ownerUrl, name),
    appUrl: onDatabase(cluster.appUrl, name),
    adminUrl: onDatabase(cluster.adminUrl, name),
  };
}
