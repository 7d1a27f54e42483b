import { desc, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { CASE_SETS, type CaseSet, caseSet } from '#shared/lastlayer/index.ts';
import { notFound } from '../../http/problem.ts';
import { type EditionContent, readEditionContent } from './read-edition.ts';

export interface ShownSet {
  readonly set: CaseSet;
  readonly name: string;
  /** Newest first. */
  readonly editions: readonly { readonly number: number; readonly publishedAt: number }[];
  /** The edition asked for, else the newest; null where none is published. */
  readonly content: EditionContent | null;
}

/**
 * A set as the catalogue shows it, through one of its editions.
 * @throws Problem not-found, for an unknown set or an edition it does not have.
 */
export async function readShownSet(tx: Transaction, setKey: string, wanted?: number): Promise<ShownSet> {
  const set = knownSet(setKey);
  const { edition } = tables;
  const rows = await tx
    .select({ number: edition.number, publishedAt: edition.publishedAt })
    .from(edition)
    .where(eq(edition.setKey, setKey))
    .orderBy(desc(edition.number));
  const number = wanted ?? rows[0]?.number;
  return {
    set,
    name: set.definition.name,
    editions: rows.map((row) => ({ number: row.number, publishedAt: row.publishedAt.getTime() })),
    content: number === undefined ? null : await readEditionContent(tx, setKey, number),
  };
}

function knownSet(setKey: string): CaseSet {
  if (!CASE_SETS.some(({ key }) => key === setKey)) throw notFound('There is no such set.');
  return caseSet(setKey);
}
