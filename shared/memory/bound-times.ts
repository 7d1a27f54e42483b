/** Difference allowed between the device's stopwatch and the server's clock before times are refused. */
export const CLOCK_SLACK_MS = 1000;

export interface ClaimedTimes {
  /** Server's clock. */
  readonly issuedAt: number;
  /** Server's clock. */
  readonly receivedAt: number;
  /** Device's clock, corrected by the server's offset: a hint. */
  readonly claimedAnsweredAt: number;
  readonly recognitionMs: number | null;
  readonly namingMs: number | null;
}

export type BoundTimes =
  | {
      readonly ok: true;
      readonly answeredAt: number;
      readonly recognitionMs: number | null;
      readonly namingMs: number | null;
      /** The claimed moment was outside what the server saw and has been moved. */
      readonly moved: boolean;
    }
  | { readonly ok: false; readonly reason: 'not a time' | 'longer than the showing was out' };

/**
 * Holds an answer's times against the server's clock. The moment of answering is moved to between the
 * issue (plus the time the answer itself claims to have taken) and the receipt. A stopwatch that shows less
 * than nothing, or more than the time the showing was out, is refused: nothing true can be made of it.
 */
export function boundTimes(times: ClaimedTimes): BoundTimes {
  const { issuedAt, receivedAt, claimedAnsweredAt, recognitionMs, namingMs } = times;
  const numbers = [issuedAt, receivedAt, claimedAnsweredAt, recognitionMs ?? 0, namingMs ?? 0];
  if (!numbers.every(Number.isFinite) || (recognitionMs ?? 0) < 0 || (namingMs ?? 0) < 0) {
    return { ok: false, reason: 'not a time' };
  }
  const taken = (recognitionMs ?? 0) + (namingMs ?? 0);
  const out = receivedAt - issuedAt;
  if (out < -CLOCK_SLACK_MS || taken > Math.max(0, out) + CLOCK_SLACK_MS) {
    return { ok: false, reason: 'longer than the showing was out' };
  }
  const earliest = Math.min(issuedAt + taken, receivedAt);
  const answeredAt = Math.round(Math.min(Math.max(claimedAnsweredAt, earliest), receivedAt));
  return {
    ok: true,
    answeredAt,
    recognitionMs,
    namingMs,
    moved: answeredAt !== Math.round(claimedAnsweredAt),
  };
}
