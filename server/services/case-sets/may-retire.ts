import type { Transaction } from '#database/client.ts';
import { isTradeSet } from '../catalogue/load-set.ts';
import { readSetRow } from '../catalogue/set-row.ts';
import type { ClubActor } from '../context.ts';

/**
 * Whether this person could retire the set, were it in no use: a captain their club's own, an administrator (null)
 * any but the trade's.
 * @throws Problem not-found.
 */
export async function mayRetire(tx: Transaction, actor: ClubActor | null, setKey: string): Promise<boolean> {
  if (isTradeSet(setKey)) return false;
  const { clubId, retired } = await readSetRow(tx, setKey);
  if (retired) return false;
  return actor === null || (actor.role === 'captain' && clubId === actor.clubId);
}
