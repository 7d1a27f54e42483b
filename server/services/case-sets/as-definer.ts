import type { Transaction } from '#database/client.ts';
import { caseSetText } from '#shared/text/case-sets.ts';
import { forbidden, signedOut } from '../../http/problem.ts';
import { asAdministrator, asCaptain, type Ctx } from '../context.ts';

/** Who defines sets, and for whom. */
export interface Definer {
  readonly accountId: string;
  /** A captain's club; null for an administrator, whose sets are everyone's. */
  readonly clubId: string | null;
}

/**
 * Runs `work` in one transaction as a captain in their club, or as an administrator.
 * @throws Problem signed-out, or forbidden for anyone else.
 */
export async function asDefiner<T>(
  ctx: Ctx,
  work: (tx: Transaction, definer: Definer) => Promise<T>,
): Promise<T> {
  if (!ctx.claims) throw signedOut();
  const { role, accountId } = ctx.claims;
  if (role === 'administrator') return asAdministrator(ctx, (tx) => work(tx, { accountId, clubId: null }));
  if (role !== 'captain') throw forbidden(caseSetText.problems.whoDefines);
  return asCaptain(ctx, (tx, { clubId }) => work(tx, { accountId, clubId }));
}
