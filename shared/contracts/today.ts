import { z } from 'zod';
import { caseStateName, holding, outcome, picture, uuid } from './common.ts';

/** A showing as it goes to the member: a picture, a clock limit, and which grid of names belongs to it. */
export const showing = z.strictObject({
  id: uuid,
  setKey: z.string(),
  /** Key into the set's grids: 'all', or a fixed cluster. */
  grid: z.string(),
  picture,
  limitMs: z.int(),
  asksAuf: z.boolean(),
  issuedAt: z.number(),
});
export type Showing = z.infer<typeof showing>;

export const answerKey = z.strictObject({
  key: z.string(),
  /** What the club calls the case. */
  label: z.string(),
  /** The trade's name, where the club has another. */
  tradeName: z.string().nullable(),
  /** Shown beside the AUF question once the key is chosen. */
  algorithm: z.string(),
});
export type AnswerKey = z.infer<typeof answerKey>;

export const todaySet = z.strictObject({
  setKey: z.string(),
  name: z.string(),
  edition: z.int(),
  grids: z.record(z.string(), z.array(answerKey)),
});

export const sittingSummary = z.strictObject({
  answered: z.int(),
  held: z.int(),
  late: z.int(),
  missed: z.int(),
  left: z.int(),
  newCases: z.int(),
  minutes: z.number(),
  medianRecognitionMs: z.int().nullable(),
  /** Dealt recall at the day's start and now, by set. */
  moved: z.array(
    z.strictObject({ setKey: z.string(), name: z.string(), before: z.number(), now: z.number() }),
  ),
  lostCases: z.array(
    z.strictObject({
      setKey: z.string(),
      setName: z.string(),
      key: z.string(),
      name: z.string(),
      group: z.string(),
      picture,
    }),
  ),
  tomorrow: z.strictObject({ due: z.int(), fresh: z.int(), minutes: z.number() }),
});
export type SittingSummary = z.infer<typeof sittingSummary>;

/** The queue of a membership's local day as it stands. */
export const todayView = z.strictObject({
  /** Local date, ISO. */
  date: z.string(),
  localDay: z.int(),
  /** Milliseconds since 1970 on the server's clock when this was made. */
  serverNow: z.number(),
  planned: z.int(),
  answered: z.int(),
  secondsLeft: z.int(),
  holding,
  sets: z.array(todaySet),
  /** Issued and not yet answered, in order. */
  showings: z.array(showing),
  /** Why the queue is empty, when it is. */
  empty: z.enum(['done', 'no-programme', 'no-edition', 'nothing-due']).nullable(),
  summary: sittingSummary.nullable(),
});
export type TodayView = z.infer<typeof todayView>;

/** The raw choice: a case key of the grid, or one of the four words. */
export const answerInput = z.strictObject({
  /** UUIDv7 made by the client: the answer's id for ever. */
  id: uuid,
  showingId: uuid,
  named: z.string().min(1).max(120),
  aufBefore: z.int().min(0).max(3).nullable(),
  recognitionMs: z.int().min(0).max(3_600_000).nullable(),
  namingMs: z.int().min(0).max(3_600_000).nullable(),
  /** Client's clock, corrected by the server's offset; milliseconds since 1970. */
  answeredAt: z.number(),
});
export type AnswerInput = z.infer<typeof answerInput>;

export const answersInput = z.strictObject({ answers: z.array(answerInput).min(1).max(200) });
export type AnswersInput = z.infer<typeof answersInput>;

const namedCase = z.strictObject({ key: z.string(), name: z.string(), picture: picture.nullable() });

export const verdict = z.strictObject({
  id: uuid,
  /** `already`: this id was stored before, with the same body. */
  status: z.enum(['stored', 'already']),
  outcome,
  caseRight: z.boolean(),
  aufRight: z.boolean().nullable(),
  scored: z.boolean(),
  unscoredReason: z.string().nullable(),
  recognitionMs: z.int().nullable(),
  limitMs: z.int(),
  was: z.strictObject({
    key: z.string(),
    name: z.string(),
    setName: z.string(),
    picture,
    algorithm: z.string(),
    rightAufs: z.array(z.int()),
  }),
  /** What was named instead, with the view of it nearest to what was shown; null for a right name. */
  named: namedCase.nullable(),
  differsAt: z.string().nullable(),
  lostBy: z.string().nullable(),
  /** When the case is back: later in this sitting too, and the local date it is next due. */
  back: z.strictObject({ thisSitting: z.boolean(), date: z.string().nullable() }),
  state: caseStateName,
});
export type Verdict = z.infer<typeof verdict>;

/**
 * Progress after the answers, and showings newly issued (a miss returns; the queue runs ahead). An answer that
 * can never be taken is refused by itself, so that one does not hold up the others; when all are, the whole
 * request is (422).
 */
export const answersResult = z.strictObject({
  verdicts: z.array(verdict),
  refused: z.array(z.strictObject({ id: uuid, detail: z.string() })),
  today: todayView,
});
export type AnswersResult = z.infer<typeof answersResult>;

export const misTapInput = z.strictObject({ reviewId: uuid, at: z.number() });
export type MisTapInput = z.infer<typeof misTapInput>;
