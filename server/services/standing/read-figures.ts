import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';
import type { Figure } from '#shared/contracts/common.ts';
import { dealtFromSums, interval } from '#shared/standing/index.ts';

/** A member's figure of a set on one day, from the rollups. */
export interface DayFigure {
  readonly memberId: string;
  readonly setKey: string;
  readonly day: number;
  readonly edition: number;
  /** Dealt recall, 0..1, and its standard error. */
  readonly theta: number;
  readonly se: number;
  readonly answers: number;
  readonly held: number;
  readonly late: number;
  readonly missed: number;
  readonly left: number;
  readonly misTaps: number;
  readonly spentMs: number;
}

interface SumRow extends Record<string, unknown> {
  member_id: string;
  set_key: string;
  day: number;
  edition: number;
  sum_p: number;
  sum_pe: number;
  sum_pee: number;
  information: number;
  answers: number;
  held: number;
  late: number;
  missed: number;
  left_count: number;
  mis_taps: number;
  spent_ms: number;
}

/** Below this many answers a figure is drawn hollow and not ranked. */
export const FEW_ANSWERS = 20;

const SUMS = sql`max(edition_number)::int as edition, sum(sum_p) as sum_p, sum(sum_pe) as sum_pe, sum(sum_pee) as sum_pee,
  min(information) as information, sum(answers)::int as answers, sum(held)::int as held, sum(late)::int as late,
  sum(missed)::int as missed, sum(left_count)::int as left_count, sum(mis_taps)::int as mis_taps, sum(spent_ms)::int as spent_ms`;

function present(row: SumRow): DayFigure {
  const { theta, se } = dealtFromSums(
    [{ sumP: row.sum_p, sumPe: row.sum_pe, sumPee: row.sum_pee }],
    row.information,
  );
  return {
    memberId: row.member_id,
    setKey: row.set_key,
    day: row.day,
    edition: row.edition,
    theta,
    se,
    answers: row.answers,
    held: row.held,
    late: row.late,
    missed: row.missed,
    left: row.left_count,
    misTaps: row.mis_taps,
    spentMs: row.spent_ms,
  };
}

/** The newest completed day of every member × set of a club (or of one member). */
export async function latestFigures(
  tx: Transaction,
  { clubId, memberId }: { clubId: string; memberId?: string },
): Promise<DayFigure[]> {
  const only = memberId ? sql`and member_id = ${memberId}::uuid` : sql``;
  const { rows } = await tx.execute<SumRow>(sql`
    select r.member_id, r.set_key, r.day, ${SUMS}
    from rollup r
    join (select member_id, set_key, max(day) as day from rollup where club_id = ${clubId}::uuid ${only} group by 1, 2) newest
      on newest.member_id = r.member_id and newest.set_key = r.set_key and newest.day = r.day
    where r.club_id = ${clubId}::uuid
    group by r.member_id, r.set_key, r.day`);
  return rows.map(present);
}

/** Every completed day in the span, both ends included, oldest first. */
export async function dayFigures(
  tx: Transaction,
  span: { clubId: string; memberId?: string; fromDay: number; toDay: number; setKey?: string },
): Promise<DayFigure[]> {
  const member = span.memberId ? sql`and member_id = ${span.memberId}::uuid` : sql``;
  const set = span.setKey ? sql`and set_key = ${span.setKey}` : sql``;
  const { rows } = await tx.execute<SumRow>(sql`
    select member_id, set_key, day, ${SUMS} from rollup
    where club_id = ${span.clubId}::uuid and day between ${span.fromDay} and ${span.toDay} ${member} ${set}
    group by member_id, set_key, day order by day`);
  return rows.map(present);
}

/**
 * A figure as pages show it: 90 % interval within 0..1, and what it rests on. A case that was ever answered counts for
 * more than nothing, so 0 means that none was.
 *
 * @param answers scored answers of the period, through the figure's own set
 * @param before whether there were any before the period
 */
export function presentFigure(
  { theta, se }: { theta: number; se: number },
  answers: number,
  before = answers > 0,
): Figure {
  const [low, high] = interval(theta, se);
  const rests = answers > 0 || before ? 'here' : theta > 0 ? 'elsewhere' : 'nothing';
  return { value: theta, low, high, answers, few: answers < FEW_ANSWERS, rests };
}
