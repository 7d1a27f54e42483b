import { eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { type Aspect, type CaseSetDefinition, isAspect, isEntry } from '#shared/lastlayer/index.ts';
import { notFound } from '../../http/problem.ts';

/** A set as the tables have it. */
export interface SetRow {
  readonly definition: CaseSetDefinition;
  /** The set whose editions serve this one; null: it has its own. */
  readonly parentKey: string | null;
  /** null: the installation's. */
  readonly clubId: string | null;
  readonly retired: boolean;
  readonly retiredAt: Date | null;
}

type Stored = typeof tables.caseSet.$inferSelect;

/**
 * The row of a set that this session may see.
 * @throws Problem not-found for another club's set as for none at all.
 */
export async function readSetRow(tx: Transaction, setKey: string): Promise<SetRow> {
  const [row] = await tx.select().from(tables.caseSet).where(eq(tables.caseSet.setKey, setKey));
  if (!row) throw notFound('There is no such set.');
  return {
    definition: definitionOfRow(row),
    parentKey: row.parentKey,
    clubId: row.clubId,
    retired: row.retiredAt !== null,
    retiredAt: row.retiredAt,
  };
}

/** The definition a row holds. @throws Error for words the engine does not know: the row was not written by us. */
export function definitionOfRow({
  setKey,
  name,
  entry,
  mix,
  toldApart,
  solved,
}: Pick<Stored, 'setKey' | 'name' | 'entry' | 'mix' | 'toldApart' | 'solved'>): CaseSetDefinition {
  if (!isEntry(entry)) throw new Error(`${setKey} begins from "${entry}", which is no entry condition.`);
  return {
    key: setKey,
    name,
    entry,
    mix,
    toldApart: aspects(setKey, toldApart),
    solved: aspects(setKey, solved),
  };
}

function aspects(setKey: string, words: readonly string[]): Aspect[] {
  return words.map((word) => {
    if (!isAspect(word)) throw new Error(`${setKey} speaks of "${word}", which is no aspect.`);
    return word;
  });
}
