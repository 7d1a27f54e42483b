import { isNull } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { inTradeOrder } from './list-catalogue.ts';
import { readShownSet, type ShownSet } from './read-shown-set.ts';

/** Every set this session may see that is not retired, through its newest edition; the trade's order. */
export async function readAllSets(tx: Transaction): Promise<readonly ShownSet[]> {
  const rows = await tx
    .select({ setKey: tables.caseSet.setKey })
    .from(tables.caseSet)
    .where(isNull(tables.caseSet.retiredAt));
  const keys = rows.map(({ setKey }) => setKey).sort(inTradeOrder);
  const sets: ShownSet[] = [];
  for (const key of keys) sets.push(await readShownSet(tx, key));
  return sets;
}
