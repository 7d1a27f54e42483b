import { sql } from 'drizzle-orm';
import type { SessionView } from '#shared/contracts/session.ts';
import { signedOut } from '../../http/problem.ts';
import type { Ctx } from '../context.ts';
import { picturesOf } from '../pictures/read-pictures.ts';
import { membershipsOf, presentSession } from './describe-session.ts';
import { sessionSubject } from './session-subject.ts';

/** The session as the tables see it now. @throws Problem signed-out when it is over. */
export async function readSession(ctx: Ctx): Promise<SessionView> {
  const { claims } = ctx;
  if (!claims) throw signedOut();
  return ctx.db.transaction(async (tx) => {
    const { rows } = await tx.execute(
      sql`select 1 from open_session(${claims.accountId}::uuid, ${claims.clubId}::uuid, ${claims.role}, ${claims.epoch}, ${claims.familyId}::uuid)`,
    );
    if (rows.length === 0) throw signedOut('Your session has ended. Sign in again.');
    const memberships = await membershipsOf(tx, claims.accountId);
    const isAdministrator =
      claims.role === 'administrator' || (await sessionSubject(tx, claims.accountId, null)) !== null;
    const pictures = await picturesOf(tx, claims.accountId);
    return presentSession(memberships, claims, { isAdministrator, pictures });
  });
}
