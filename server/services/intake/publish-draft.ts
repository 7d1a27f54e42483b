import { and, eq, ne, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { PublishInput } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { notFound, Problem } from '../../http/problem.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { type EditionCase, newestEditions, readEditionContent } from '../catalogue/read-edition.ts';
import { asAdministrator, type Ctx } from '../context.ts';
import { blocking, judgeLines } from './judge-lines.ts';
import { mergeEdition } from './merge-edition.ts';
import { plainParagraph } from './plain-text.ts';
import { type Draft, holdOpenDraft } from './read-draft.ts';

const text = intakeText.problems;
const BATCH = 5_000;
const MOST_ALGORITHMS = 99;

/**
 * Publishes a draft as the next edition of its set, merged into the newest, and closes it: all of it or
 * nothing. Publishers of one set come one after the other; the second finds its draft changed, because what it
 * would merge into is another edition now, and has to look again.
 * @throws Problem not-found; conflict for a closed draft; stale for a changed one, or when another edition
 *   came out meanwhile; cannot-take while lines are to settle, or when nothing would go in.
 */
export async function publishDraft(
  ctx: Ctx,
  input: PublishInput,
): Promise<{ setKey: string; edition: number }> {
  return asAdministrator(ctx, async (tx, { accountId }) => {
    await queueForSet(tx, input.draftId);
    const draft = await holdOpenDraft(tx, input);
    const { setKey } = draft;
    const { cases, newest } = await contentOf(tx, draft);
    const number = newest + 1;
    const at = new Date(ctx.clock.now());
    await tx.insert(tables.edition).values({
      setKey,
      number,
      publishedAt: at,
      publishedBy: accountId,
      note: plainParagraph('/note', input.note),
      draftId: draft.draftId,
    });
    await insertCases(tx, setKey, number, cases);
    await close(tx, draft, number, at);
    return { setKey, edition: number };
  });
}

/** Waits until no one else is publishing an edition of the draft's set. */
async function queueForSet(tx: Transaction, draftId: string): Promise<void> {
  const { intakeDraft } = tables;
  const [draft] = await tx
    .select({ setKey: intakeDraft.setKey })
    .from(intakeDraft)
    .where(eq(intakeDraft.draftId, draftId));
  if (!draft) throw notFound(text.noDraft);
  await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`publish ${draft.setKey}`}, 0))`);
}

async function contentOf(
  tx: Transaction,
  draft: Draft,
): Promise<{ cases: readonly EditionCase[]; newest: number }> {
  const set = await loadCaseSet(tx, draft.setKey);
  const lines = judgeLines(set, draft.kept);
  const left = blocking(lines);
  if (left > 0) throw new Problem('cannot-take', text.blocked(left));
  if (lines.every(({ goesTo }) => goesTo === null)) throw new Problem('cannot-take', text.nothing);
  const newest = (await newestEditions(tx)).get(draft.setKey) ?? 0;
  const { cases } = mergeEdition(
    set,
    lines,
    newest === 0 ? null : await readEditionContent(tx, draft.setKey, newest),
  );
  const full = cases.find(({ algorithms }) => algorithms.length > MOST_ALGORITHMS);
  if (full) {
    throw new Problem('cannot-take', text.tooMany(full.name, full.algorithms.length, MOST_ALGORITHMS));
  }
  return { cases, newest };
}

async function insertCases(
  tx: Transaction,
  setKey: string,
  editionNumber: number,
  cases: readonly EditionCase[],
): Promise<void> {
  const caseRows = cases.map(({ key, name, group }) => ({
    setKey,
    editionNumber,
    caseKey: key,
    name,
    group,
  }));
  const algorithmRows = cases.flatMap(({ key, algorithms }) =>
    algorithms.map(({ algorithm, note }, at) => ({
      setKey,
      editionNumber,
      caseKey: key,
      rank: at + 1,
      algorithm,
      note,
    })),
  );
  for (let at = 0; at < caseRows.length; at += BATCH) {
    await tx.insert(tables.editionCase).values(caseRows.slice(at, at + BATCH));
  }
  for (let at = 0; at < algorithmRows.length; at += BATCH) {
    await tx.insert(tables.editionAlgorithm).values(algorithmRows.slice(at, at + BATCH));
  }
}

/** Closes the draft. The set's other open drafts would now do something else: they count as changed. */
async function close(tx: Transaction, draft: Draft, editionNumber: number, closedAt: Date): Promise<void> {
  const { intakeDraft } = tables;
  await tx
    .update(intakeDraft)
    .set({ state: 'published', editionNumber, closedAt, version: draft.version + 1 })
    .where(eq(intakeDraft.draftId, draft.draftId));
  await tx
    .update(intakeDraft)
    .set({ version: sql`${intakeDraft.version} + 1` })
    .where(
      and(
        eq(intakeDraft.setKey, draft.setKey),
        eq(intakeDraft.state, 'open'),
        ne(intakeDraft.draftId, draft.draftId),
      ),
    );
}
