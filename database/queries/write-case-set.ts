import type { CaseSet } from '#shared/lastlayer/index.ts';
import { type Transaction, tables } from '../client.ts';

const BATCH = 1_000;

export interface Ownership {
  /** The set whose editions serve this one. */
  readonly parentKey: string | null;
  /** null: the installation's. */
  readonly clubId: string | null;
  /** The account that defined it. */
  readonly createdBy: string | null;
}

const OF_THE_TRADE: Ownership = { parentKey: null, clubId: null, createdBy: null };

/** Writes a set with all its cases, the skip included. What is written never changes. */
export async function writeCaseSet(
  tx: Transaction,
  set: CaseSet,
  ownership: Ownership = OF_THE_TRADE,
): Promise<void> {
  const { key, name, entry, mix, toldApart, solved } = set.definition;
  await tx.insert(tables.caseSet).values({
    setKey: key,
    name,
    entry,
    mix,
    toldApart: [...toldApart],
    solved: [...solved],
    ...ownership,
  });
  const rows = [set.skip, ...set.cases].map((c) => ({
    caseKey: c.key,
    setKey: key,
    number: c.number,
    canonical: c.canonical,
    weight: c.weight,
    angles: c.angles,
    cluster: c.cluster,
    isSkip: c.skip,
  }));
  for (let at = 0; at < rows.length; at += BATCH) {
    await tx.insert(tables.setCase).values(rows.slice(at, at + BATCH));
  }
}
