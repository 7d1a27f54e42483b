import type { ShowingCosts } from './gain.ts';
import type { QueueCard } from './types.ts';

/** Most new cases on one day, however many minutes there are. */
export const NEW_PER_DAY = 10;

/**
 * New cases allowed on a day: at most ten and at most a quarter of the minutes' worth, but one at least, so
 * that a minute a day still gets somewhere.
 */
export function newCaseCap(seconds: number, costs: ShowingCosts): number {
  return Math.max(1, Math.min(NEW_PER_DAY, Math.floor(seconds / 4 / costs.fresh)));
}

/**
 * The day's new cases, as units met together: a chosen group first, then in the programme's order, largest
 * prior first, mirror partners together. A pair that no longer fits under the cap waits for tomorrow and a
 * single takes its place; only a cap of one parts a pair.
 */
export function chooseNew(
  cards: readonly QueueCard[],
  cap: number,
  firstGroup?: string,
): readonly (readonly QueueCard[])[] {
  const unmet = cards.filter((card) => card.memory === null);
  unmet.sort(
    (a, b) =>
      Number(b.group === firstGroup && firstGroup !== undefined) -
        Number(a.group === firstGroup && firstGroup !== undefined) ||
      (a.order ?? 0) - (b.order ?? 0) ||
      b.prior - a.prior ||
      (a.key < b.key ? -1 : 1),
  );
  const waiting = new Map(unmet.map((card) => [card.key, card]));
  const units: QueueCard[][] = [];
  let left = cap;
  for (const card of unmet) {
    if (left === 0) break;
    if (!waiting.has(card.key)) continue;
    const partner =
      card.partner !== undefined && card.partner !== card.key ? waiting.get(card.partner) : undefined;
    const together = partner && cap > 1 ? [card, partner] : [card];
    if (together.length > left) continue;
    for (const { key } of together) waiting.delete(key);
    units.push(together);
    left -= together.length;
  }
  return units;
}
