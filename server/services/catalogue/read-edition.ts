import { and, asc, desc, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { notFound } from '../../http/problem.ts';

export interface EditionAlgorithm {
  readonly algorithm: string;
  readonly note: string;
}

export interface EditionCase {
  readonly key: string;
  readonly name: string;
  readonly group: string;
  /** In order of preference; the first is the one shown. */
  readonly algorithms: readonly EditionAlgorithm[];
}

/** All that an edition says. Immutable once published, so it may be kept for as long as the process lives. */
export interface EditionContent {
  readonly setKey: string;
  readonly setName: string;
  readonly number: number;
  readonly publishedAt: Date;
  readonly note: string;
  /** By case key, in the order of the names. */
  readonly cases: ReadonlyMap<string, EditionCase>;
}

const KEPT = 64;
const kept = new Map<string, EditionContent>();

/**
 * Reads a published edition. Never call it for one that this transaction is only about to publish: what is read
 * is kept.
 * @throws Problem not-found.
 */
export async function readEditionContent(
  tx: Transaction,
  setKey: string,
  number: number,
): Promise<EditionContent> {
  const id = `${setKey} ${number}`;
  const known = kept.get(id);
  if (known) return known;

  const { edition, editionCase, editionAlgorithm, caseSet } = tables;
  const [head] = await tx
    .select({ publishedAt: edition.publishedAt, note: edition.note, setName: caseSet.name })
    .from(edition)
    .innerJoin(caseSet, eq(caseSet.setKey, edition.setKey))
    .where(and(eq(edition.setKey, setKey), eq(edition.number, number)));
  if (!head) throw notFound(`There is no edition ${number} of that set.`);
  const rows = await tx
    .select({
      key: editionCase.caseKey,
      name: editionCase.name,
      group: editionCase.group,
      algorithm: editionAlgorithm.algorithm,
      note: editionAlgorithm.note,
    })
    .from(editionCase)
    .leftJoin(
      editionAlgorithm,
      and(
        eq(editionAlgorithm.setKey, editionCase.setKey),
        eq(editionAlgorithm.editionNumber, editionCase.editionNumber),
        eq(editionAlgorithm.caseKey, editionCase.caseKey),
      ),
    )
    .where(and(eq(editionCase.setKey, setKey), eq(editionCase.editionNumber, number)))
    .orderBy(asc(editionCase.name), asc(editionAlgorithm.rank));

  const cases = new Map<
    string,
    { key: string; name: string; group: string; algorithms: EditionAlgorithm[] }
  >();
  for (const { key, name, group, algorithm, note } of rows.sort((a, b) => inNameOrder(a.name, b.name))) {
    const entry = cases.get(key) ?? { key, name, group, algorithms: [] };
    if (algorithm !== null) entry.algorithms.push({ algorithm, note: note ?? '' });
    cases.set(key, entry);
  }
  const content: EditionContent = { setKey, number, ...head, cases };
  if (kept.size >= KEPT) kept.delete(kept.keys().next().value ?? '');
  kept.set(id, content);
  return content;
}

const collator = new Intl.Collator('en', { numeric: true });

/** 2 before 10, Aa before Ab. */
export function inNameOrder(a: string, b: string): number {
  return collator.compare(a, b);
}

/** The newest edition's number by set. */
export async function newestEditions(tx: Transaction): Promise<Map<string, number>> {
  const { edition } = tables;
  const rows = await tx
    .selectDistinctOn([edition.setKey], { setKey: edition.setKey, number: edition.number })
    .from(edition)
    .orderBy(edition.setKey, desc(edition.number));
  return new Map(rows.map((row) => [row.setKey, row.number]));
}
