import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { hashPassword } from '#server/auth/passwords.ts';
import type { Claims } from '#server/services/context.ts';

/** A person made for a test, with the claims their token would carry. */
export interface Person {
  readonly accountId: string;
  readonly memberId: string;
  readonly clubId: string;
  readonly nickname: string;
  readonly signIn: string;
  readonly claims: Claims;
}

export interface ClubOfTest {
  readonly clubId: string;
  readonly name: string;
}

let count = 0;
let passwordHash: Promise<string> | undefined;
export const TEST_PASSWORD = 'four words make sense';

/** Builds missing parents by itself; everything it makes is new, so tests do not meet. */
export class Factory {
  readonly #pool: pg.Pool;

  constructor(ownerUrl: string) {
    this.#pool = new pg.Pool({ connectionString: ownerUrl, max: 2 });
  }

  /** Runs SQL as the owner, behind the walls. */
  async sql<T extends pg.QueryResultRow>(text: string, values: unknown[] = []): Promise<T[]> {
    return (await this.#pool.query<T>(text, values)).rows;
  }

  async club({ timeZone = 'Europe/London' } = {}): Promise<ClubOfTest> {
    const clubId = randomUUID();
    count += 1;
    const name = `Club ${count}`;
    await this.sql('insert into club (club_id, name, time_zone) values ($1, $2, $3)', [
      clubId,
      name,
      timeZone,
    ]);
    return { clubId, name };
  }

  async person({
    club,
    role = 'member',
    onBoards = true,
    minutesPerDay = 6,
  }: {
    club?: ClubOfTest;
    role?: 'member' | 'captain';
    onBoards?: boolean;
    minutesPerDay?: number;
  } = {}): Promise<Person> {
    const { clubId } = club ?? (await this.club());
    count += 1;
    const accountId = randomUUID();
    const memberId = randomUUID();
    const nickname = `Person ${count}`;
    const signIn = `person-${count}-${accountId.slice(0, 4)}@example.test`;
    passwordHash ??= hashPassword(TEST_PASSWORD);
    await this.sql('insert into account (account_id, email, password_hash) values ($1, $2, $3)', [
      accountId,
      signIn,
      await passwordHash,
    ]);
    await this.sql(
      `insert into membership (club_id, member_id, account_id, role, nickname, time_zone, on_boards, minutes_per_day, joined_at)
       values ($1, $2, $3, $4, $5, 'Europe/London', $6, $7, now())`,
      [clubId, memberId, accountId, role, nickname, onBoards, minutesPerDay],
    );
    return {
      accountId,
      memberId,
      clubId,
      nickname,
      signIn,
      claims: { accountId, clubId, role, epoch: 0, familyId: null },
    };
  }

  async administrator(): Promise<{ accountId: string; signIn: string; claims: Claims }> {
    count += 1;
    const accountId = randomUUID();
    const signIn = `administrator-${count}-${accountId.slice(0, 4)}@example.test`;
    passwordHash ??= hashPassword(TEST_PASSWORD);
    await this.sql(
      'insert into account (account_id, email, password_hash, is_administrator) values ($1, $2, $3, true)',
      [accountId, signIn, await passwordHash],
    );
    return {
      accountId,
      signIn,
      claims: { accountId, clubId: null, role: 'administrator', epoch: 0, familyId: null },
    };
  }

  /** Puts a set on a club's programme, for everyone unless members are named. */
  async assign(
    club: { clubId: string },
    setKey: string,
    {
      limitMs = 3000,
      asksAuf = true,
      memberIds,
    }: { limitMs?: number; asksAuf?: boolean; memberIds?: string[] } = {},
  ): Promise<void> {
    await this.sql(
      'insert into programme (club_id, set_key, limit_ms, asks_auf, for_everyone) values ($1, $2, $3, $4, $5)',
      [club.clubId, setKey, limitMs, asksAuf, memberIds === undefined],
    );
    for (const memberId of memberIds ?? []) {
      await this.sql('insert into programme_member (club_id, set_key, member_id) values ($1, $2, $3)', [
        club.clubId,
        setKey,
        memberId,
      ]);
    }
  }

  async end(): Promise<void> {
    await this.#pool.end();
  }
}
