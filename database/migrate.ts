import { fileURLToPath } from 'node:url';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';

/** One lock for all runners: drizzle's migrator has none of its own. */
const MIGRATION_LOCK = 1_606_160_616;

/**
 * Brings a database to the newest schema, as its owner, and makes the log's partitions from 14 months back
 * to 3 ahead. Safe to run again and by several processes at once.
 */
export async function migrateDatabase(ownerUrl: string): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await client.query("set lock_timeout = '2s'");
    await client.query('set client_min_messages = warning');
    await migrate(drizzle(client), {
      migrationsFolder: fileURLToPath(new URL('./migrations', import.meta.url)),
    });
    await client.query(
      "select ensure_review_partitions(now() - interval '14 months', now() + interval '3 months')",
    );
  } finally {
    await client.end();
  }
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const url = process.env.DATABASE_OWNER_URL;
  if (!url) {
    console.error('DATABASE_OWNER_URL is not set: the address of the database, as its owner.');
    process.exit(2);
  }
  await migrateDatabase(url);
}
