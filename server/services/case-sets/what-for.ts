import { and, eq, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { caseSetText } from '#shared/text/case-sets.ts';

const { problems } = caseSetText;

/**
 * What a set is in use for, in a sentence to whoever would retire it; null for nothing.
 * @param clubId the club of the captain who asks, of a set of their own; null for an administrator.
 */
export async function whatFor(
  tx: Transaction,
  setKey: string,
  clubId: string | null,
): Promise<string | null> {
  const { caseSet, edition, sharedBoard } = tables;
  const { rows } = await tx.execute<{ clubs: number }>(sql`select clubs_training(${setKey}) as clubs`);
  const clubs = rows[0]?.clubs ?? 0;
  // Only its own club can train with a club's own set.
  if (clubs > 0) return clubId === null ? problems.onProgrammes(clubs) : problems.onYourProgramme;
  const [published] = await tx.select().from(edition).where(eq(edition.setKey, setKey)).limit(1);
  if (published) return problems.hasEditions;
  const subsets = await tx
    .select({ name: caseSet.name })
    .from(caseSet)
    .where(and(eq(caseSet.parentKey, setKey), isNull(caseSet.retiredAt)));
  if (subsets.length > 0) return problems.hasSubsets(subsets.map((one) => one.name));
  const [board] = await tx.select().from(sharedBoard).where(eq(sharedBoard.setKey, setKey)).limit(1);
  return board ? problems.onBoard : null;
}
