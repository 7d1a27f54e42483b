/** What came of a showing (the words of the product: see grade-answer.ts). */
export type Outcome = 'held' | 'late' | 'missed' | 'left';

/** One answered showing of one case, with all that the fold needs. */
export interface LogRow {
  readonly id: string;
  /** Milliseconds since 1970, server time. */
  readonly answeredAt: number;
  /** Number of the member's training day (calendar.ts). */
  readonly localDay: number;
  readonly outcome: Outcome;
  /** False for answers that count for nothing: abandoned, or named too slowly. */
  readonly scored: boolean;
  /** How many names the showing really offered, at least 1. */
  readonly keysOffered: number;
  /** The member said in time that this answer was a slip of the finger. */
  readonly misTapped: boolean;
}

/** A member's memory of one case, as the fold of its log leaves it. */
export interface CaseMemory {
  /** Days after which recall has fallen to .9, .001..36500, 8 decimals. */
  readonly stability: number;
  /** 1 (light) .. 10 (hard), 8 decimals. */
  readonly difficulty: number;
  /** Training day of the first answer that moved the memory. */
  readonly firstDay: number;
  /** Training day of the last answer that moved the memory. */
  readonly lastDay: number;
  /** Scored answers, mis-taps left out. */
  readonly answers: number;
  /** Training days whose first answer was not held, the very first day included. */
  readonly lapses: number;
  /** Id of the last answer that moved the memory. */
  readonly lastId: string;
}

/** A training day's first scored answer, mis-taps included: what calibration and boards count. */
export interface FirstAnswer {
  readonly id: string;
  readonly localDay: number;
  /** Recall the model gave just before it, 0..1; null when nothing was known of the case. */
  readonly recallBefore: number | null;
  readonly held: boolean;
  readonly keysOffered: number;
}

/** What an answer did to the memory. */
export type AnswerKind = 'first' | 'retest' | 'repeat' | 'unscored' | 'mis-tap';

/** A case of the member's programme, the skip left out. */
export interface QueueCard {
  readonly key: string;
  /** Share of the programme's dealt cases, 0..1, normalised over all cards. */
  readonly prior: number;
  readonly memory: CaseMemory | null;
  /** Place of its set in the programme: new cases of a lower place come first. Default 0. */
  readonly order?: number;
  /** Key of its mirror: the two are met on the same day. */
  readonly partner?: string;
  readonly group?: string;
}
