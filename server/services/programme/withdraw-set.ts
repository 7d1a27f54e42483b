import { and, eq } from 'drizzle-orm';
import { tables } from '#database/client.ts';
import type { ProgrammeView, WithdrawSetInput } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';
import { notFound, stale } from '../../http/problem.ts';
import { asCaptain, type Ctx } from '../context.ts';
import { programmeView } from './read-programme-view.ts';

const text = deskText.programme.problems;

/**
 * Takes a set off the club's programme. Answers, memory and rollups stay: assigned again, everyone goes on
 * where they were.
 * @throws Problem not-found when it is not on the programme, stale when it was changed meanwhile.
 */
export async function withdrawSet(ctx: Ctx, { setKey, version }: WithdrawSetInput): Promise<ProgrammeView> {
  const { programme } = tables;
  return asCaptain(ctx, async (tx, { clubId }) => {
    const own = and(eq(programme.clubId, clubId), eq(programme.setKey, setKey));
    const gone = await tx
      .delete(programme)
      .where(and(own, eq(programme.version, version)))
      .returning({ setKey: programme.setKey });
    if (gone.length === 0) {
      const [row] = await tx.select({ version: programme.version }).from(programme).where(own);
      throw row ? stale(text.changed) : notFound(text.gone);
    }
    return programmeView(tx, clubId);
  });
}
