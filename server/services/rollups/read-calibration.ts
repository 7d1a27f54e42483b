import { and, asc, between, eq, isNotNull } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import { CALIBRATION_DAYS, type Calibration, logitCalibration } from '#shared/standing/index.ts';
import type { ClubActor } from '../context.ts';

/** memory.md, decision 6: the first scored showings of the 30 days before. */
const DAYS = CALIBRATION_DAYS;

export interface CalibrationSpan {
  readonly set: CaseSet;
  readonly fromDay: number;
  readonly toDay: number;
}

/**
 * The calibration in force on each day of the span: from the first answers of the 30 days *before* it, so that
 * a day's own answers never move the yardstick they are measured with. First answers count by their case, whichever
 * set of the case's family they came through: a member who moves from a subset to the whole keeps their calibration.
 */
export async function readCalibrations(
  tx: Transaction,
  actor: Pick<ClubActor, 'clubId' | 'memberId'>,
  { set, fromDay, toDay }: CalibrationSpan,
): Promise<(day: number) => Calibration> {
  const { firstAnswer } = tables;
  const all = await tx
    .select({
      caseKey: firstAnswer.caseKey,
      day: firstAnswer.localDay,
      recall: firstAnswer.recallBefore,
      keys: firstAnswer.keysOffered,
      held: firstAnswer.held,
    })
    .from(firstAnswer)
    .where(
      and(
        eq(firstAnswer.clubId, actor.clubId),
        eq(firstAnswer.memberId, actor.memberId),
        eq(firstAnswer.onBoards, true),
        isNotNull(firstAnswer.recallBefore),
        between(firstAnswer.localDay, fromDay - DAYS, toDay - 1),
      ),
    )
    // The sums of the fit depend on the order of their terms in the last bits: keep it the same for ever.
    .orderBy(asc(firstAnswer.localDay), asc(firstAnswer.caseKey));
  const rows = all.filter((row) => set.byKey(row.caseKey));
  return (day) =>
    logitCalibration(
      rows.flatMap((row) =>
        row.recall !== null && row.day >= day - DAYS && row.day < day
          ? [{ recall: row.recall, keys: row.keys, held: row.held }]
          : [],
      ),
    );
}
