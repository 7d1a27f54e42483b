import { and, eq } from 'drizzle-orm';
import { tables } from '#database/client.ts';
import type { DraftView, SettleLineInput } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { notFound, Problem } from '../../http/problem.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { asAdministrator, type Ctx } from '../context.ts';
import { canBeTaken, judgeLines, type KeptLine } from './judge-lines.ts';
import { plainText } from './plain-text.ts';
import { presentDraft } from './present-draft.ts';
import { holdOpenDraft, raiseVersion } from './read-draft.ts';

const text = intakeText.problems;

/**
 * Settles one line: takes it as the case it solves, drops it, types over its words, or takes all that back.
 * Words left out of the input stay; words equal to the file's are no edit.
 * @throws Problem not-found, conflict for a closed draft, stale for a changed one, cannot-take for a `take`
 *   of a line that solves no other case of the set.
 */
export async function settleLine(ctx: Ctx, input: SettleLineInput): Promise<DraftView> {
  return asAdministrator(ctx, async (tx) => {
    const draft = await holdOpenDraft(tx, input);
    const before = draft.kept.find(({ line }) => line === input.line);
    if (!before) throw notFound(text.noLine(input.line));
    const settled = withInput(before, input);
    const kept = draft.kept.map((line) => (line === before ? settled : line));
    if (input.decision === 'take') {
      const judged = judgeLines(await loadCaseSet(tx, draft.setKey), kept).find(
        (line) => line.kept === settled,
      );
      if (!judged || !canBeTaken(judged)) {
        const detail = text.cannotTake(input.line);
        throw new Problem('cannot-take', detail, { errors: [{ pointer: '/decision', detail }] });
      }
    }
    const { intakeLine } = tables;
    const { decision, editedCaseName, editedAlgorithm } = settled;
    await tx
      .update(intakeLine)
      .set({ decision, editedCaseName, editedAlgorithm })
      .where(and(eq(intakeLine.draftId, draft.draftId), eq(intakeLine.line, input.line)));
    const version = await raiseVersion(tx, draft);
    return presentDraft(tx, { ...draft, version, kept });
  });
}

function withInput(line: KeptLine, { decision, caseName, algorithm }: SettleLineInput): KeptLine {
  const edit = (pointer: string, typed: string | undefined, now: string | null, inFile: string) =>
    typed === undefined ? now : typed === inFile ? null : plainText(pointer, typed);
  return {
    ...line,
    decision,
    editedCaseName: edit('/caseName', caseName, line.editedCaseName, line.caseName),
    editedAlgorithm: edit('/algorithm', algorithm, line.editedAlgorithm, line.algorithm),
  };
}
