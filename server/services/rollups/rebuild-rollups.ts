import { and, asc, between, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { type CaseMemory, foldCase } from '#shared/memory/index.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { readEditionContent } from '../catalogue/read-edition.ts';
import type { ClubActor } from '../context.ts';
import { groupBy } from '../group-by.ts';
import { logOfCases } from '../training/day-counts.ts';
import { logRow } from '../training/fold-cases.ts';
import { readCalibrations } from './read-calibration.ts';
import { type RollupRow, rollupRows } from './rollup-rows.ts';

/**
 * Makes a member's rows of one set again from the log, for the days that stand: each with the memory its
 * answers up to that day give, under the edition that was in force. First answers must have been folded.
 */
export async function rebuildRollups(
  tx: Transaction,
  actor: Pick<ClubActor, 'clubId' | 'memberId'>,
  setKey: string,
  span: { fromDay: number; toDay: number },
): Promise<RollupRow[]> {
  const { rollup } = tables;
  const inSpan = and(
    eq(rollup.clubId, actor.clubId),
    eq(rollup.memberId, actor.memberId),
    eq(rollup.setKey, setKey),
    between(rollup.day, span.fromDay, span.toDay),
  );
  const days = await tx
    .selectDistinct({ day: rollup.day, edition: rollup.editionNumber })
    .from(rollup)
    .where(inSpan)
    .orderBy(asc(rollup.day));
  const set = await loadCaseSet(tx, setKey);
  const { rows: log, misTaps } = await logOfCases(
    tx,
    actor,
    set.cases.map((c) => c.key),
  );
  const byCase = groupBy(log, (row) => row.caseKey);
  const calibration = await readCalibrations(tx, actor, { set, ...span });
  const rows: RollupRow[] = [];
  for (const { day, edition } of days) {
    const memory = new Map<string, CaseMemory>();
    for (const [key, caseLog] of byCase) {
      const upToDay = caseLog.filter((row) => row.localDay <= day);
      const folded = foldCase(upToDay.map((row) => logRow(row, misTaps))).memory;
      if (folded) memory.set(key, folded);
    }
    rows.push(
      ...rollupRows({
        clubId: actor.clubId,
        memberId: actor.memberId,
        day,
        set,
        content: await readEditionContent(tx, setKey, edition),
        memory,
        calibration: calibration(day),
        answers: log.filter((row) => row.localDay === day && row.setKey === setKey),
        misTaps,
      }),
    );
  }
  await tx.delete(rollup).where(inSpan);
  if (rows.length > 0) await tx.insert(rollup).values(rows);
  return rows;
}
