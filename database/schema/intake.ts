import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { caseSet } from './catalogue.ts';
import { bytes, createdAt, instant } from './columns.ts';

/** An uploaded file on its way to an edition. The file itself is kept with its hash. */
export const intakeDraft = pgTable(
  'intake_draft',
  {
    draftId: uuid('draft_id').primaryKey(),
    setKey: text('set_key')
      .notNull()
      .references(() => caseSet.setKey),
    fileName: text('file_name').notNull(),
    fileHash: text('file_hash').notNull(),
    file: bytes('file').notNull(),
    unknownColumns: text('unknown_columns').array().notNull(),
    state: text('state', { enum: ['open', 'published', 'discarded'] })
      .notNull()
      .default('open'),
    /** Rises with every settled line; an edit names the version it was made on. */
    version: integer('version').notNull().default(1),
    createdBy: uuid('created_by').notNull(),
    createdAt: createdAt(),
    closedAt: instant('closed_at'),
    editionNumber: integer('edition_number'),
  },
  (t) => [
    index('intake_draft_open').on(t.state, t.createdAt),
    check('intake_draft_published', sql`(${t.state} = 'published') = (${t.editionNumber} is not null)`),
  ],
);

/** One line of the file: what it says, what the cube says, what the administrator decided. */
export const intakeLine = pgTable(
  'intake_line',
  {
    draftId: uuid('draft_id').notNull(),
    /** Counts from 1 with the header, as in the file. */
    line: integer('line').notNull(),
    caseName: text('case_name').notNull(),
    algorithm: text('algorithm').notNull(),
    group: text('group_name').notNull().default(''),
    note: text('note').notNull().default(''),
    /** `take` accepts the case the algorithm really solves; `drop` leaves the line out. */
    decision: text('decision', { enum: ['none', 'take', 'drop'] })
      .notNull()
      .default('none'),
    /** What the administrator typed instead of the file's words. */
    editedCaseName: text('edited_case_name'),
    editedAlgorithm: text('edited_algorithm'),
  },
  (t) => [
    primaryKey({ columns: [t.draftId, t.line] }),
    foreignKey({
      name: 'intake_line_draft',
      columns: [t.draftId],
      foreignColumns: [intakeDraft.draftId],
    }).onDelete('cascade'),
  ],
);
