import type { DraftView } from '#shared/contracts/intake.ts';
import { asAdministrator, type Ctx } from '../context.ts';
import { presentDraft } from './present-draft.ts';
import { readDraft } from './read-draft.ts';

/** One draft with the findings of all its lines. @throws Problem not-found. */
export async function showDraft(ctx: Ctx, { draftId }: { draftId: string }): Promise<DraftView> {
  return asAdministrator(ctx, async (tx) => presentDraft(tx, await readDraft(tx, draftId)));
}
