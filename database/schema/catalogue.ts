import { sql } from 'drizzle-orm';
import {
  type AnyPgColumn,
  boolean,
  check,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  smallint,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import type { Entry } from '#shared/lastlayer/index.ts';
import { createdAt, instant } from './columns.ts';

/**
 * A case set: entry condition, aspects told apart, aspects solved (shared/lastlayer defines the words). The trade's
 * sets and what an administrator adds belong to the installation; a club's own set is seen by that club alone.
 * Once made it never changes; what is no longer wanted is retired, because answers still speak of it.
 */
export const caseSet = pgTable(
  'case_set',
  {
    setKey: text('set_key').primaryKey(),
    /**
     * The set whose editions serve this one too: a subset's whole, or for a mix of entries the set with the same
     * cases. One step only: that set has no parent itself. null: the set has editions of its own.
     */
    parentKey: text('parent_key').references((): AnyPgColumn => caseSet.setKey),
    /** null: the installation's. References club; the migration says so, these files import one another one way. */
    clubId: uuid('club_id'),
    name: text('name').notNull(),
    /** For a mix of entries what all of them have in common. */
    entry: text('entry').notNull(),
    /** How many parts of the solves that reach the set come by which entry; empty for a single entry. */
    mix: jsonb('mix').$type<readonly EntryPart[]>().notNull().default([]),
    toldApart: text('told_apart').array().notNull(),
    solved: text('solved').array().notNull(),
    createdAt: createdAt(),
    /** The account that defined it; null for the trade's sets. */
    createdBy: uuid('created_by'),
    retiredAt: instant('retired_at'),
  },
  (t) => [
    uniqueIndex('case_set_name')
      .on(sql`coalesce(${t.clubId}, '00000000-0000-0000-0000-000000000000'::uuid)`, sql`lower(${t.name})`)
      .where(sql`${t.retiredAt} is null`),
    index('case_set_parent').on(t.parentKey),
    check('case_set_name_length', sql`char_length(${t.name}) between 1 and 40`),
  ],
);

/** As shared/lastlayer has it: an entry condition and its share in whole parts. */
interface EntryPart {
  readonly entry: Entry;
  readonly parts: number;
}

/**
 * Every case of a set as the engine counts them, the skip included (number 0). Memory hangs on case_key, which a
 * subset's case shares with its parent's.
 */
export const setCase = pgTable(
  'set_case',
  {
    setKey: text('set_key')
      .notNull()
      .references(() => caseSet.setKey),
    caseKey: text('case_key').notNull(),
    number: integer('number').notNull(),
    canonical: integer('canonical').notNull(),
    weight: integer('weight').notNull(),
    angles: smallint('angles').notNull(),
    /** The fixed cluster whose names a showing offers; 0 where all names are offered. Never changes. */
    cluster: smallint('cluster').notNull(),
    isSkip: boolean('is_skip').notNull(),
  },
  (t) => [primaryKey({ columns: [t.setKey, t.caseKey] }), unique('set_case_number').on(t.setKey, t.number)],
);

/** A published, numbered, immutable version of a set: rows are inserted once and never changed. */
export const edition = pgTable(
  'edition',
  {
    setKey: text('set_key')
      .notNull()
      .references(() => caseSet.setKey),
    number: integer('number').notNull(),
    publishedAt: instant('published_at').notNull(),
    publishedBy: uuid('published_by'),
    note: text('note').notNull().default(''),
    draftId: uuid('draft_id').unique(),
  },
  (t) => [primaryKey({ columns: [t.setKey, t.number] })],
);

export const editionCase = pgTable(
  'edition_case',
  {
    setKey: text('set_key').notNull(),
    editionNumber: integer('edition_number').notNull(),
    caseKey: text('case_key').notNull(),
    name: text('name').notNull(),
    group: text('group_name').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.setKey, t.editionNumber, t.caseKey] }),
    unique('edition_case_name').on(t.setKey, t.editionNumber, t.name),
    foreignKey({
      name: 'edition_case_edition',
      columns: [t.setKey, t.editionNumber],
      foreignColumns: [edition.setKey, edition.number],
    }),
    foreignKey({
      name: 'edition_case_case',
      columns: [t.setKey, t.caseKey],
      foreignColumns: [setCase.setKey, setCase.caseKey],
    }),
  ],
);

export const editionAlgorithm = pgTable(
  'edition_algorithm',
  {
    setKey: text('set_key').notNull(),
    editionNumber: integer('edition_number').notNull(),
    caseKey: text('case_key').notNull(),
    /** 1 is the one shown first. */
    rank: smallint('rank').notNull(),
    algorithm: text('algorithm').notNull(),
    note: text('note').notNull().default(''),
  },
  (t) => [
    primaryKey({ columns: [t.setKey, t.editionNumber, t.caseKey, t.rank] }),
    unique('edition_algorithm_once').on(t.setKey, t.editionNumber, t.algorithm),
    foreignKey({
      name: 'edition_algorithm_case',
      columns: [t.setKey, t.editionNumber, t.caseKey],
      foreignColumns: [editionCase.setKey, editionCase.editionNumber, editionCase.caseKey],
    }),
  ],
);
