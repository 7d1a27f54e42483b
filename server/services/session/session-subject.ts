import { sql } from 'drizzle-orm';
import type { Database, Transaction } from '#database/client.ts';
import type { Role } from '../context.ts';

/** Role and epoch a new token may claim, or null when the person has no business there (any more). */
export async function sessionSubject(
  db: Database | Transaction,
  accountId: string,
  clubId: string | null,
): Promise<{ role: Role; epoch: number } | null> {
  const { rows } = await db.execute<{ role: Role; epoch: number }>(
    sql`select * from session_subject(${accountId}::uuid, ${clubId}::uuid)`,
  );
  return rows[0] ?? null;
}
