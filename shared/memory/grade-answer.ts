import type { Outcome } from './types.ts';

/** Naming is not raced, but slower than this it is working the case out: the answer is not scored. */
export const NAMING_LIMIT_MS = 5000;
/** How long after an answer it can still be called a mis-tap. */
export const MIS_TAP_WINDOW_MS = 10_000;
/** Recognition limits a captain starts from: sets of up to 60 cases (OLL, PLL and smaller), and larger ones. */
export const DEFAULT_LIMIT_MS = 3000;
export const DEFAULT_LIMIT_LARGE_MS = 6000;

/** The recognition limit a set of so many cases, skip left out, has until a captain changes it. */
export function defaultLimitMs(cases: number): number {
  return cases <= 60 ? DEFAULT_LIMIT_MS : DEFAULT_LIMIT_LARGE_MS;
}

/**
 * What the member did. `named` is a case key, or: `solved` (nothing to do), `unrecognised` (said so instead
 * of stopping the clock), `lost` (stopped the clock and then had no name), `left` (went away).
 */
export interface RawChoice {
  readonly named: string;
  /** Quarter turns of the top before the algorithm, 0..3; null where not asked or not reached. */
  readonly aufBefore: number | null;
  /** From the picture to the moment of recognition. */
  readonly recognitionMs: number | null;
  /** From there to the last key. */
  readonly namingMs: number | null;
}

/** What the showing was, as the server issued it. */
export interface Expectation {
  readonly caseKey: string;
  /** The picture was of the solved class. */
  readonly skip?: boolean;
  /** Every right answer to "AUF before" for the state shown; needed where it is asked. */
  readonly rightAufs: readonly number[];
  readonly asksAuf: boolean;
  readonly limitMs: number;
  readonly namingLimitMs: number;
  /** The member has lengthened the limits: such answers train but stay off boards. */
  readonly lengthened: boolean;
}

export type UnscoredReason = 'left' | 'slow naming';

export interface Grading {
  readonly outcome: Outcome;
  readonly caseRight: boolean;
  /** null where the AUF was not asked, or the case was wrong. */
  readonly aufRight: boolean | null;
  readonly scored: boolean;
  readonly unscoredReason: UnscoredReason | null;
  readonly onBoards: boolean;
}

/**
 * Judges one answer. Held: case right, AUF right where asked, recognised within the limit (the limit itself
 * is still in time). Late: right but slower. Missed: anything wrong, or not recognised. Left: abandoned.
 *
 * @throws RangeError for an answer that cannot be judged: a right name without its recognition time, a time
 * below nothing, an AUF outside 0..3, or a showing that asks an AUF without saying which are right.
 */
export function gradeAnswer(choice: RawChoice, expected: Expectation): Grading {
  check(choice, expected);
  if (choice.named === 'left') {
    return { outcome: 'left', caseRight: false, aufRight: null, ...unscored('left') };
  }
  const caseRight = isRightCase(choice.named, expected);
  const asked = expected.asksAuf && !expected.skip;
  const aufRight = caseRight && asked ? isRightAuf(choice.aufBefore, expected.rightAufs) : null;
  const outcome = outcomeOf(caseRight && aufRight !== false, choice.recognitionMs, expected.limitMs);
  const slow = choice.namingMs !== null && choice.namingMs > expected.namingLimitMs;
  const standing = slow ? unscored('slow naming') : scored(expected.lengthened);
  return { outcome, caseRight, aufRight, ...standing };
}

function isRightCase(named: string, expected: Expectation): boolean {
  return expected.skip ? named === 'solved' || named === expected.caseKey : named === expected.caseKey;
}

/** An AUF that was asked and not given is not right. */
function isRightAuf(given: number | null, right: readonly number[]): boolean {
  return given !== null && right.includes(given);
}

function outcomeOf(right: boolean, recognitionMs: number | null, limitMs: number): Outcome {
  if (!right) return 'missed';
  if (recognitionMs === null) throw new RangeError('A right name needs its recognition time.');
  return recognitionMs <= limitMs ? 'held' : 'late';
}

function unscored(unscoredReason: UnscoredReason) {
  return { scored: false, unscoredReason, onBoards: false };
}

function scored(lengthened: boolean) {
  return { scored: true, unscoredReason: null, onBoards: !lengthened };
}

function check({ aufBefore, recognitionMs, namingMs }: RawChoice, expected: Expectation): void {
  if (aufBefore !== null && ![0, 1, 2, 3].includes(aufBefore)) {
    throw new RangeError('AUF before is 0, 1, 2 or 3 quarter turns.');
  }
  for (const time of [recognitionMs, namingMs]) {
    if (time !== null && !(time >= 0)) throw new RangeError('A time cannot be below nothing.');
  }
  if (!(expected.limitMs > 0)) throw new RangeError('The recognition limit must be above nothing.');
  if (expected.asksAuf && !expected.skip && expected.rightAufs.length === 0) {
    throw new RangeError('A showing that asks the AUF must know at least one right one.');
  }
}
