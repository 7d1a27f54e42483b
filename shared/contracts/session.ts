import { z } from 'zod';
import { uuid } from './common.ts';
import { pictureSettings } from './pictures.ts';

export const signInInput = z.strictObject({
  signIn: z.string().trim().min(1, 'Type your e-mail address or sign-in name.').max(254),
  password: z.string().min(1, 'Type your password.').max(1024),
});
export type SignInInput = z.infer<typeof signInInput>;

const clubOfMine = z.strictObject({
  clubId: uuid,
  name: z.string(),
  role: z.enum(['member', 'captain']),
  nickname: z.string(),
});

/** Who is signed in, where, and what they may switch to. */
export const sessionView = z.strictObject({
  role: z.enum(['member', 'captain', 'administrator']),
  nickname: z.string().nullable(),
  club: z.strictObject({ clubId: uuid, name: z.string() }).nullable(),
  clubs: z.array(clubOfMine),
  isAdministrator: z.boolean(),
  /** How this person wants pictures drawn. */
  pictures: pictureSettings,
});
export type SessionView = z.infer<typeof sessionView>;

/** Where to go after signing in. */
export const signedIn = z.strictObject({ next: z.string(), session: sessionView });
export type SignedIn = z.infer<typeof signedIn>;

/** null: to the administrator's places. */
export const switchClubInput = z.strictObject({ clubId: uuid.nullable() });
export type SwitchClubInput = z.infer<typeof switchClubInput>;

export const demoAccount = z.strictObject({ signIn: z.string(), password: z.string(), who: z.string() });
export type DemoAccount = z.infer<typeof demoAccount>;

export const signInPage = z.strictObject({ demoAccounts: z.array(demoAccount) });
export type SignInPage = z.infer<typeof signInPage>;
