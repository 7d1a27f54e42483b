import { and, eq, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { caseSetText } from '#shared/text/case-sets.ts';
import { forbidden, Problem } from '../../http/problem.ts';
import { isTradeSet } from '../catalogue/load-set.ts';
import { readSetRow } from '../catalogue/set-row.ts';
import type { Ctx } from '../context.ts';
import { asDefiner } from './as-definer.ts';
import { holdSet } from './hold-set.ts';

const { problems } = caseSetText;

/**
 * Retires a set: it is in no list and can be assigned no more, while answers and figures of before stay. A captain
 * can retire their club's own, an administrator any but the trade's.
 * @throws Problem not-found for one that this session cannot see; forbidden for a captain and a set of everyone's;
 *   conflict for one of the trade's, and for one in use: on a programme, with editions, with subsets, on a board.
 */
export async function retireSet(ctx: Ctx, { setKey }: { setKey: string }): Promise<Record<string, never>> {
  return asDefiner(ctx, async (tx, { clubId }) => {
    await holdSet(tx, setKey, 'alone');
    const row = await readSetRow(tx, setKey);
    const { name } = row.definition;
    if (isTradeSet(setKey)) throw new Problem('conflict', problems.tradeStays(name));
    if (row.clubId === null && clubId !== null) throw forbidden(problems.notYours(name));
    const use = row.retired ? problems.retiredAlready(name) : await whatFor(tx, setKey, name);
    if (use !== null) throw new Problem('conflict', use);
    const { caseSet } = tables;
    await tx
      .update(caseSet)
      .set({ retiredAt: new Date(ctx.clock.now()) })
      .where(eq(caseSet.setKey, setKey));
    return {};
  });
}

/** What a set is in use for, in a sentence; null for nothing. */
async function whatFor(tx: Transaction, setKey: string, name: string): Promise<string | null> {
  const { caseSet, edition, sharedBoard } = tables;
  const { rows } = await tx.execute<{ clubs: number }>(sql`select clubs_training(${setKey}) as clubs`);
  const clubs = rows[0]?.clubs ?? 0;
  if (clubs > 0) return problems.onProgramme(name, clubs);
  const [published] = await tx.select().from(edition).where(eq(edition.setKey, setKey)).limit(1);
  if (published) return problems.hasEditions(name);
  const subsets = await tx
    .select({ name: caseSet.name })
    .from(caseSet)
    .where(and(eq(caseSet.parentKey, setKey), isNull(caseSet.retiredAt)));
  if (subsets.length > 0)
    return problems.hasSubsets(
      name,
      subsets.map((one) => one.name),
    );
  const [board] = await tx.select().from(sharedBoard).where(eq(sharedBoard.setKey, setKey)).limit(1);
  return board ? problems.onBoard(name) : null;
}
