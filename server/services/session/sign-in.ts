import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import type { SignedIn, SignInInput } from '#shared/contracts/session.ts';
import { hashPassword, needsRehash, verifyPassword } from '../../auth/passwords.ts';
import { newRefreshToken, REFRESH_SECONDS, signAccessToken } from '../../auth/tokens.ts';
import { Problem } from '../../http/problem.ts';
import { picturesOf } from '../pictures/read-pictures.ts';
import { homeOf, membershipsOf, presentSession } from './describe-session.ts';
import type { SessionCtx, Tokens } from './session-context.ts';
import { sessionSubject } from './session-subject.ts';

interface AccountRow extends Record<string, unknown> {
  account_id: string;
  password_hash: string;
  is_administrator: boolean;
  disabled: boolean;
  epoch: number;
}

/** One sentence for every failure: it does not tell who exists. */
const WRONG = 'That name and password do not go together.';

/**
 * Starts a session on a new device, in the person's first club (administrators: in none).
 * @throws Problem signed-out, the same for an unknown name, a wrong password and a disabled account.
 */
export async function signIn(
  ctx: SessionCtx,
  input: SignInInput,
): Promise<{ tokens: Tokens; signedIn: SignedIn }> {
  const { rows } = await ctx.db.execute<AccountRow>(sql`select * from sign_in_lookup(${input.signIn})`);
  const account = rows[0];
  const right = await verifyPassword(account?.password_hash ?? null, input.password);
  if (!account || !right || account.disabled) throw new Problem('signed-out', WRONG);

  if (needsRehash(account.password_hash)) {
    const fresh = await hashPassword(input.password);
    await ctx.db.execute(
      sql`select rehash_password(${account.account_id}::uuid, ${account.password_hash}, ${fresh})`,
    );
  }
  const memberships = await membershipsOf(ctx.db, account.account_id);
  const clubId = account.is_administrator ? null : (memberships[0]?.club_id ?? null);
  const subject = await sessionSubject(ctx.db, account.account_id, clubId);
  if (!subject)
    throw new Problem('forbidden', 'You are in no club at present. Ask your captain for an invitation.');

  const now = ctx.clock.now();
  const familyId = randomUUID();
  const refresh = newRefreshToken();
  await ctx.db.execute(
    sql`select start_session(${randomUUID()}::uuid, ${familyId}::uuid, ${account.account_id}::uuid, ${clubId}::uuid,
        ${refresh.hash}, ${new Date(now)}, ${new Date(now + REFRESH_SECONDS * 1000)})`,
  );
  const access = await signAccessToken(
    ctx.keys,
    { accountId: account.account_id, clubId, role: subject.role, epoch: subject.epoch, familyId },
    now,
  );
  return {
    tokens: { access, refresh: refresh.token },
    signedIn: {
      next: homeOf(subject.role),
      session: presentSession(
        memberships,
        { role: subject.role, clubId },
        {
          isAdministrator: account.is_administrator,
          pictures: await picturesOf(ctx.db, account.account_id),
        },
      ),
    },
  };
}
