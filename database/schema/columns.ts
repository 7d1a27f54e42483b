import { sql } from 'drizzle-orm';
import { customType, timestamp, uuid } from 'drizzle-orm/pg-core';

/** Every instant is stored with its zone and read as a JavaScript Date. */
export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });

export const createdAt = () => instant('created_at').notNull().default(sql`now()`);

/** The tenant column. It stands in the primary, unique and foreign keys of every table that carries it. */
export const clubId = () => uuid('club_id').notNull();

export const memberId = () => uuid('member_id').notNull();

export const bytes = customType<{ data: Buffer }>({ dataType: () => 'bytea' });
