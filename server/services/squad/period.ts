/** Days that "lately" and "change" mean on the desk. */
export const PERIOD_DAYS = 28;
/** A figure from up to this many days before the period still tells what was at its start. */
const GRACE_DAYS = 7;

export interface Period {
  /** First day of the period. */
  readonly fromDay: number;
  /** Where to look for the figure the period began with: the day before its first, or a little earlier. */
  readonly start: { readonly fromDay: number; readonly toDay: number };
  /** All days up to now; members east of the captain may be a day ahead. */
  readonly all: { readonly fromDay: number; readonly toDay: number };
}

/** The period of 28 training days that ends today. */
export function periodAt(today: number): Period {
  const fromDay = today - PERIOD_DAYS + 1;
  return {
    fromDay,
    start: { fromDay: fromDay - 1 - GRACE_DAYS, toDay: fromDay - 1 },
    all: { fromDay: 0, toDay: today + 1 },
  };
}
