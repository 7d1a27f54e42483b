import {
  boolean,
  foreignKey,
  integer,
  pgTable,
  primaryKey,
  smallint,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import { createdAt, instant } from './columns.ts';

/** A case set: entry condition, aspects told apart, aspects solved (shared/lastlayer defines the words). */
export const caseSet = pgTable('case_set', {
  setKey: text('set_key').primaryKey(),
  name: text('name').notNull().unique(),
  entry: text('entry').notNull(),
  toldApart: text('told_apart').array().notNull(),
  solved: text('solved').array().notNull(),
  createdAt: createdAt(),
});

/** Every case of a set as the engine counts them, the skip included (number 0). Memory hangs on case_key. */
export const setCase = pgTable(
  'set_case',
  {
    caseKey: text('case_key').primaryKey(),
    setKey: text('set_key')
      .notNull()
      .references(() => caseSet.setKey),
    number: integer('number').notNull(),
    canonical: integer('canonical').notNull(),
    weight: integer('weight').notNull(),
    angles: smallint('angles').notNull(),
    /** The fixed cluster whose names a showing offers; 0 where all names are offered. Never changes. */
    cluster: smallint('cluster').notNull(),
    isSkip: boolean('is_skip').notNull(),
  },
  (t) => [
    unique('set_case_number').on(t.setKey, t.number),
    unique('set_case_in_set').on(t.setKey, t.caseKey),
  ],
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
