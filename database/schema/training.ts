import {
  boolean,
  doublePrecision,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  uuid,
} from 'drizzle-orm/pg-core';
import { setCase } from './catalogue.ts';
import { membership } from './club.ts';
import { bytes, clubId, instant, memberId } from './columns.ts';

/** One picture put to one member: issued by the server, with all that its answer is judged by. */
export const showing = pgTable(
  'showing',
  {
    clubId: clubId(),
    memberId: memberId(),
    showingId: uuid('showing_id').notNull(),
    setKey: text('set_key').notNull(),
    caseKey: text('case_key').notNull(),
    editionNumber: integer('edition_number').notNull(),
    /** Full last-layer state shown, 0..62207. */
    state: integer('state').notNull(),
    /** 0..23: which colour is on top and which in front. */
    colouring: smallint('colouring').notNull(),
    cluster: smallint('cluster').notNull(),
    keysOffered: smallint('keys_offered').notNull(),
    limitMs: integer('limit_ms').notNull(),
    asksAuf: boolean('asks_auf').notNull(),
    reason: text('reason', { enum: ['due', 'new', 'retest'] }).notNull(),
    localDay: integer('local_day').notNull(),
    /** What it was reckoned to take when the day was planned: the day's total stays what it was. */
    plannedSeconds: doublePrecision('planned_seconds').notNull(),
    position: integer('position').notNull(),
    issuedAt: instant('issued_at').notNull(),
    /** The one answer this showing took. Set once, by a conditional update: the race of two tabs ends here. */
    reviewId: uuid('review_id'),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.memberId, t.showingId] }),
    foreignKey({
      name: 'showing_member',
      columns: [t.clubId, t.memberId],
      foreignColumns: [membership.clubId, membership.memberId],
    }).onDelete('cascade'),
    foreignKey({
      name: 'showing_case',
      columns: [t.setKey, t.caseKey],
      foreignColumns: [setCase.setKey, setCase.caseKey],
    }),
    index('showing_day').on(t.clubId, t.memberId, t.localDay, t.position),
  ],
);

/**
 * The log: append-only, partitioned by month on the id (a UUIDv7 made by the client). Carries all that the
 * fold and the boards need, so that every derived table can be made again from it.
 */
export const review = pgTable(
  'review',
  {
    clubId: clubId(),
    memberId: memberId(),
    reviewId: uuid('review_id').notNull(),
    showingId: uuid('showing_id').notNull(),
    setKey: text('set_key').notNull(),
    caseKey: text('case_key').notNull(),
    editionNumber: integer('edition_number').notNull(),
    state: integer('state').notNull(),
    colouring: smallint('colouring').notNull(),
    keysOffered: smallint('keys_offered').notNull(),
    limitMs: integer('limit_ms').notNull(),
    asksAuf: boolean('asks_auf').notNull(),
    /** The algorithm whose AUF before was asked; null where none was. */
    algorithm: text('algorithm'),
    /** Raw choice: a case key, or solved, lost, unrecognised, left. */
    named: text('named').notNull(),
    /** Raw choice: 0..3 quarter turns; null where not asked or not reached. */
    aufBefore: smallint('auf_before'),
    recognitionMs: integer('recognition_ms'),
    namingMs: integer('naming_ms'),
    outcome: text('outcome', { enum: ['held', 'late', 'missed', 'left'] }).notNull(),
    caseRight: boolean('case_right').notNull(),
    aufRight: boolean('auf_right'),
    scored: boolean('scored').notNull(),
    unscoredReason: text('unscored_reason'),
    onBoards: boolean('on_boards').notNull(),
    lostBy: text('lost_by'),
    localDay: integer('local_day').notNull(),
    issuedAt: instant('issued_at').notNull(),
    answeredAt: instant('answered_at').notNull(),
    receivedAt: instant('received_at').notNull(),
    /** SHA-256 of the answer as sent: the same id with another body is refused. */
    bodyHash: bytes('body_hash').notNull(),
    /** Brought along from another club: feeds memory, never boards. */
    carried: boolean('carried').notNull().default(false),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.memberId, t.reviewId] }),
    foreignKey({
      name: 'review_member',
      columns: [t.clubId, t.memberId],
      foreignColumns: [membership.clubId, membership.memberId],
    }).onDelete('cascade'),
    index('review_case').on(t.clubId, t.memberId, t.caseKey, t.answeredAt),
    index('review_day').on(t.clubId, t.memberId, t.localDay),
  ],
);

/** A mis-tap: an event of its own beside the answer it speaks of. */
export const misTap = pgTable(
  'mis_tap',
  {
    clubId: clubId(),
    memberId: memberId(),
    reviewId: uuid('review_id').notNull(),
    caseKey: text('case_key').notNull(),
    /** The local day of the answer it speaks of. */
    localDay: integer('local_day').notNull(),
    at: instant('at').notNull(),
    receivedAt: instant('received_at').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.memberId, t.reviewId] }),
    foreignKey({
      name: 'mis_tap_member',
      columns: [t.clubId, t.memberId],
      foreignColumns: [membership.clubId, membership.memberId],
    }).onDelete('cascade'),
    index('mis_tap_case').on(t.clubId, t.memberId, t.caseKey),
  ],
);

/** Derived: the fold of a case's log. Keyed by the case, not by an edition. */
export const caseState = pgTable(
  'case_state',
  {
    clubId: clubId(),
    memberId: memberId(),
    caseKey: text('case_key').notNull(),
    /** The set its last answer came through. */
    setKey: text('set_key').notNull(),
    stability: doublePrecision('stability').notNull(),
    difficulty: doublePrecision('difficulty').notNull(),
    firstDay: integer('first_day').notNull(),
    lastDay: integer('last_day').notNull(),
    answers: integer('answers').notNull(),
    lapses: integer('lapses').notNull(),
    lastReviewId: uuid('last_review_id').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.memberId, t.caseKey] }),
    foreignKey({
      name: 'case_state_member',
      columns: [t.clubId, t.memberId],
      foreignColumns: [membership.clubId, membership.memberId],
    }).onDelete('cascade'),
    foreignKey({
      name: 'case_state_case',
      columns: [t.setKey, t.caseKey],
      foreignColumns: [setCase.setKey, setCase.caseKey],
    }),
  ],
);

/** Derived: a local day's first scored showing of a case, with the recall the model gave it before. */
export const firstAnswer = pgTable(
  'first_answer',
  {
    clubId: clubId(),
    memberId: memberId(),
    caseKey: text('case_key').notNull(),
    localDay: integer('local_day').notNull(),
    setKey: text('set_key').notNull(),
    reviewId: uuid('review_id').notNull(),
    /** null at the very first meeting with the case. */
    recallBefore: doublePrecision('recall_before'),
    keysOffered: smallint('keys_offered').notNull(),
    held: boolean('held').notNull(),
    onBoards: boolean('on_boards').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.memberId, t.caseKey, t.localDay] }),
    foreignKey({
      name: 'first_answer_member',
      columns: [t.clubId, t.memberId],
      foreignColumns: [membership.clubId, membership.memberId],
    }).onDelete('cascade'),
    index('first_answer_day').on(t.clubId, t.memberId, t.localDay),
  ],
);

/**
 * Derived: member × day × set × group. Sums over the edition's cases other than the skip, p the prior's
 * weight, e the calibrated recall on that day; figures of sets, periods and teams are sums of these.
 */
export const rollup = pgTable(
  'rollup',
  {
    clubId: clubId(),
    day: integer('day').notNull(),
    memberId: memberId(),
    setKey: text('set_key').notNull(),
    group: text('group_name').notNull(),
    editionNumber: integer('edition_number').notNull(),
    sumP: doublePrecision('sum_p').notNull(),
    sumPe: doublePrecision('sum_pe').notNull(),
    /** Σ p·e·(1−e) */
    sumPee: doublePrecision('sum_pee').notNull(),
    /** Calibration in force on the day: from the 30 days before it. */
    shift: doublePrecision('shift').notNull(),
    information: doublePrecision('information').notNull(),
    answers: integer('answers').notNull(),
    held: integer('held').notNull(),
    late: integer('late').notNull(),
    missed: integer('missed').notNull(),
    left: integer('left_count').notNull(),
    misTaps: integer('mis_taps').notNull(),
    /** Milliseconds spent on the day's showings. */
    spentMs: integer('spent_ms').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.day, t.memberId, t.setKey, t.group] }),
    foreignKey({
      name: 'rollup_member',
      columns: [t.clubId, t.memberId],
      foreignColumns: [membership.clubId, membership.memberId],
    }).onDelete('cascade'),
    index('rollup_member_set').on(t.clubId, t.memberId, t.setKey, t.day),
  ],
);
