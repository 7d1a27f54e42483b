import type { SignedIn, SwitchClubInput } from '#shared/contracts/session.ts';
import { notFound, signedOut } from '../../http/problem.ts';
import { picturesOf } from '../pictures/read-pictures.ts';
import { homeOf, membershipsOf, presentSession } from './describe-session.ts';
import { refreshSession } from './refresh-session.ts';
import type { SessionCtx, Tokens } from './session-context.ts';
import { sessionSubject } from './session-subject.ts';

/** Moves this device to another of the person's clubs, or (null) to the administrator's places: a new token. */
export async function switchClub(
  ctx: SessionCtx,
  refreshToken: string | undefined,
  input: SwitchClubInput,
): Promise<{ tokens: Tokens; signedIn: SignedIn }> {
  if (!ctx.claims) throw signedOut();
  // Asked before the token is changed: a club that is not theirs leaves the session as it was.
  if (!(await sessionSubject(ctx.db, ctx.claims.accountId, input.clubId))) {
    throw notFound('You are not in that club.');
  }
  const { tokens, claims } = await refreshSession(ctx, refreshToken, { clubId: input.clubId });
  const memberships = await membershipsOf(ctx.db, claims.accountId);
  const isAdministrator = (await sessionSubject(ctx.db, claims.accountId, null)) !== null;
  const pictures = await picturesOf(ctx.db, claims.accountId);
  return {
    tokens,
    signedIn: {
      next: homeOf(claims.role),
      session: presentSession(memberships, claims, { isAdministrator, pictures }),
    },
  };
}
