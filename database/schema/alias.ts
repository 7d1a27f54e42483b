import { sql } from 'drizzle-orm';
import { check, foreignKey, pgTable, primaryKey, text, uniqueIndex } from 'drizzle-orm/pg-core';
import { setCase } from './catalogue.ts';
import { club } from './club.ts';
import { clubId, createdAt } from './columns.ts';

/**
 * What a club calls a case among itself. It hangs on the case key, so a subset's case has the alias of its
 * parent's; `set_key` is the set whose editions name the case, within which an alias is given once.
 */
export const caseAlias = pgTable(
  'case_alias',
  {
    clubId: clubId().references(() => club.clubId, { onDelete: 'cascade' }),
    caseKey: text('case_key').notNull(),
    setKey: text('set_key').notNull(),
    alias: text('alias').notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.clubId, t.caseKey] }),
    uniqueIndex('case_alias_once').on(t.clubId, t.setKey, sql`lower(${t.alias})`),
    foreignKey({
      name: 'case_alias_case',
      columns: [t.setKey, t.caseKey],
      foreignColumns: [setCase.setKey, setCase.caseKey],
    }),
    check('case_alias_length', sql`char_length(${t.alias}) between 1 and 24`),
  ],
);
