import { DEFAULT_WEIGHTS, type MemoryModel, memoryModel, type Trace, type Weights } from './fsrs.ts';
import { afterMissAndRetest, expectedSeconds, HORIZON_DAYS, type ShowingCosts } from './gain.ts';
import { chooseNew } from './new-cases.ts';
import type { QueueCard } from './types.ts';
import { mixedPrior, WANTED_MIN, wantedOfMixed } from './wanted.ts';

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

const STEPS = 24;

/**
 * Mean seconds a day that β asks for over the horizon. Each case follows its expected path: shown whenever
 * recall has fallen to what is wanted, its stability then the geometric mean of pass and miss weighted by
 * their chances. A mean-field forecast: quick and monotone in β; the Monte Carlo forecast is the exact one.
 */
export function forecastSeconds(request: LoadRequest, beta: number): number {
  const { cards, costs, horizon = HORIZON_DAYS } = request;
  const model = memoryModel(request.weights ?? DEFAULT_WEIGHTS);
  const starts = newStarts(request);
  let total = 0;
  for (const card of cards) {
    const wanted = wantedOfMixed(mixedPrior(card.prior, cards.length), cards.length, beta);
    const start = starts.get(card.key) ?? horizon;
    if (card.memory) {
      const elapsed = request.day - card.memory.lastDay;
      total += secondsFrom(model, card.memory, Math.max(0, elapsed), 0, wanted, horizon, costs);
    } else if (start < horizon) {
      const pass = model.next(null, 0, true);
      const met = blend(0.5, pass, afterMissAndRetest(model, null, 0));
      total += costs.fresh + secondsFrom(model, met, 0, start, wanted, horizon, costs);
    }
  }
  return total / horizon;
}

/**
 * The β whose forecast load matches the member's seconds a day: bisected, four decimals. 0 when even the
 * highest wanted retention fits; the largest that still changes anything when even the lowest does not.
 *
 * @throws RangeError if the seconds are not above nothing.
 */
export function solveBeta(request: LoadRequest & { readonly seconds: number }): number {
  if (!(request.seconds > 0)) throw new RangeError('β needs some seconds a day to fit into.');
  const cases = request.cards.length;
  if (cases === 0) return 0;
  let low = 0;
  let high = 0;
  for (const { prior } of request.cards) {
    high = Math.max(high, (1 - WANTED_MIN) * Math.sqrt(cases * mixedPrior(prior, cases)));
  }
  if (forecastSeconds(request, low) <= request.seconds) return low;
  for (let step = 0; step < STEPS && high - low > 1e-5; step += 1) {
    const middle = (low + high) / 2;
    if (forecastSeconds(request, middle) > request.seconds) low = middle;
    else high = middle;
  }
  return Math.round(high * 1e4) / 1e4;
}

function secondsFrom(
  model: MemoryModel,
  trace: Trace,
  elapsed: number,
  start: number,
  wanted: number,
  horizon: number,
  costs: ShowingCosts,
): number {
  let state = trace;
  let since = elapsed;
  let day = start;
  let seconds = 0;
  for (;;) {
    const due = Math.max(1, Math.ceil(model.daysUntil(wanted, state.stability)));
    day += Math.max(0, due - since);
    since = Math.max(due, since);
    if (day >= horizon) return seconds;
    const chance = model.recall(since, state.stability);
    seconds += expectedSeconds(chance, costs);
    state = blend(chance, model.next(state, since, true), afterMissAndRetest(model, state, since));
    since = 0;
  }
}

function blend(chance: number, pass: Trace, fail: Trace): Trace {
  return {
    stability: Math.exp(chance * Math.log(pass.stability) + (1 - chance) * Math.log(fail.stability)),
    difficulty: chance * pass.difficulty + (1 - chance) * fail.difficulty,
  };
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
