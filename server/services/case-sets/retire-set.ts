import { eq } from 'drizzle-orm';
import { tables } from '#database/client.ts';
import { caseSetText } from '#shared/text/case-sets.ts';
import { forbidden, Problem } from '../../http/problem.ts';
import { isTradeSet } from '../catalogue/load-set.ts';
import { readSetRow } from '../catalogue/set-row.ts';
import type { Ctx } from '../context.ts';
import { asDefiner } from './as-definer.ts';
import { holdSet } from './hold-set.ts';
import { whatFor } from './what-for.ts';

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
    if (isTradeSet(setKey)) throw new Problem('conflict', problems.tradeStays);
    if (row.clubId === null && clubId !== null) throw forbidden(problems.notYours);
    const use = row.retired ? problems.retiredAlready : await whatFor(tx, setKey, clubId);
    if (use !== null) throw new Problem('conflict', use);
    const { caseSet } = tables;
    await tx
      .update(caseSet)
      .set({ retiredAt: new Date(ctx.clock.now()) })
      .where(eq(caseSet.setKey, setKey));
    return {};
  });
}
