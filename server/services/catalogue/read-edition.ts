import { and, asc, desc, eq, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import { notFound } from '../../http/problem.ts';
import { groupBy } from '../group-by.ts';
import { isTradeSet, loadCaseSet } from './load-set.ts';
import { readSetRow } from './set-row.ts';

export interface EditionAlgorithm {
  readonly algorithm: string;
  readonly note: string;
}

export interface EditionCase {
  readonly key: string;
  readonly name: string;
  /** The edition's name where `name` is what a club calls the case; absent elsewhere. */
  readonly tradeName?: string;
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
 * is kept. A set without editions of its own (a subset, a mix) shows its parent's, as far as it has their cases.
 * @throws Problem not-found, for a set this session may not see too.
 */
export async function readEditionContent(
  tx: Transaction,
  setKey: string,
  number: number,
): Promise<EditionContent> {
  // Before what is kept is looked at: it is kept for all sessions, and not every session may see it.
  const parentKey = isTradeSet(setKey) ? null : (await readSetRow(tx, setKey)).parentKey;
  const id = `${setKey} ${number}`;
  const known = kept.get(id);
  if (known) return known;
  const content =
    parentKey === null
      ? await readOwnEdition(tx, setKey, number)
      : restrict(await readEditionContent(tx, parentKey, number), await loadCaseSet(tx, setKey));
  if (kept.size >= KEPT) kept.delete(kept.keys().next().value ?? '');
  kept.set(id, content);
  return content;
}

function restrict(content: EditionContent, { definition, byKey }: CaseSet): EditionContent {
  return {
    ...content,
    setKey: definition.key,
    setName: definition.name,
    cases: new Map([...content.cases].filter(([key]) => byKey(key))),
  };
}

async function readOwnEdition(tx: Transaction, setKey: string, number: number): Promise<EditionContent> {
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
  return { setKey, number, ...head, cases };
}

const collator = new Intl.Collator('en', { numeric: true });

/** 2 before 10, Aa before Ab. */
export function inNameOrder(a: string, b: string): number {
  return collator.compare(a, b);
}

/** The newest edition's number by set; a subset's is its parent's. */
export async function newestEditions(tx: Transaction): Promise<Map<string, number>> {
  return new Map([...(await editionNumbers(tx))].map(([setKey, [newest = 0]]) => [setKey, newest]));
}

/** Numbers of all editions that serve a set, newest first, by set: its own, or its parent's. */
export async function editionNumbers(tx: Transaction): Promise<Map<string, number[]>> {
  const { caseSet, edition } = tables;
  const rows = await tx
    .select({ setKey: caseSet.setKey, number: edition.number })
    .from(caseSet)
    .innerJoin(edition, eq(edition.setKey, sql`coalesce(${caseSet.parentKey}, ${caseSet.setKey})`))
    .orderBy(asc(caseSet.setKey), desc(edition.number));
  return new Map([...groupBy(rows, (row) => row.setKey)].map(([key, of]) => [key, of.map((o) => o.number)]));
}
