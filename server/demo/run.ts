import { fileURLToPath } from 'node:url';
import { openDatabase } from '#database/client.ts';
import { seedCatalogue } from '#database/seed/catalogue.ts';
import { clearDemo, isSeeded, markSeeded } from './mark.ts';
import { seedDemo } from './seed-demo.ts';

/** A line that whoever started this process turns into its progress display. */
function progress(percent: number, text: string): void {
  process.stdout.write(`progress ${Math.round(percent)} ${text}\n`);
}

/**
 * First start: the catalogue, and in demo mode the invented clubs with their history. A seed that was broken
 * off is cleared away and made again; one that is complete is left alone.
 */
async function main(): Promise<void> {
  const { DATABASE_OWNER_URL, DATABASE_URL, DEMO } = process.env;
  if (!DATABASE_OWNER_URL || !DATABASE_URL) {
    throw new Error(
      'DATABASE_OWNER_URL and DATABASE_URL must be set: the database as its owner, and as the application.',
    );
  }
  for (const url of [DATABASE_OWNER_URL, DATABASE_URL]) {
    if (!['127.0.0.1', 'localhost', '[::1]'].includes(new URL(url).hostname)) {
      throw new Error('Demonstration data goes into a database on this machine only.');
    }
  }
  const owner = openDatabase(DATABASE_OWNER_URL, { max: 4, waitMs: 20_000 });
  // Nothing is lost that could not be made again, so a commit need not wait for the disk.
  const app = openDatabase(withOption(DATABASE_URL, '-c synchronous_commit=off'), { max: 4, waitMs: 20_000 });
  try {
    await seedCatalogue(owner.db);
    if (DEMO !== '1' || (await isSeeded(owner.db))) return;
    await clearDemo(owner.db);
    await seedDemo({ owner: owner.db, app: app.db, now: Date.now(), progress });
    await markSeeded(owner.db);
  } finally {
    await owner.pool.end();
    await app.pool.end();
  }
}

function withOption(url: string, option: string): string {
  const changed = new URL(url);
  changed.searchParams.set('options', option);
  return changed.href;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  main().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}
