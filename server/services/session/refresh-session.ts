import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { hashRefreshToken, newRefreshToken, REFRESH_SECONDS, signAccessToken } from '../../auth/tokens.ts';
import { signedOut } from '../../http/problem.ts';
import type { Claims } from '../context.ts';
import type { SessionCtx, Tokens } from './session-context.ts';
import { sessionSubject } from './session-subject.ts';

interface RotationRow extends Record<string, unknown> {
  verdict: 'rotated' | 'unknown' | 'ended' | 'reused';
  account_id: string | null;
  club_id: string | null;
  family_id: string | null;
}

export interface RefreshedSession {
  readonly tokens: Tokens;
  readonly claims: Claims;
}

/**
 * Changes a refresh token for the next one and a fresh access token; with `change`, into another club.
 * @throws Problem signed-out when the token is unknown, ended or was used before (then the device is out).
 */
export async function refreshSession(
  ctx: SessionCtx,
  refreshToken: string | undefined,
  change?: { clubId: string | null },
): Promise<RefreshedSession> {
  if (!refreshToken) throw signedOut();
  const now = ctx.clock.now();
  const next = newRefreshToken();
  const { rows } = await ctx.db.execute<RotationRow>(
    sql`select * from rotate_session(${hashRefreshToken(refreshToken)}, ${randomUUID()}::uuid, ${next.hash},
        ${change?.clubId ?? null}::uuid, ${change !== undefined}, ${new Date(now)}, ${new Date(now + REFRESH_SECONDS * 1000)})`,
  );
  const row = rows[0];
  if (row?.verdict !== 'rotated' || !row.account_id || !row.family_id) {
    throw signedOut('Your session has ended. Sign in again.');
  }
  const subject = await sessionSubject(ctx.db, row.account_id, row.club_id);
  if (!subject) throw signedOut('You are no longer in that club. Sign in again.');
  const claims = {
    accountId: row.account_id,
    clubId: row.club_id,
    role: subject.role,
    epoch: subject.epoch,
    familyId: row.family_id,
  };
  return { tokens: { access: await signAccessToken(ctx.keys, claims, now), refresh: next.token }, claims };
}
