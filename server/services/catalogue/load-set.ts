import { eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { buildCaseSet, CASE_SETS, type CaseSet, caseSet, subsetOf } from '#shared/lastlayer/index.ts';
import { readSetRow, type SetRow } from './set-row.ts';

/** Sets of clubs and subsets kept ready; each takes up to a few megabytes. */
const KEPT = 32;
const kept = new Map<string, CaseSet>();

const trade = new Set(CASE_SETS.map(({ key }) => key));

/** Whether a set is one of the trade's own: those are everyone's and made without asking the tables. */
export function isTradeSet(setKey: string): boolean {
  return trade.has(setKey);
}

/**
 * A set ready for use, of the trade or of this session's club. Definitions never change once made, so what is
 * built is kept; whether this session may see the set is asked every time.
 * @throws Problem not-found.
 */
export async function loadCaseSet(tx: Transaction, setKey: string): Promise<CaseSet> {
  if (isTradeSet(setKey)) return caseSet(setKey);
  const row = await readSetRow(tx, setKey);
  const known = kept.get(setKey);
  if (known) return known;
  const built = await buildFromRow(tx, row);
  if (kept.size >= KEPT) kept.delete(kept.keys().next().value ?? '');
  kept.set(setKey, built);
  return built;
}

/** Several sets by key, each once. @throws Problem not-found. */
export async function loadCaseSets(
  tx: Transaction,
  setKeys: Iterable<string>,
): Promise<ReadonlyMap<string, CaseSet>> {
  const sets = new Map<string, CaseSet>();
  for (const setKey of setKeys) {
    if (!sets.has(setKey)) sets.set(setKey, await loadCaseSet(tx, setKey));
  }
  return sets;
}

/** The set its definition makes, restricted to the cases the tables hold of it: fewer for a subset. */
async function buildFromRow(tx: Transaction, { definition, parentKey }: SetRow): Promise<CaseSet> {
  const whole = buildCaseSet(definition);
  if (parentKey === null) return whole;
  const { setCase } = tables;
  const rows = await tx
    .select({ key: setCase.caseKey, isSkip: setCase.isSkip })
    .from(setCase)
    .where(eq(setCase.setKey, definition.key));
  const keys = rows.filter(({ isSkip }) => !isSkip).map(({ key }) => key);
  if (keys.length === whole.cases.length) return whole;
  return subsetOf(whole, { key: definition.key, name: definition.name, caseKeys: keys });
}
