import { DEFAULT_WEIGHTS, type MemoryModel, memoryModel, type Weights } from './fsrs.ts';
import { expectedSeconds, FRESH_HELD, HORIZON_DAYS, type ShowingCosts } from './gain.ts';
import { chooseNew } from './new-cases.ts';
import { quickSteps } from './quick-steps.ts';
import type { QueueCard } from './types.ts';
import { daysUntilDue, mixedPrior, wantedOfMixed } from './wanted.ts';

export interface LoadRequest {
  readonly cards: readonly QueueCard[];
  readonly day: number;
  /** New cases met per day until none is left; 0 under a freeze. */
  readonly newPerDay: number;
  readonly costs: ShowingCosts;
  readonly weights?: Weights;
  /** Days to look ahead; default the gain's horizon. */
  readonly horizon?: number;
}

/** So many cases, expected, in one state. */
interface Cell {
  weight: number;
  stability: number;
  difficulty: number;
  /** Days since the last answer. */
  elapsed: number;
}

/** Bins per doubling of stability, and per unit of difficulty: finer changes the load by less than 1 %. */
const BINS_PER_DOUBLING = 4;
const BINS_PER_DIFFICULTY = 2;

/**
 * Mean seconds a day that β asks for over the horizon, were every due case shown on its day: expectation
 * propagated day by day. Cases with the same wanted recall form one stream; at every showing each branches
 * into held and missed, and branches that end a day in nearly the same state merge, so that the work hardly
 * grows with the number of cases. Falls as β rises, but for the far end, where misses cost what rarer
 * showings save.
 */
export function forecastSeconds(request: LoadRequest, beta: number): number {
  const { cards, costs, horizon = HORIZON_DAYS } = request;
  const model = memoryModel(request.weights ?? DEFAULT_WEIGHTS);
  const starts = newStarts(request);
  const streams = new Map<number, Stream>();
  let total = 0;
  for (const card of cards) {
    const wanted = wantedOfMixed(mixedPrior(card.prior, cards.length), cards.length, beta);
    const stream = streams.get(wanted) ?? new Stream(model, wanted, horizon, costs);
    streams.set(wanted, stream);
    const start = starts.get(card.key) ?? horizon;
    if (card.memory) {
      const { stability, difficulty, lastDay } = card.memory;
      stream.schedule({ weight: 1, stability, difficulty, elapsed: Math.max(0, request.day - lastDay) }, 0);
    } else if (start < horizon) {
      total += costs.fresh;
      stream.meet(start);
    }
  }
  for (const stream of streams.values()) total += stream.run();
  return total / horizon;
}

/** The cases of one wanted recall on their way through the horizon. */
class Stream {
  readonly #due: Cell[][];
  readonly #model: MemoryModel;
  readonly #wanted: number;
  readonly #costs: ShowingCosts;

  constructor(model: MemoryModel, wanted: number, horizon: number, costs: ShowingCosts) {
    this.#model = model;
    this.#wanted = wanted;
    this.#costs = costs;
    this.#due = Array.from({ length: horizon }, () => []);
  }

  /** Puts a case, last answered `cell.elapsed` days before `today`, on the day it is next due. */
  schedule(cell: Cell, today: number): void {
    const elapsed = Math.max(cell.elapsed, daysUntilDue(this.#model, cell.stability, this.#wanted));
    this.#due[today + elapsed - cell.elapsed]?.push({ ...cell, elapsed });
  }

  /** A new case's first showing, with its retest after a miss. */
  meet(day: number): void {
    const pass = this.#model.next(null, 0, true);
    const fail = this.#model.next(this.#model.next(null, 0, false), 0, true);
    this.schedule({ ...pass, weight: FRESH_HELD, elapsed: 0 }, day);
    this.schedule({ ...fail, weight: 1 - FRESH_HELD, elapsed: 0 }, day);
  }

  /** Seconds of all showings within the horizon. */
  run(): number {
    const quick = quickSteps(this.#model);
    let seconds = 0;
    for (const [day, cells] of this.#due.entries()) {
      const after = new Map<number, Cell>();
      for (const { weight, stability, difficulty, elapsed } of cells) {
        const chance = quick.recall(elapsed, stability);
        seconds += weight * expectedSeconds(chance, this.#costs);
        const missed = quick.difficultyAfter(quick.difficultyAfter(difficulty, false), true);
        merge(
          after,
          weight * chance,
          quick.afterHeld(stability, difficulty, chance),
          quick.difficultyAfter(difficulty, true),
        );
        merge(after, weight * (1 - chance), quick.afterMissAndRetest(stability, difficulty, chance), missed);
      }
      for (const cell of after.values()) this.schedule(cell, day);
    }
    return seconds;
  }
}

/** Adds a branch to the bin of its state; the bin keeps the weighted mean of what is in it. */
function merge(bins: Map<number, Cell>, weight: number, stability: number, difficulty: number): void {
  const key =
    Math.round(BINS_PER_DOUBLING * Math.log2(stability)) * 64 + Math.round(BINS_PER_DIFFICULTY * difficulty);
  const bin = bins.get(key);
  if (!bin) {
    bins.set(key, { weight, stability, difficulty, elapsed: 0 });
    return;
  }
  bin.weight += weight;
  const share = weight / bin.weight;
  bin.stability += share * (stability - bin.stability);
  bin.difficulty += share * (difficulty - bin.difficulty);
}

/** Day, from today, on which each unmet case is met. */
function newStarts({ cards, newPerDay }: LoadRequest): Map<string, number> {
  const starts = new Map<string, number>();
  if (newPerDay <= 0) return starts;
  const order = chooseNew(cards, cards.length).flat();
  order.forEach((card, index) => {
    starts.set(card.key, Math.floor(index / newPerDay));
  });
  return starts;
}
