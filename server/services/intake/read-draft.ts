import { and, asc, desc, eq, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { IntakeView } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { notFound, Problem, stale } from '../../http/problem.ts';
import type { KeptLine } from './judge-lines.ts';

const { intakeDraft, intakeLine, caseSet } = tables;
const text = intakeText.problems;

export type DraftSummary = IntakeView['drafts'][number];

export interface Draft extends DraftSummary {
  readonly version: number;
  readonly unknownColumns: string[];
  readonly kept: readonly KeptLine[];
}

/** All of a draft but the file itself. */
const SUMMARY = {
  draftId: intakeDraft.draftId,
  setKey: intakeDraft.setKey,
  setName: caseSet.name,
  clubId: caseSet.clubId,
  fileName: intakeDraft.fileName,
  state: intakeDraft.state,
  lines: sql<number>`(select count(*)::int from intake_line l where l.draft_id = intake_draft.draft_id)`,
  createdAt: intakeDraft.createdAt,
  editionNumber: intakeDraft.editionNumber,
};

/** Drafts, those that are open first, then the newest first. */
export async function readDraftSummaries(tx: Transaction, most: number): Promise<DraftSummary[]> {
  const rows = await tx
    .select(SUMMARY)
    .from(intakeDraft)
    .innerJoin(caseSet, eq(caseSet.setKey, intakeDraft.setKey))
    .orderBy(sql`${intakeDraft.state} <> 'open'`, desc(intakeDraft.createdAt), asc(intakeDraft.draftId))
    .limit(most);
  return rows.map(summaryOf);
}

/**
 * A draft with its lines. With `hold`, its row is locked until the transaction ends, so that steps on one
 * draft come one after the other.
 * @throws Problem not-found.
 */
export async function readDraft(
  tx: Transaction,
  draftId: string,
  { hold = false }: { hold?: boolean } = {},
): Promise<Draft> {
  const query = tx
    .select({ ...SUMMARY, version: intakeDraft.version, unknownColumns: intakeDraft.unknownColumns })
    .from(intakeDraft)
    .innerJoin(caseSet, eq(caseSet.setKey, intakeDraft.setKey))
    .where(eq(intakeDraft.draftId, draftId));
  const [row] = await (hold ? query.for('update', { of: intakeDraft }) : query);
  if (!row) throw notFound(text.noDraft);
  const kept = await tx
    .select({
      line: intakeLine.line,
      caseName: intakeLine.caseName,
      algorithm: intakeLine.algorithm,
      group: intakeLine.group,
      note: intakeLine.note,
      decision: intakeLine.decision,
      editedCaseName: intakeLine.editedCaseName,
      editedAlgorithm: intakeLine.editedAlgorithm,
    })
    .from(intakeLine)
    .where(eq(intakeLine.draftId, draftId))
    .orderBy(asc(intakeLine.line));
  return { ...summaryOf(row), kept };
}

/** A row as its readers have it: a club's own set by name and key. */
function summaryOf<Row extends { clubId: string | null; setKey: string; setName: string; createdAt: Date }>({
  clubId,
  ...row
}: Row) {
  const setName = clubId === null ? row.setName : intakeText.ofAClub(row.setName, row.setKey);
  return { ...row, setName, createdAt: row.createdAt.getTime() };
}

/**
 * The draft, held, if it is open and still as the caller saw it.
 * @throws Problem not-found; conflict when it is published or discarded; stale when it has changed.
 */
export async function holdOpenDraft(
  tx: Transaction,
  { draftId, version }: { draftId: string; version: number },
): Promise<Draft> {
  const draft = await readDraft(tx, draftId, { hold: true });
  if (draft.editionNumber !== null) throw new Problem('conflict', text.published(draft.editionNumber));
  if (draft.state !== 'open') throw new Problem('conflict', text.discarded);
  if (draft.version !== version) throw stale(text.stale);
  return draft;
}

/** Marks a held draft as changed: whoever saw it before must look again. */
export async function raiseVersion(tx: Transaction, { draftId, version }: Draft): Promise<number> {
  await tx
    .update(intakeDraft)
    .set({ version: version + 1 })
    .where(and(eq(intakeDraft.draftId, draftId), eq(intakeDraft.version, version)));
  return version + 1;
}
