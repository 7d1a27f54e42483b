import { eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { ClubActor } from '../context.ts';

/** What the reader's club calls cases, by case key; nothing for an administrator, who is in no club. */
export async function readAliases(
  tx: Transaction,
  actor: Pick<ClubActor, 'clubId'> | null,
): Promise<ReadonlyMap<string, string>> {
  if (!actor) return new Map();
  const { caseAlias } = tables;
  const rows = await tx
    .select({ caseKey: caseAlias.caseKey, alias: caseAlias.alias })
    .from(caseAlias)
    .where(eq(caseAlias.clubId, actor.clubId));
  return new Map(rows.map(({ caseKey, alias }) => [caseKey, alias]));
}
