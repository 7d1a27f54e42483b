import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';

/**
 * Holds a set until the transaction ends: those who put it to use (`together`) go side by side, whoever retires it
 * (`alone`) comes before or after all of them.
 */
export async function holdSet(tx: Transaction, setKey: string, how: 'together' | 'alone'): Promise<void> {
  const key = sql`hashtextextended(${`set ${setKey}`}, 0)`;
  await tx.execute(
    how === 'alone'
      ? sql`select pg_advisory_xact_lock(${key})`
      : sql`select pg_advisory_xact_lock_shared(${key})`,
  );
}
