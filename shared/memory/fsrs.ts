import { computeDecayFactor, default_w, FSRSAlgorithm, forgetting_curve, generatorParameters } from 'ts-fsrs';

/** The 21 weights of FSRS-6. */
export type Weights = readonly number[];

/** FSRS-6's published default weights, as the library carries them. */
export const DEFAULT_WEIGHTS: Weights = Object.freeze([...default_w]);

/** Stability in days and difficulty 1..10. */
export interface Trace {
  readonly stability: number;
  readonly difficulty: number;
}

/** FSRS-6 with one set of weights. Time is always a whole number of the member's own training days. */
export interface MemoryModel {
  /** d of R(t, S) = (1 + F·t/S)^(−d). */
  readonly decay: number;
  /** F = .9^(−1/d) − 1, so that R(S, S) = .9. */
  readonly factor: number;
  /** State after a scored answer; `null` before the first. Elapsed 0 takes the same-day step. */
  next(trace: Trace | null, elapsedDays: number, held: boolean): Trace;
  /** The weights as the library uses them, clipped to its bounds. */
  readonly weights: Weights;
  /** Chance of recall, 0..1, 8 decimals. */
  recall(elapsedDays: number, stability: number): number;
  /** Days, not rounded, after which recall has fallen to `wanted`. */
  daysUntil(wanted: number, stability: number): number;
  /** The stability whose recall after `elapsedDays` is `recall`; the inverse of `recall`. */
  stabilityFor(elapsedDays: number, recall: number): number;
}

const WEIGHTS = 21;
/** The two of the library's four grades that a timed answer can have: nobody is asked how it felt. */
const GRADE_NOT_HELD = 1;
const GRADE_HELD = 3;
export const STABILITY_MIN = 0.001;
export const STABILITY_MAX = 36500;
const models = new WeakMap<Weights, MemoryModel>();

/**
 * The model for these weights, built once per array. State steps are the library's own `next_state` and
 * `forgetting_curve`: its calendar, its queue and its `Date`s are never used.
 *
 * @throws RangeError unless there are 21 finite weights.
 */
export function memoryModel(weights: Weights = DEFAULT_WEIGHTS): MemoryModel {
  const known = models.get(weights);
  if (known) return known;
  const model = build(weights);
  models.set(weights, model);
  return model;
}

function build(weights: Weights): MemoryModel {
  if (weights.length !== WEIGHTS || !weights.every(Number.isFinite)) {
    throw new RangeError(`The memory model takes ${WEIGHTS} finite weights, not ${weights.length}.`);
  }
  const algorithm = new FSRSAlgorithm(generatorParameters({ w: [...weights] }));
  // The library clips weights to its bounds; everything else here must use the clipped ones.
  const w = [...algorithm.parameters.w];
  const { factor } = computeDecayFactor(w);
  const decay = w[20]!;
  return {
    decay,
    factor,
    weights: w,
    next: (trace, elapsedDays, held) =>
      algorithm.next_state(trace, elapsedDays, held ? GRADE_HELD : GRADE_NOT_HELD),
    recall: (elapsedDays, stability) => forgetting_curve(w, elapsedDays, stability),
    daysUntil: (wanted, stability) => (stability / factor) * (wanted ** (-1 / decay) - 1),
    stabilityFor: (elapsedDays, recall) =>
      clampStability((factor * elapsedDays) / (recall ** (-1 / decay) - 1)),
  };
}

function clampStability(stability: number): number {
  return Math.min(Math.max(stability, STABILITY_MIN), STABILITY_MAX);
}

/** Eight decimals, as the library rounds: a state stored and read back is the very same number. */
export function round8(value: number): number {
  return Math.round(value * 1e8) / 1e8;
}
