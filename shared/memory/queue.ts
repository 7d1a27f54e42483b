import { DEFAULT_WEIGHTS, type MemoryModel, memoryModel, round8, type Weights } from './fsrs.ts';
import { expectedSeconds, gainOfNew, gainOfShowing, type ShowingCosts } from './gain.ts';
import { chooseNew } from './new-cases.ts';
import { quickSteps } from './quick-steps.ts';
import type { QueueCard } from './types.ts';
import { mixedPrior, wantedOfMixed } from './wanted.ts';

export interface QueueRequest {
  readonly cards: readonly QueueCard[];
  readonly day: number;
  readonly beta: number;
  /** Seconds the member gives today. */
  readonly seconds: number;
  /** New cases still allowed today (see `newCaseCap`); 0 under a freeze. */
  readonly newCap: number;
  readonly costs: ShowingCosts;
  /** A group to train before everything else. */
  readonly firstGroup?: string;
  readonly weights?: Weights;
}

export interface QueueItem {
  readonly key: string;
  readonly kind: 'due' | 'new';
  /** Seconds it is expected to take. */
  readonly seconds: number;
}

interface Unit {
  readonly items: readonly QueueItem[];
  readonly gain: number;
  readonly ahead: boolean;
}

/**
 * Today's queue: the cases whose recall is at or below what is wanted, and the day's new ones, in order of
 * gain per second until the seconds are used. What does not fit is passed over for what does; the first of
 * all is taken even if it alone is longer than the time given.
 *
 * @throws RangeError for malformed input.
 */
export function planQueue(request: QueueRequest): QueueItem[] {
  check(request);
  if (request.seconds === 0) return [];
  const model = memoryModel(request.weights ?? DEFAULT_WEIGHTS);
  const units = [...dueUnits(request, model), ...newUnits(request, model)].sort(byGain);
  return fill(units, request.seconds);
}

function dueUnits({ cards, day, beta, costs, firstGroup }: QueueRequest, model: MemoryModel): Unit[] {
  const quick = quickSteps(model);
  const units: Unit[] = [];
  for (const card of cards) {
    const memory = card.memory;
    if (!memory) continue;
    const elapsed = day - memory.lastDay;
    if (elapsed <= 0) continue;
    const prior = mixedPrior(card.prior, cards.length);
    // Rounded as `recall` is, so that the queue and the due day shown elsewhere agree.
    const chance = round8(quick.recall(elapsed, memory.stability));
    if (chance > wantedOfMixed(prior, cards.length, beta)) continue;
    units.push({
      items: [{ key: card.key, kind: 'due', seconds: expectedSeconds(chance, costs) }],
      gain: gainOfShowing(model, prior, memory, elapsed, costs),
      ahead: isAhead(card, firstGroup),
    });
  }
  return units;
}

function newUnits({ cards, newCap, costs, firstGroup }: QueueRequest, model: MemoryModel): Unit[] {
  if (newCap === 0) return [];
  const perPrior = gainOfNew(model, costs);
  return chooseNew(cards, newCap, firstGroup).map((together) => ({
    items: together.map((card) => ({ key: card.key, kind: 'new', seconds: costs.fresh })),
    gain:
      (perPrior * together.reduce((sum, card) => sum + mixedPrior(card.prior, cards.length), 0)) /
      together.length,
    ahead: together.some((card) => isAhead(card, firstGroup)),
  }));
}

function isAhead(card: QueueCard, firstGroup: string | undefined): boolean {
  return firstGroup !== undefined && card.group === firstGroup;
}

function byGain(a: Unit, b: Unit): number {
  if (a.ahead !== b.ahead) return a.ahead ? -1 : 1;
  return b.gain - a.gain || (a.items[0]!.key < b.items[0]!.key ? -1 : 1);
}

function fill(units: readonly Unit[], seconds: number): QueueItem[] {
  const queue: QueueItem[] = [];
  let left = seconds;
  for (const unit of units) {
    const cost = unit.items.reduce((sum, item) => sum + item.seconds, 0);
    if (cost > left && queue.length > 0) continue;
    queue.push(...unit.items);
    left -= cost;
  }
  return queue;
}

function check({ cards, day, beta, seconds, newCap, costs }: QueueRequest): void {
  if (!Number.isInteger(day)) throw new RangeError('The day of a queue is a whole number.');
  if (!(beta >= 0 && beta < Number.POSITIVE_INFINITY)) throw new RangeError('β is a number from 0.');
  if (!(seconds >= 0)) throw new RangeError('The seconds of a queue are a number from 0.');
  if (!Number.isInteger(newCap) || newCap < 0)
    throw new RangeError('The cap of new cases is a whole number from 0.');
  if (!(costs.held > 0 && costs.missed > 0 && costs.retest >= 0 && costs.fresh > 0)) {
    throw new RangeError('Every showing takes some time: costs must be positive.');
  }
  const keys = new Set<string>();
  for (const card of cards) {
    if (!(card.prior >= 0 && card.prior <= 1))
      throw new RangeError(`Case ${card.key}: the prior must be within 0..1.`);
    keys.add(card.key);
  }
  if (keys.size !== cards.length) throw new RangeError('A case stands in the queue request twice.');
}
