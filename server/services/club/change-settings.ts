import { and, eq, isNull } from 'drizzle-orm';
import { tables } from '#database/client.ts';
import type { MemberSettings } from '#shared/contracts/member.ts';
import { notFound } from '../../http/problem.ts';
import { asMember, type Ctx } from '../context.ts';
import { presentSettings } from './present-settings.ts';

/** Sets a member's own minutes, boards, holding and cross colours; nobody else's. The last save stands. */
export async function changeSettings(ctx: Ctx, input: MemberSettings): Promise<MemberSettings> {
  return asMember(ctx, async (tx, actor) => {
    const { membership } = tables;
    const { minutesPerDay, onBoards, holding, crossColours } = input;
    const [changed] = await tx
      .update(membership)
      .set({ minutesPerDay, onBoards, holding, crossColours })
      .where(
        and(
          eq(membership.clubId, actor.clubId),
          eq(membership.memberId, actor.memberId),
          isNull(membership.leftAt),
        ),
      )
      .returning();
    if (!changed) throw notFound('You are no longer a member of this club.');
    return presentSettings(changed);
  });
}
