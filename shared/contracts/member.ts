import { z } from 'zod';
import { caseStateName, figure, holding, outcome, picture, prior, uuid } from './common.ts';

export const myCase = z.strictObject({
  setKey: z.string(),
  setName: z.string(),
  key: z.string(),
  /** What the club calls the case. */
  name: z.string(),
  /** The trade's name, where the club has another. */
  tradeName: z.string().nullable(),
  group: z.string(),
  picture,
  algorithm: z.string(),
  prior,
  angles: z.int(),
  state: caseStateName,
  /** Chance that it is held now; null while unmet. */
  recall: z.number().nullable(),
  /** Local date of the next showing, ISO; null while unmet. */
  nextDate: z.string().nullable(),
  answers: z.int(),
  lastOutcome: outcome.nullable(),
});
export type MyCase = z.infer<typeof myCase>;

export const myCasesView = z.strictObject({
  /** The member's local date, ISO: what 'today' and 'tomorrow' are said from. */
  date: z.string(),
  sets: z.array(z.strictObject({ setKey: z.string(), name: z.string(), edition: z.int(), recall: figure })),
  cases: z.array(myCase),
});
export type MyCasesView = z.infer<typeof myCasesView>;

export const myCaseInput = z.strictObject({ key: z.string().max(120) });
export const myCaseView = z.strictObject({
  date: z.string(),
  case: myCase,
  /** One picture per really different angle. */
  angles: z.array(picture),
  algorithms: z.array(z.strictObject({ algorithm: z.string(), note: z.string() })),
  mirror: z.strictObject({ key: z.string(), name: z.string(), picture }).nullable(),
  answers: z.array(
    z.strictObject({
      id: uuid,
      at: z.number(),
      outcome,
      named: z.string(),
      recognitionMs: z.int().nullable(),
      lostBy: z.string().nullable(),
      scored: z.boolean(),
      misTapped: z.boolean(),
    }),
  ),
});
export type MyCaseView = z.infer<typeof myCaseView>;

export const dayFigure = z.strictObject({
  date: z.string(),
  value: z.number(),
  low: z.number(),
  high: z.number(),
  answers: z.int(),
});
export const formView = z.strictObject({
  sets: z.array(
    z.strictObject({
      setKey: z.string(),
      name: z.string(),
      edition: z.int(),
      now: figure,
      days: z.array(dayFigure),
      states: z.strictObject({ unmet: z.int(), settling: z.int(), holding: z.int(), slipping: z.int() }),
    }),
  ),
  outcomes: z.strictObject({
    held: z.int(),
    late: z.int(),
    missed: z.int(),
    left: z.int(),
    misTaps: z.int(),
  }),
  minutesPerDay: z.array(z.strictObject({ date: z.string(), minutes: z.number() })),
});
export type FormView = z.infer<typeof formView>;

export const memberSettings = z.strictObject({
  minutesPerDay: z.int().min(1, 'At least 1 minute.').max(120, 'At most 120 minutes.'),
  onBoards: z.boolean(),
  holding,
  crossColours: z.enum([
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
  ]),
});
export type MemberSettings = z.infer<typeof memberSettings>;

const boardRow = z.strictObject({
  rank: z.int().nullable(),
  nickname: z.string(),
  isMe: z.boolean(),
  /** Days of the period the figure is the mean of. */
  daysCounted: z.int(),
  figure,
});
export const standingsBoard = z.strictObject({
  setKey: z.string(),
  name: z.string(),
  edition: z.int(),
  limitMs: z.int(),
  days: z.int(),
  rows: z.array(boardRow),
  /** Members below the floor of answers: listed, not ranked. */
  unranked: z.array(boardRow),
});
export type StandingsBoard = z.infer<typeof standingsBoard>;

export const sharedBoardView = z.strictObject({
  name: z.string(),
  setName: z.string(),
  rows: z.array(
    z.strictObject({
      club: z.string(),
      isMine: z.boolean(),
      members: z.int(),
      value: z.number(),
      low: z.number(),
      high: z.number(),
    }),
  ),
});

export const clubView = z.strictObject({
  name: z.string(),
  people: z.array(
    z.strictObject({ nickname: z.string(), role: z.enum(['member', 'captain']), isMe: z.boolean() }),
  ),
  boards: z.array(standingsBoard),
  sharedBoards: z.array(sharedBoardView),
  settings: memberSettings,
});
export type ClubView = z.infer<typeof clubView>;
