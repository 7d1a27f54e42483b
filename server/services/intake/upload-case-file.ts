import { createHash } from 'node:crypto';
import { and, eq, isNull } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { UploadInput } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { notFound, Problem } from '../../http/problem.ts';
import { asAdministrator, type Ctx } from '../context.ts';
import { newId } from '../new-id.ts';
import { plainText } from './plain-text.ts';
import { type CaseFile, CaseFileError, readCaseFile } from './read-case-file.ts';

const text = intakeText.problems;
const BATCH = 5_000;
/** Longest field of each kind, in UTF-16 units. */
const LONGEST = { case: 60, algorithm: 1_000, group: 60, note: 500 } as const;
/** Of the columns that are not read, so many are named, each cut off here. */
const COLUMNS_NAMED = 20;
const COLUMN_NAME = 60;

/**
 * Takes in a case file: the bytes are kept with their SHA-256, its lines become a draft. Nothing is kept of a
 * file that cannot be read.
 * @throws Problem not-found for no such set; cannot-take for one without editions of its own, and, with the line where there is one, for such a file.
 */
export async function uploadCaseFile(ctx: Ctx, input: UploadInput): Promise<{ draftId: string }> {
  return asAdministrator(ctx, async (tx, { accountId }) => {
    const { caseSet, intakeDraft } = tables;
    const [set] = await tx
      .select({ setKey: caseSet.setKey, name: caseSet.name, parentKey: caseSet.parentKey })
      .from(caseSet)
      .where(and(eq(caseSet.setKey, input.setKey), isNull(caseSet.retiredAt)));
    if (!set) throw notFound(text.noSet);
    if (set.parentKey !== null) throw refuseSet(text.noEditions(set.name));
    const file = Buffer.from(input.content, 'base64');
    const { lines, unknownColumns } = readable(file);
    const draftId = newId(ctx);
    await tx.insert(intakeDraft).values({
      draftId,
      setKey: set.setKey,
      fileName: plainText('/fileName', input.fileName),
      fileHash: createHash('sha256').update(file).digest('hex'),
      file,
      unknownColumns: unknownColumns.slice(0, COLUMNS_NAMED).map((name) => name.slice(0, COLUMN_NAME)),
      createdBy: accountId,
      createdAt: new Date(ctx.clock.now()),
    });
    await insertLines(tx, draftId, lines);
    return { draftId };
  });
}

/** The file read as a case file. @throws Problem cannot-take. */
function readable(file: Uint8Array): CaseFile {
  let read: CaseFile;
  try {
    read = readCaseFile(file);
  } catch (error) {
    if (error instanceof CaseFileError) throw refuse(error.message, error.line);
    throw error;
  }
  if (read.lines.length === 0) throw refuse(text.noLines, null);
  for (const line of read.lines) {
    for (const field of ['case', 'algorithm', 'group', 'note'] as const) {
      const most = LONGEST[field];
      if (line[field].length > most) throw refuse(text.tooLong(line.line, field, most), line.line);
    }
  }
  return read;
}

function refuse(detail: string, line: number | null): Problem {
  return new Problem('cannot-take', detail, {
    errors: [{ pointer: '/content', detail, ...(line === null ? {} : { row: line }) }],
  });
}

function refuseSet(detail: string): Problem {
  return new Problem('cannot-take', detail, { errors: [{ pointer: '/setKey', detail }] });
}

async function insertLines(tx: Transaction, draftId: string, lines: CaseFile['lines']): Promise<void> {
  for (let at = 0; at < lines.length; at += BATCH) {
    await tx.insert(tables.intakeLine).values(
      lines.slice(at, at + BATCH).map(({ line, case: caseName, algorithm, group, note }) => ({
        draftId,
        line,
        caseName,
        algorithm,
        group,
        note,
      })),
    );
  }
}
