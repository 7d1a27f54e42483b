import { eq } from 'drizzle-orm';
import { tables } from '#database/client.ts';
import type { DiscardInput, IntakeView } from '#shared/contracts/intake.ts';
import { asAdministrator, type Ctx } from '../context.ts';
import { intakeView } from './list-intake.ts';
import { holdOpenDraft } from './read-draft.ts';

/**
 * Closes a draft without publishing anything. The file and its lines stay in the database.
 * @throws Problem not-found, conflict for a closed draft, stale for a changed one.
 */
export async function discardDraft(ctx: Ctx, input: DiscardInput): Promise<IntakeView> {
  return asAdministrator(ctx, async (tx) => {
    const { draftId, version } = await holdOpenDraft(tx, input);
    const { intakeDraft } = tables;
    await tx
      .update(intakeDraft)
      .set({ state: 'discarded', version: version + 1, closedAt: new Date(ctx.clock.now()) })
      .where(eq(intakeDraft.draftId, draftId));
    return intakeView(tx);
  });
}
