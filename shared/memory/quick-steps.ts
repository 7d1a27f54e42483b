import { type MemoryModel, STABILITY_MAX, STABILITY_MIN } from './fsrs.ts';

/**
 * The forgetting curve and the steps without rounding or checks: for plans that weigh thousands of cases at
 * a time. What is stored always comes from the library (fsrs.ts); tests
 * hold these to it within 1e-6. Formulas: FSRS-6.
 */
export interface QuickSteps {
  /** R(t, S) = (1 + F·t/S)^(−d) */
  recall(elapsedDays: number, stability: number): number;
  /** S·{1 + e^w8·(11 − D)·S^(−w9)·(e^(w10·(1−R)) − 1)} */
  afterHeld(stability: number, difficulty: number, recall: number): number;
  /** min(w11·D^(−w12)·((S+1)^w13 − 1)·e^(w14·(1−R)), S/e^(w17·w18)), then a held retest the same day. */
  afterMissAndRetest(stability: number, difficulty: number, recall: number): number;
  /** S·max(1, S^(−w19)·e^(w17·w18)) */
  afterRetest(stability: number): number;
  /** w7·D0(4) + (1 − w7)·[D − w6·(G − 3)·(10 − D)/9], clamped to 1..10 */
  difficultyAfter(difficulty: number, held: boolean): number;
}

const built = new WeakMap<MemoryModel, QuickSteps>();

/** The quick steps of a model, built once. */
export function quickSteps(model: MemoryModel): QuickSteps {
  const known = built.get(model);
  if (known) return known;
  const steps = build(model);
  built.set(model, steps);
  return steps;
}

function build({ decay, factor, weights: w }: MemoryModel): QuickSteps {
  const growth = Math.exp(w[8]!);
  const cap = Math.exp(w[17]! * w[18]!);
  const reverted = w[7]! * (w[4]! - Math.exp(3 * w[5]!) + 1);
  const afterRetest = (stability: number) => clamp(stability * Math.max(1, stability ** -w[19]! * cap));
  return {
    recall: (elapsedDays, stability) => (1 + (factor * elapsedDays) / stability) ** -decay,
    afterHeld: (stability, difficulty, recall) =>
      clamp(
        stability *
          (1 + growth * (11 - difficulty) * stability ** -w[9]! * (Math.exp(w[10]! * (1 - recall)) - 1)),
      ),
    afterMissAndRetest: (stability, difficulty, recall) => {
      const forgotten =
        w[11]! * difficulty ** -w[12]! * ((stability + 1) ** w[13]! - 1) * Math.exp(w[14]! * (1 - recall));
      return afterRetest(clamp(Math.min(forgotten, stability / cap)));
    },
    afterRetest,
    difficultyAfter: (difficulty, held) => {
      const moved = held ? difficulty : difficulty + (2 * w[6]! * (10 - difficulty)) / 9;
      return Math.min(Math.max(reverted + (1 - w[7]!) * moved, 1), 10);
    },
  };
}

function clamp(stability: number): number {
  return Math.min(Math.max(stability, STABILITY_MIN), STABILITY_MAX);
}
