import { and, asc, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import type { ShownSet } from './read-shown-set.ts';

type Change = CatalogueCaseView['changes'][number];

/** The editions in which a case's algorithms changed against the edition before, newest first. */
export async function readChanges(
  tx: Transaction,
  { namedBy, editions }: Pick<ShownSet, 'namedBy' | 'editions'>,
  caseKey: string,
): Promise<Change[]> {
  const { editionAlgorithm } = tables;
  const rows = await tx
    .select({ edition: editionAlgorithm.editionNumber, algorithm: editionAlgorithm.algorithm })
    .from(editionAlgorithm)
    .where(and(eq(editionAlgorithm.setKey, namedBy), eq(editionAlgorithm.caseKey, caseKey)))
    .orderBy(asc(editionAlgorithm.editionNumber), asc(editionAlgorithm.rank));
  return changesOf(
    [...editions].reverse().map(({ number, publishedAt }) => ({
      edition: number,
      publishedAt,
      algorithms: rows.filter(({ edition }) => edition === number).map(({ algorithm }) => algorithm),
    })),
  );
}

/** @param editions Oldest first, each with the case's algorithms in order of preference. */
export function changesOf(
  editions: readonly { edition: number; publishedAt: number; algorithms: readonly string[] }[],
): Change[] {
  const changes = editions.map(({ edition, publishedAt, algorithms }, at) => {
    const before = editions[at - 1]?.algorithms ?? [];
    const added = algorithms.filter((one) => !before.includes(one));
    const removed = before.filter((one) => !algorithms.includes(one));
    const kept = algorithms.filter((one) => before.includes(one));
    const keptBefore = before.filter((one) => algorithms.includes(one));
    const reordered = kept.some((one, k) => one !== keptBefore[k]);
    return { edition, publishedAt, added, removed, reordered };
  });
  return changes
    .filter(({ added, removed, reordered }) => added.length > 0 || removed.length > 0 || reordered)
    .reverse();
}
