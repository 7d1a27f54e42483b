import { sql } from 'drizzle-orm';
import { type Database, tables } from '#database/client.ts';
import demoAccounts from '#database/seed/demo-accounts.json' with { type: 'json' };
import { caseSet } from '#shared/lastlayer/index.ts';
import { dayStart, localDay } from '#shared/memory/index.ts';
import { hashPassword } from '../auth/passwords.ts';
import { completeClubDays } from '../services/rollups/complete-club-days.ts';
import { Learner } from './learner.ts';
import { DEMO_CLUBS, DEMO_DAYS, type DemoClub, SHARED_BOARD } from './people.ts';
import { seededRandom, seededUuid, seedOf } from './random.ts';
import { type Simulation, simulateDay } from './simulate-member.ts';

const LIMIT_MS = 3_000;
/** β while the history is made: about what the first nights' solutions come to for these people. */
const HISTORY_BETA = 0.045;
/** Members are simulated side by side: each has a generator of their own, so the order does not matter. */
const SIDE_BY_SIDE = 4;

export interface DemoNeeds {
  readonly owner: Database;
  readonly app: Database;
  /** Milliseconds since 1970; the history ends the day before. */
  readonly now: number;
  progress(percent: number, text: string): void;
}

/** A member's history to be: from their first day to yesterday. */
interface PlannedHistory {
  readonly sim: Simulation;
  readonly firstDay: number;
  readonly lastDay: number;
}

/** Makes the demonstration: clubs, people, programme, and their history through the services a phone calls. */
export async function seedDemo(needs: DemoNeeds): Promise<void> {
  needs.progress(0, 'clubs and people');
  const accounts = await makeAccounts(needs.owner);
  const simulations: PlannedHistory[] = [];
  const boardId = seededUuid(seededRandom(seedOf('board')));
  await needs.owner
    .insert(tables.sharedBoard)
    .values({ boardId, name: SHARED_BOARD.name, setKey: SHARED_BOARD.setKey });
  for (const club of DEMO_CLUBS) {
    simulations.push(...(await makeClub(needs, club, boardId, accounts)));
  }
  await simulateAll(needs, simulations);
  await completeClubDays(needs.owner, { now: () => needs.now });
  needs.progress(100, 'done');
}

async function makeAccounts(owner: Database): Promise<Map<string, string>> {
  const passwords = new Map(demoAccounts.map(({ signIn, password }) => [signIn, password]));
  const signIns = new Set([
    ...DEMO_CLUBS.flatMap((club) => club.people.map((p) => p.signIn)),
    ...passwords.keys(),
  ]);
  const accounts = new Map<string, string>();
  for (const signIn of signIns) {
    const accountId = seededUuid(seededRandom(seedOf(`account ${signIn}`)));
    const password = passwords.get(signIn);
    accounts.set(signIn, accountId);
    await owner.insert(tables.account).values({
      accountId,
      email: signIn.includes('@') ? signIn : null,
      signInName: signIn.includes('@') ? null : signIn,
      // Those who are not listed cannot sign in: no password has this hash.
      passwordHash: password ? await hashPassword(password) : UNUSABLE,
      isAdministrator: signIn.endsWith('@sixteenfold.example'),
    });
  }
  return accounts;
}

/** A well-formed hash of the same cost with a digest of zeros. */
const UNUSABLE = `$argon2id$v=19$m=19456,t=2,p=1$${'A'.repeat(22)}$${'A'.repeat(43)}`;

async function makeClub(
  { owner, app, now }: DemoNeeds,
  club: DemoClub,
  boardId: string,
  accounts: ReadonlyMap<string, string>,
): Promise<PlannedHistory[]> {
  const clubId = seededUuid(seededRandom(seedOf(`club ${club.name}`)));
  const lastDay = localDay(now, club.timeZone, 4) - 1;
  await owner.insert(tables.club).values({ clubId, name: club.name, timeZone: club.timeZone });
  await owner.insert(tables.sharedBoardClub).values({ clubId, boardId });
  await owner
    .insert(tables.programme)
    .values(club.sets.map((setKey, position) => ({ clubId, setKey, limitMs: LIMIT_MS, position })));
  const simulations: PlannedHistory[] = [];
  for (const person of club.people) {
    const accountId = accounts.get(person.signIn);
    if (!accountId) throw new Error(`${person.signIn} has no account.`);
    const random = seededRandom(seedOf(`${club.name} ${person.nickname}`));
    const firstDay = lastDay - Math.min(person.joined, DEMO_DAYS) + 1;
    await owner.insert(tables.membership).values({
      clubId,
      memberId: seededUuid(random),
      accountId,
      role: person.role,
      nickname: person.nickname,
      timeZone: club.timeZone,
      minutesPerDay: person.minutesPerDay,
      onBoards: person.onBoards,
      beta: HISTORY_BETA,
      holding: person.holding,
      crossColours: person.crossColours,
      joinedAt: new Date(dayStart(firstDay, club.timeZone, 4)),
    });
    const learner = new Learner(person, random);
    for (const setKey of club.sets) learner.bring(caseSet(setKey), firstDay);
    const claims = { accountId, clubId, role: person.role, epoch: 0, familyId: null };
    simulations.push({
      sim: { db: app, owner, person, claims, timeZone: club.timeZone, learner, random },
      firstDay,
      lastDay,
    });
  }
  return simulations;
}

async function simulateAll(
  { owner, progress }: DemoNeeds,
  simulations: readonly PlannedHistory[],
): Promise<void> {
  const total = simulations.reduce((sum, s) => sum + s.lastDay - s.firstDay + 1, 0);
  let done = 0;
  let answers = 0;
  const waiting = [...simulations];
  const worker = async () => {
    for (let next = waiting.shift(); next; next = waiting.shift()) {
      for (let day = next.firstDay; day <= next.lastDay; day++) {
        const trains = next.sim.random() < next.sim.person.diligence;
        const given = trains ? await simulateDay(next.sim, day) : 0;
        answers += given;
        done += 1;
        if (done % 25 === 0) progress((done / total) * 99, `${answers} answers of ${DEMO_DAYS} days`);
      }
    }
  };
  await Promise.all(Array.from({ length: SIDE_BY_SIDE }, worker));
  // The planner has seen empty tables until now.
  await owner.execute(sql`analyze`);
}
