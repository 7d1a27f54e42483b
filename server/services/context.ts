import { sql } from 'drizzle-orm';
import type { Database, Transaction } from '#database/client.ts';
import { Problem, signedOut } from '../http/problem.ts';

/** Time and chance, handed in so that a simulation can bring its own. */
export interface Clock {
  /** Milliseconds since 1970. */
  now(): number;
}

export interface Deps {
  readonly db: Database;
  readonly clock: Clock;
  /** Uniform in [0, 1). */
  readonly random: () => number;
}

export type Role = 'member' | 'captain' | 'administrator';

/** What a verified access token says. Believed only after `open_session` has checked it against the tables. */
export interface Claims {
  readonly accountId: string;
  readonly clubId: string | null;
  readonly role: Role;
  readonly epoch: number;
  /** The refresh family, one per signed-in device; null only inside the process (simulation). */
  readonly familyId: string | null;
}

/** What every service is handed first. */
export interface Ctx extends Deps {
  readonly claims: Claims | null;
  readonly requestId: string;
}

/** A person in a club, for the length of one transaction. */
export interface ClubActor {
  readonly accountId: string;
  readonly clubId: string;
  readonly memberId: string;
  readonly role: 'member' | 'captain';
  readonly nickname: string;
  readonly clubName: string;
  readonly timeZone: string;
  readonly rolloverHour: number;
}

export interface AdministratorActor {
  readonly accountId: string;
}

interface SessionRow extends Record<string, unknown> {
  member_id: string | null;
  nickname: string | null;
  club_name: string | null;
  time_zone: string;
  rollover_hour: number;
}

async function openSession(tx: Transaction, claims: Claims): Promise<SessionRow> {
  const { rows } = await tx.execute<SessionRow>(
    sql`select * from open_session(${claims.accountId}::uuid, ${claims.clubId}::uuid, ${claims.role}, ${claims.epoch}, ${claims.familyId}::uuid)`,
  );
  const row = rows[0];
  if (!row) throw signedOut('Your session has ended. Sign in again.');
  return row;
}

/**
 * Runs `work` in one transaction as a person in their club: row-level security shows that club and no other.
 * Captains are members too.
 * @throws Problem signed-out, or forbidden for an administrator's token.
 */
export async function asMember<T>(
  ctx: Ctx,
  work: (tx: Transaction, actor: ClubActor) => Promise<T>,
): Promise<T> {
  const { claims } = ctx;
  if (!claims) throw signedOut();
  if (claims.role === 'administrator' || claims.clubId === null) {
    throw new Problem('forbidden', 'This place belongs to a club. Switch to one first.');
  }
  const { clubId, role } = claims;
  return ctx.db.transaction(async (tx) => {
    const row = await openSession(tx, claims);
    if (!row.member_id) throw signedOut();
    return work(tx, {
      accountId: claims.accountId,
      clubId,
      memberId: row.member_id,
      role,
      nickname: row.nickname ?? '',
      clubName: row.club_name ?? '',
      timeZone: row.time_zone,
      rolloverHour: row.rollover_hour,
    });
  });
}

/** As `asMember`, for captains only. @throws Problem forbidden for anyone else. */
export async function asCaptain<T>(
  ctx: Ctx,
  work: (tx: Transaction, actor: ClubActor) => Promise<T>,
): Promise<T> {
  if (ctx.claims && ctx.claims.role !== 'captain') {
    throw new Problem('forbidden', 'Only a captain of the club can do this.');
  }
  return asMember(ctx, work);
}

/** Runs `work` in one transaction as administrator: the catalogue can be written, no club is seen. */
export async function asAdministrator<T>(
  ctx: Ctx,
  work: (tx: Transaction, actor: AdministratorActor) => Promise<T>,
): Promise<T> {
  const { claims } = ctx;
  if (!claims) throw signedOut();
  if (claims.role !== 'administrator') {
    throw new Problem('forbidden', 'Only an administrator can do this.');
  }
  return ctx.db.transaction(async (tx) => {
    await openSession(tx, claims);
    return work(tx, { accountId: claims.accountId });
  });
}

/**
 * Runs `work` in one transaction as whoever is signed in: a person in their club, who sees that club and what
 * belongs to everyone, or an administrator, for whom the actor is null.
 * @throws Problem signed-out.
 */
export async function asSignedIn<T>(
  ctx: Ctx,
  work: (tx: Transaction, actor: ClubActor | null) => Promise<T>,
): Promise<T> {
  if (ctx.claims?.role === 'administrator') return asAdministrator(ctx, (tx) => work(tx, null));
  return asMember(ctx, work);
}
