import type { tables } from '#database/client.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import { type CaseMemory, recall } from '#shared/memory/index.ts';
import { type Calibration, dealtSums } from '#shared/standing/index.ts';
import type { EditionContent } from '../catalogue/read-edition.ts';
import { groupBy } from '../group-by.ts';
import { type LoggedAnswer, spentMs } from '../training/day-counts.ts';

export type RollupRow = typeof tables.rollup.$inferInsert;

export interface RollupDay {
  readonly clubId: string;
  readonly memberId: string;
  readonly day: number;
  readonly set: CaseSet;
  readonly content: EditionContent;
  readonly memory: ReadonlyMap<string, CaseMemory>;
  readonly calibration: Calibration;
  /** The day's answers that came through this set: what came through a subset stands in the subset's row. */
  readonly answers: readonly LoggedAnswer[];
  readonly misTaps: ReadonlySet<string>;
}

/**
 * The rows of one member, day and set: one per group of the edition. The recall of a day is reckoned at the
 * coming rollover, so that a case answered a minute ago does not count as certain.
 */
export function rollupRows({
  clubId,
  memberId,
  day,
  set,
  content,
  memory,
  calibration,
  answers,
  misTaps,
}: RollupDay): RollupRow[] {
  const groups = groupBy(content.cases.values(), (c) => c.group);
  const answersByCase = groupBy(answers, (answer) => answer.caseKey);
  return [...groups].map(([group, cases]) => {
    const figures = dealtSums(
      cases.flatMap(({ key }) => {
        const c = set.byKey(key);
        const m = memory.get(key);
        return c ? [{ prior: c.weight, recall: m ? recall(m, day + 1) : null }] : [];
      }),
      calibration,
    );
    const given = cases.flatMap(({ key }) => answersByCase.get(key) ?? []);
    const count = (outcome: LoggedAnswer['outcome']) =>
      given.filter((a) => a.outcome === outcome && (a.scored || outcome === 'left')).length;
    return {
      clubId,
      memberId,
      day,
      setKey: content.setKey,
      group,
      editionNumber: content.number,
      sumP: figures.sumP,
      sumPe: figures.sumPe,
      sumPee: figures.sumPee,
      shift: calibration.b,
      information: calibration.information,
      answers: given.filter((a) => a.scored).length,
      held: count('held'),
      late: count('late'),
      missed: count('missed'),
      left: count('left'),
      misTaps: given.filter((a) => misTaps.has(a.reviewId)).length,
      spentMs: given.reduce((sum, a) => sum + spentMs(a), 0),
    };
  });
}
