import { sql } from 'drizzle-orm';
import { boolean, check, index, integer, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { bytes, createdAt, instant } from './columns.ts';

/**
 * A person's sign-in. Global, and out of reach of the application role: it is read and written only through
 * the SECURITY DEFINER functions of the migrations.
 */
export const account = pgTable(
  'account',
  {
    accountId: uuid('account_id').primaryKey(),
    /** Lower case; null for a person whose captain issued the sign-in. */
    email: text('email').unique(),
    /** Lower case; an issued name, for those without e-mail. */
    signInName: text('sign_in_name').unique(),
    passwordHash: text('password_hash').notNull(),
    isAdministrator: boolean('is_administrator').notNull().default(false),
    disabledAt: instant('disabled_at'),
    /** Rises when every token of this person must stop working. */
    epoch: integer('epoch').notNull().default(0),
    createdAt: createdAt(),
    /** How pictures are drawn for this person, in every club: a palette's key, or `own`. */
    palette: text('palette', { enum: ['standard', 'safe', 'stickerless', 'greys', 'own'] })
      .notNull()
      .default('standard'),
    letters: boolean('letters').notNull().default(false),
    /** `#RRGGBB` by colour name; kept while another palette is chosen. */
    ownShades: jsonb('own_shades').$type<Readonly<Record<string, string>>>(),
  },
  (t) => [
    check('account_has_a_name', sql`${t.email} is not null or ${t.signInName} is not null`),
    check('account_own_shades', sql`${t.palette} <> 'own' or ${t.ownShades} is not null`),
  ],
);

/** One row per refresh token ever issued; a family is one signed-in device. Only a hash is kept. */
export const refreshToken = pgTable(
  'refresh_token',
  {
    tokenId: uuid('token_id').primaryKey(),
    familyId: uuid('family_id').notNull(),
    accountId: uuid('account_id')
      .notNull()
      .references(() => account.accountId, { onDelete: 'cascade' }),
    /** The club the device is working in; null for administrators. */
    clubId: uuid('club_id'),
    tokenHash: bytes('token_hash').notNull().unique(),
    issuedAt: instant('issued_at').notNull(),
    expiresAt: instant('expires_at').notNull(),
    familyStartedAt: instant('family_started_at').notNull(),
    usedAt: instant('used_at'),
    revokedAt: instant('revoked_at'),
  },
  (t) => [index('refresh_token_family').on(t.familyId), index('refresh_token_account').on(t.accountId)],
);
