import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import pg from 'pg';
import type { TestCluster } from './global-database.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));

/** The schema and the catalogue (case sets and their first editions), no people. */
export const CATALOGUE = 'template_catalogue';
/** The catalogue and the whole demonstration: clubs, members, months of answers. Takes long to make. */
export const DEMO = 'template_demo';

/** One lock for all workers that may want the demonstration's template at once. */
const TEMPLATE_LOCK = 1_606_160_617;

/** An address with another database in it. */
export function onDatabase(url: string, database: string): string {
  const changed = new URL(url);
  changed.pathname = `/${database}`;
  return changed.href;
}

/** Runs statements as the administrator, each on its own, in the database `postgres`. */
export async function asAdmin(adminUrl: string, work: (client: pg.Client) => Promise<void>): Promise<void> {
  const client = new pg.Client({ connectionString: adminUrl });
  await client.connect();
  try {
    await work(client);
  } finally {
    await client.end();
  }
}

/** Copies a database; the copy belongs to the owner's role and is closed to all but the two roles. */
export async function copyDatabase(client: pg.Client, template: string, name: string): Promise<void> {
  await client.query(`CREATE DATABASE "${name}" TEMPLATE "${template}" OWNER sixteenfold_owner`);
  await client.query(`REVOKE ALL ON DATABASE "${name}" FROM PUBLIC`);
  await client.query(`GRANT CONNECT ON DATABASE "${name}" TO sixteenfold_app`);
}

async function exists(client: pg.Client, name: string): Promise<boolean> {
  const { rowCount } = await client.query('SELECT FROM pg_database WHERE datname = $1', [name]);
  return rowCount === 1;
}

/** Runs one of the product's own database scripts to its end. @throws Error with its output if it fails. */
function runScript(script: string, env: Record<string, string>): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', script], {
      cwd: root,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let said = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream.setEncoding('utf8').on('data', (text: string) => {
        said += text;
      });
    }
    child.once('error', reject);
    child.once('close', (code) =>
      code === 0 ? resolve() : reject(new Error(`${script} ended with ${code}:\n${said}`)),
    );
  });
}

/**
 * Makes a template under another name and renames it when it is whole, so that one that failed half-way is never
 * used. Workers that come at the same time wait for the first.
 */
async function ensure(
  cluster: TestCluster,
  name: string,
  make: (client: pg.Client, draft: string) => Promise<void>,
): Promise<void> {
  await asAdmin(cluster.adminUrl, async (client) => {
    await client.query('SELECT pg_advisory_lock($1)', [TEMPLATE_LOCK]);
    if (await exists(client, name)) return;
    const draft = `${name}_draft`;
    await client.query(`DROP DATABASE IF EXISTS "${draft}" WITH (FORCE)`);
    await make(client, draft);
    await client.query(`ALTER DATABASE "${draft}" RENAME TO "${name}"`);
  });
}

/** The template of `useDatabase`. */
export function ensureTemplate(cluster: TestCluster): Promise<void> {
  return ensure(cluster, CATALOGUE, async (client, draft) => {
    await copyDatabase(client, 'template1', draft);
    await asAdmin(onDatabase(cluster.adminUrl, draft), async (inside) => {
      await inside.query('ALTER SCHEMA public OWNER TO sixteenfold_owner');
    });
    const env = { DATABASE_OWNER_URL: onDatabase(cluster.ownerUrl, draft) };
    await runScript('database/migrate.ts', env);
    await runScript('database/seed/catalogue.ts', env);
  });
}

/** The template of `useDemoDatabase`, made when it is first wanted. */
export function ensureDemoTemplate(cluster: TestCluster): Promise<void> {
  return ensure(cluster, DEMO, async (client, draft) => {
    await copyDatabase(client, CATALOGUE, draft);
    await runScript('server/demo/run.ts', {
      DATABASE_OWNER_URL: onDatabase(cluster.ownerUrl, draft),
      DATABASE_URL: onDatabase(cluster.appUrl, draft),
      DEMO: '1',
    });
  });
}
