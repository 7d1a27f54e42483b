import { z } from 'zod';
import { figure, outcome, picture, uuid } from './common.ts';
import { dayFigure, myCase, sharedBoardView, standingsBoard } from './member.ts';

/** Without a set: members × sets. With one: members × that set's groups, and all of it in the last column. */
export const squadInput = z.strictObject({ setKey: z.string().optional() });

const squadCell = z.strictObject({
  /** null: does not answer for the set. */
  figure: figure.nullable(),
  /** Change of the figure over the last 28 days, in points; null when there was none 28 days ago. */
  change: z.number().nullable(),
});
const squadRow = z.strictObject({
  memberId: uuid,
  nickname: z.string(),
  role: z.enum(['member', 'captain']),
  /** One for each column, in their order. */
  cells: z.array(squadCell),
  /** Scored answers of the last 28 days, of what the columns show. */
  answers: z.int(),
  /** Local date, ISO; null: never. */
  lastTrained: z.string().nullable(),
  /** Mean over the last 28 days, or since joining if that is shorter. */
  minutesPerDay: z.number(),
});
export type SquadRow = z.infer<typeof squadRow>;

const lostCase = z.strictObject({
  setKey: z.string(),
  setName: z.string(),
  key: z.string(),
  /** What the club calls the case, and the trade's name where that is another. */
  name: z.string(),
  tradeName: z.string().nullable(),
  picture,
  /** Share of the solves that reach the set which the squad loses to this case. */
  share: z.number(),
  /** What it is lost by most, in words. */
  mostly: z.string(),
});
export const squadView = z.strictObject({
  /** The captain's local date, ISO. */
  date: z.string(),
  /** The programme: what can be chosen. */
  sets: z.array(z.strictObject({ setKey: z.string(), name: z.string(), edition: z.int(), limitMs: z.int() })),
  /** The set whose groups are the columns; null: the columns are the sets. */
  setKey: z.string().nullable(),
  columns: z.array(
    z.strictObject({
      /** A set's key, a group's name, or '' for all of the chosen set. */
      key: z.string(),
      name: z.string(),
      /** Share of the solves that reach the set which deal one of these cases; null for whole sets. */
      dealt: z.number().nullable(),
    }),
  ),
  rows: z.array(squadRow),
  lost: z.array(lostCase),
  board: standingsBoard.nullable(),
});
export type SquadView = z.infer<typeof squadView>;

/** Any text: what is no member's id is not found, like a member who is not there. */
export const memberPageInput = z.strictObject({ memberId: z.string() });
export const memberPageView = z.strictObject({
  /** The member's local date, ISO. */
  date: z.string(),
  /** The captain's time zone: instants are shown in it. */
  timeZone: z.string(),
  memberId: uuid,
  nickname: z.string(),
  role: z.enum(['member', 'captain']),
  lastTrained: z.string().nullable(),
  sets: z.array(
    z.strictObject({
      setKey: z.string(),
      name: z.string(),
      edition: z.int(),
      now: figure,
      days: z.array(dayFigure),
    }),
  ),
  cases: z.array(myCase),
  lately: z.array(
    z.strictObject({
      id: uuid,
      at: z.number(),
      setName: z.string(),
      name: z.string(),
      named: z.string(),
      outcome,
      recognitionMs: z.int().nullable(),
      lostBy: z.string().nullable(),
    }),
  ),
  rates: z.strictObject({
    answers: z.int(),
    held: z.int(),
    late: z.int(),
    missed: z.int(),
    left: z.int(),
    misTaps: z.int(),
  }),
});
export type MemberPageView = z.infer<typeof memberPageView>;

export const standingsInput = z.strictObject({ setKey: z.string().optional() });
export const standingsView = z.strictObject({
  sets: z.array(z.strictObject({ setKey: z.string(), name: z.string() })),
  board: standingsBoard.nullable(),
  /** Members not on the board because they have not opted in: a count, for the captain. */
  notOptedIn: z.int(),
  sharedBoards: z.array(sharedBoardView),
});
export type StandingsView = z.infer<typeof standingsView>;

const programmeRow = z.strictObject({
  setKey: z.string(),
  name: z.string(),
  /** null: follows the newest. */
  pinnedEdition: z.int().nullable(),
  newestEdition: z.int().nullable(),
  limitMs: z.int(),
  asksAuf: z.boolean(),
  forEveryone: z.boolean(),
  memberIds: z.array(uuid),
  version: z.int(),
});
export const programmeView = z.strictObject({
  rows: z.array(programmeRow),
  /** Sets that have an edition and are not in the programme. */
  available: z.array(
    z.strictObject({ setKey: z.string(), name: z.string(), editions: z.array(z.int()), cases: z.int() }),
  ),
  editions: z.record(z.string(), z.array(z.int())),
  members: z.array(z.strictObject({ memberId: uuid, nickname: z.string() })),
});
export type ProgrammeView = z.infer<typeof programmeView>;

/** Assigns a set, or changes how it is trained. `version` 0 for a set that is not in the programme yet. */
export const assignSetInput = z.strictObject({
  setKey: z.string().min(1).max(60),
  pinnedEdition: z.int().min(1).nullable(),
  limitMs: z.int().min(500, 'At least half a second.').max(60_000, 'At most 60 seconds.'),
  asksAuf: z.boolean(),
  forEveryone: z.boolean(),
  memberIds: z.array(uuid).max(500),
  version: z.int().min(0),
});
export type AssignSetInput = z.infer<typeof assignSetInput>;

export const withdrawSetInput = z.strictObject({ setKey: z.string().max(60), version: z.int().min(1) });
export type WithdrawSetInput = z.infer<typeof withdrawSetInput>;
