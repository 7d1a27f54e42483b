import type { Transaction } from '#database/client.ts';
import type { Figure } from '#shared/contracts/common.ts';
import { recall } from '#shared/memory/index.ts';
import { dealtRecall } from '#shared/standing/index.ts';
import { groupBy } from '../group-by.ts';
import { readCalibrations } from '../rollups/read-calibration.ts';
import { answeredBefore } from '../standing/answered-before.ts';
import { dayFigures, presentFigure } from '../standing/read-figures.ts';
import { cardsOf } from '../training/cards.ts';
import type { MemberDay } from '../training/member-day.ts';

/** Days whose answers say whether a figure rests on few. */
const ANSWER_DAYS = 30;

/**
 * Dealt recall of each set as it is at this moment, from memory as it stands; the rollups of finished days give
 * the number of answers it rests on.
 */
export async function figuresNow(tx: Transaction, day: MemberDay): Promise<(setKey: string) => Figure> {
  const { clubId, memberId } = day.actor;
  const rows = await dayFigures(tx, {
    clubId,
    memberId,
    fromDay: day.day - ANSWER_DAYS + 1,
    toDay: day.day,
  });
  const rowsOf = groupBy(rows, (row) => row.setKey);
  const before = await answeredBefore(
    tx,
    clubId,
    day.sets.map(({ entry }) => ({ memberId, setKey: entry.setKey, group: null })),
  );
  const cardsOfSet = groupBy(cardsOf(day), (card) => card.trained.entry.setKey);
  const figures = new Map<string, Figure>();
  for (const { entry, set } of day.sets) {
    const cards = cardsOfSet.get(entry.setKey) ?? [];
    const answers = (rowsOf.get(entry.setKey) ?? []).reduce((sum, row) => sum + row.answers, 0);
    if (cards.length === 0) continue;
    const calibrations = await readCalibrations(tx, day.actor, {
      set,
      fromDay: day.day,
      toDay: day.day,
    });
    const estimate = dealtRecall(
      cards.map((card) => ({
        prior: card.case.weight,
        recall: card.memory ? recall(card.memory, day.day + 1) : null,
      })),
      calibrations(day.day),
    );
    figures.set(
      entry.setKey,
      presentFigure(estimate, answers, before({ memberId, setKey: entry.setKey, group: null })),
    );
  }
  return (setKey) => figures.get(setKey) ?? NOTHING;
}

/** A set without cases: nothing can be dealt. */
const NOTHING: Figure = { value: 0, low: 0, high: 0, answers: 0, few: true, rests: 'nothing' };
