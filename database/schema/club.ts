import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  doublePrecision,
  foreignKey,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import { caseSet } from './catalogue.ts';
import { clubId, createdAt, instant, memberId } from './columns.ts';
import { account } from './identity.ts';

export const club = pgTable('club', {
  clubId: uuid('club_id').primaryKey(),
  name: text('name').notNull(),
  timeZone: text('time_zone').notNull(),
  createdAt: createdAt(),
});

/** A person in a club. Memory, queue and reviews belong to this, not to the account. */
export const membership = pgTable(
  'membership',
  {
    clubId: clubId().references(() => club.clubId, { onDelete: 'cascade' }),
    memberId: memberId(),
    accountId: uuid('account_id')
      .notNull()
      .references(() => account.accountId, { onDelete: 'cascade' }),
    role: text('role', { enum: ['member', 'captain'] }).notNull(),
    nickname: text('nickname').notNull(),
    /** Rises when the role changes or the membership ends: tokens issued before stop working. */
    epoch: integer('epoch').notNull().default(0),
    timeZone: text('time_zone').notNull(),
    /** The hour at which this member's training day begins. */
    rolloverHour: smallint('rollover_hour').notNull().default(4),
    minutesPerDay: smallint('minutes_per_day').notNull().default(6),
    /** β of the square-root law, solved once a day so that the forecast load fits the minutes; null before. */
    beta: doublePrecision('beta'),
    /** The local day β was last solved on. */
    betaDay: integer('beta_day'),
    /** Shown on the club's boards; off until the member says so. */
    onBoards: boolean('on_boards').notNull().default(false),
    holding: text('holding', { enum: ['right', 'left'] })
      .notNull()
      .default('right'),
    crossColours: text('cross_colours', {
      enum: [
        'white',
        'yellow',
        'green',
        'blue',
        'orange',
        'red',
        'white+yellow',
        'green+blue',
        'orange+red',
        'all',
      ],
    })
      .notNull()
      .default('white'),
    joinedAt: instant('joined_at').notNull(),
    leftAt: instant('left_at'),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.memberId] }),
    unique('membership_account').on(t.clubId, t.accountId),
    uniqueIndex('membership_nickname').on(t.clubId, sql`lower(${t.nickname})`),
    check('membership_rollover_hour', sql`${t.rolloverHour} between 0 and 23`),
    check('membership_minutes', sql`${t.minutesPerDay} between 1 and 120`),
  ],
);

/** Which sets a club trains, and how a showing of each is judged. */
export const programme = pgTable(
  'programme',
  {
    clubId: clubId().references(() => club.clubId, { onDelete: 'cascade' }),
    setKey: text('set_key')
      .notNull()
      .references(() => caseSet.setKey),
    /** null: follow the newest edition. */
    pinnedEdition: integer('pinned_edition'),
    /** Recognition time up to which a right answer is held, in milliseconds. */
    limitMs: integer('limit_ms').notNull(),
    asksAuf: boolean('asks_auf').notNull().default(true),
    /** Everyone in the club answers for the set; otherwise those listed in programme_member. */
    forEveryone: boolean('for_everyone').notNull().default(true),
    position: smallint('position').notNull().default(0),
    /** Rises with every edit; an edit names the version it was made on. */
    version: integer('version').notNull().default(1),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.setKey] }),
    check('programme_limit', sql`${t.limitMs} between 500 and 60000`),
  ],
);

export const programmeMember = pgTable(
  'programme_member',
  { clubId: clubId(), setKey: text('set_key').notNull(), memberId: memberId() },
  (t) => [
    primaryKey({ columns: [t.clubId, t.setKey, t.memberId] }),
    foreignKey({
      name: 'programme_member_programme',
      columns: [t.clubId, t.setKey],
      foreignColumns: [programme.clubId, programme.setKey],
    }).onDelete('cascade'),
    foreignKey({
      name: 'programme_member_member',
      columns: [t.clubId, t.memberId],
      foreignColumns: [membership.clubId, membership.memberId],
    }).onDelete('cascade'),
  ],
);

/** A board between clubs: team figures of one set, read across clubs only through its function. */
export const sharedBoard = pgTable('shared_board', {
  boardId: uuid('board_id').primaryKey(),
  name: text('name').notNull(),
  setKey: text('set_key')
    .notNull()
    .references(() => caseSet.setKey),
  createdAt: createdAt(),
});

export const sharedBoardClub = pgTable(
  'shared_board_club',
  {
    clubId: clubId().references(() => club.clubId, { onDelete: 'cascade' }),
    boardId: uuid('board_id')
      .notNull()
      .references(() => sharedBoard.boardId, { onDelete: 'cascade' }),
  },
  (t) => [primaryKey({ columns: [t.clubId, t.boardId] })],
);

/** What a club publishes of itself on a shared board: a team's figure, never a person's. */
export const publishedTeamRow = pgTable(
  'published_team_row',
  {
    clubId: clubId(),
    boardId: uuid('board_id').notNull(),
    day: integer('day').notNull(),
    members: integer('members').notNull(),
    theta: doublePrecision('theta').notNull(),
    standardError: doublePrecision('standard_error').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.boardId, t.day] }),
    foreignKey({
      name: 'published_team_row_club',
      columns: [t.clubId, t.boardId],
      foreignColumns: [sharedBoardClub.clubId, sharedBoardClub.boardId],
    }).onDelete('cascade'),
  ],
);
