import { desc, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import { isTradeSet, loadCaseSet } from './load-set.ts';
import { type EditionContent, readEditionContent } from './read-edition.ts';
import { readSetRow } from './set-row.ts';

export interface ShownSet {
  readonly set: CaseSet;
  /** The set whose editions these are: its own key, or its parent's. */
  readonly namedBy: string;
  /** Newest first; a set without editions of its own has its parent's. */
  readonly editions: readonly { readonly number: number; readonly publishedAt: number }[];
  /** The edition asked for, else the newest; null where none is published. */
  readonly content: EditionContent | null;
}

/**
 * A set as the catalogue shows it, through one of its editions.
 * @throws Problem not-found, for a set this session may not see and for an edition it does not have.
 */
export async function readShownSet(tx: Transaction, setKey: string, wanted?: number): Promise<ShownSet> {
  const set = await loadCaseSet(tx, setKey);
  const namedBy = isTradeSet(setKey) ? setKey : ((await readSetRow(tx, setKey)).parentKey ?? setKey);
  const editions = await editionsOf(tx, namedBy);
  const number = wanted ?? editions[0]?.number;
  return {
    set,
    namedBy,
    editions,
    content: number === undefined ? null : await readEditionContent(tx, setKey, number),
  };
}

async function editionsOf(tx: Transaction, setKey: string): Promise<ShownSet['editions']> {
  const { edition } = tables;
  const rows = await tx
    .select({ number: edition.number, publishedAt: edition.publishedAt })
    .from(edition)
    .where(eq(edition.setKey, setKey))
    .orderBy(desc(edition.number));
  return rows.map(({ number, publishedAt }) => ({ number, publishedAt: publishedAt.getTime() }));
}
