/**
 * The memory model: what a member's log says about each case, what today's minutes are best spent on, how
 * an answer is judged, and which day it is. Pure: time, day numbers, weights and ids are arguments.
 */
export { solveBeta } from './beta.ts';
export { type BoundTimes, boundTimes, CLOCK_SLACK_MS, type ClaimedTimes } from './bound-times.ts';
export { dayOfDate, dayStart, isoDate, localDay } from './calendar.ts';
export { type CaseFold, compareRows, type FoldResult, foldCase, startFold } from './fold.ts';
export { forecastSeconds, type LoadRequest } from './forecast-load.ts';
export { DEFAULT_WEIGHTS, type MemoryModel, memoryModel, type Trace, type Weights } from './fsrs.ts';
export {
  DEFAULT_COSTS,
  gainOfNew,
  gainOfShowing,
  HORIZON_DAYS,
  meanRecall,
  type ShowingCosts,
} from './gain.ts';
export {
  DEFAULT_LIMIT_LARGE_MS,
  DEFAULT_LIMIT_MS,
  defaultLimitMs,
  type Expectation,
  type Grading,
  gradeAnswer,
  MIS_TAP_WINDOW_MS,
  NAMING_LIMIT_MS,
  type RawChoice,
  type UnscoredReason,
} from './grade-answer.ts';
export { chanceOfRight, KNOWN_AT_FIRST, knownGivenRight, traceAfterHeld } from './guess.ts';
export { NEW_PER_DAY, newCaseCap } from './new-cases.ts';
export { planQueue, type QueueItem, type QueueRequest } from './queue.ts';
export type { AnswerKind, CaseMemory, FirstAnswer, LogRow, Outcome, QueueCard } from './types.ts';
export {
  type CaseStateName,
  caseStateName,
  DEFAULT_BETA,
  dueDay,
  mixedPrior,
  recall,
  SETTLING_DAYS,
  WANTED_MAX,
  WANTED_MIN,
  wantedRecall,
} from './wanted.ts';
