import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { parse } from 'csv-parse/sync';
import { sql } from 'drizzle-orm';
import { CASE_SETS, type CaseSet, caseSet, solvesCase } from '#shared/lastlayer/index.ts';
import { type Database, openDatabase, type Transaction, tables } from '../client.ts';
import { writeCaseSet } from '../queries/write-case-set.ts';

/** Sets that come with algorithms of our own. */
export const WITH_EDITION = ['oll', 'pll', 'ocll', 'eoll', 'cpll', 'epll', 'coll', 'ell'] as const;

interface SeedLine {
  readonly case: string;
  readonly algorithm: string;
  readonly note?: string;
}

/**
 * Writes the trade's case sets and edition 1 of those we bring algorithms for. Sets that stand are left alone,
 * so this may run again.
 * @throws Error naming the line of a seed file that does not solve what it says.
 */
export async function seedCatalogue(db: Database): Promise<void> {
  await db.transaction(async (tx) => {
    await tx.execute(sql`select pg_advisory_xact_lock(hashtext('seed-catalogue'))`);
    const known = new Set(
      (await tx.select({ key: tables.caseSet.setKey }).from(tables.caseSet)).map((row) => row.key),
    );
    for (const { key } of CASE_SETS) {
      if (!known.has(key)) await writeCaseSet(tx, caseSet(key));
    }
    for (const key of WITH_EDITION) {
      if (!known.has(key)) await publishFirst(tx, caseSet(key));
    }
  });
}

async function publishFirst(tx: Transaction, set: CaseSet): Promise<void> {
  const setKey = set.definition.key;
  const lines = parse(readFileSync(fileURLToPath(new URL(`./case-sets/${setKey}.csv`, import.meta.url))), {
    columns: true,
    skip_empty_lines: true,
    bom: true,
  }) as SeedLine[];
  const ranks = new Map<string, number>();
  const algorithms = lines.map((line, at) => {
    const solves = solvesCase(set, line.algorithm);
    const c = solves.kind === 'case' ? solves.case : null;
    if (!c || c.key !== set.byName(line.case)?.key) {
      throw new Error(`${setKey}.csv, line ${at + 2}: ${line.algorithm} does not solve ${line.case}.`);
    }
    const rank = (ranks.get(c.key) ?? 0) + 1;
    ranks.set(c.key, rank);
    return {
      setKey,
      editionNumber: 1,
      caseKey: c.key,
      rank,
      algorithm: line.algorithm,
      note: line.note ?? '',
    };
  });
  await tx.insert(tables.edition).values({
    setKey,
    number: 1,
    publishedAt: sql`now()`,
    note: 'The algorithms that came with the installation.',
  });
  await tx
    .insert(tables.editionCase)
    .values(
      set.cases
        .filter((c) => ranks.has(c.key))
        .map((c) => ({ setKey, editionNumber: 1, caseKey: c.key, name: c.name, group: c.group })),
    );
  await tx.insert(tables.editionAlgorithm).values(algorithms);
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const url = process.env.DATABASE_OWNER_URL;
  if (!url) {
    console.error('DATABASE_OWNER_URL is not set: the address of the database, as its owner.');
    process.exit(2);
  }
  const { pool, db } = openDatabase(url, { max: 1 });
  await seedCatalogue(db);
  await pool.end();
}
