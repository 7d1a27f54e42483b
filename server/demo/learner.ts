import type { CaseSet } from '#shared/lastlayer/index.ts';
import type { DemoPerson } from './people.ts';
import { normal } from './random.ts';

/** What a simulated learner does with a showing. */
export interface Reaction {
  readonly named: string;
  readonly aufBefore: number | null;
  readonly recognitionMs: number | null;
  readonly namingMs: number | null;
}

interface Trace {
  strength: number;
  day: number;
}

/**
 * A simulated learner who forgets by a power law with interference from the mirror case and now and then a
 * lapse of attention: deliberately of another shape than the memory model that schedules for them.
 */
export class Learner {
  readonly #person: DemoPerson;
  readonly #random: () => number;
  readonly #traces = new Map<string, Trace>();

  constructor(person: DemoPerson, random: () => number) {
    this.#person = person;
    this.#random = random;
  }

  /** What they knew before the first day: the likelier cases rather than the rarer. */
  bring(set: CaseSet, day: number): void {
    for (const c of set.cases) {
      const chance = Math.min(0.98, this.#person.knows * (0.6 + 0.4 * c.angles * 0.25) * 1.1);
      if (this.#random() < chance)
        this.#traces.set(c.key, { strength: 15 + 40 * this.#random(), day: day - 5 });
    }
  }

  /** Looks at a case: recall first, then what it does to the memory. */
  react(
    set: CaseSet,
    caseKey: string,
    keys: readonly string[],
    rightAufs: readonly number[],
    day: number,
  ): Reaction {
    const known = this.#recalls(set, caseKey, day);
    const trace = this.#traces.get(caseKey);
    const sure = trace ? Math.min(1, trace.strength / 40) : 0;
    const recognitionMs = this.#time(sure, known);
    this.#learn(caseKey, day, known);
    if (!known && this.#random() < 0.45) {
      return { named: 'unrecognised', aufBefore: null, recognitionMs: null, namingMs: null };
    }
    const named = known ? caseKey : this.#mistake(set, caseKey, keys);
    const slip = this.#random() < 0.025 + 0.05 * (1 - sure);
    const right = rightAufs[Math.floor(this.#random() * rightAufs.length)] ?? 0;
    return {
      named,
      aufBefore: slip ? (right + 1 + Math.floor(this.#random() * 3)) % 4 : right,
      recognitionMs,
      namingMs: Math.round(700 + 1200 * this.#random()),
    };
  }

  #recalls(set: CaseSet, caseKey: string, day: number): boolean {
    const trace = this.#traces.get(caseKey);
    if (!trace || this.#random() < 0.015) return false;
    const mirror = set.byKey(caseKey);
    const other = mirror ? this.#traces.get(set.mirrorOf(mirror).key) : undefined;
    // A half-known mirror case gets in the way.
    const interference = other && other.strength < 12 && trace.strength < 25 ? 0.9 : 1;
    const elapsed = Math.max(0, day - trace.day);
    return (
      this.#random() < interference * (1 + elapsed / (2.2 * trace.strength * this.#person.retention)) ** -0.7
    );
  }

  #learn(caseKey: string, day: number, known: boolean): void {
    const trace = this.#traces.get(caseKey) ?? { strength: 0.9, day };
    const elapsed = Math.max(0, day - trace.day);
    const strength = known
      ? trace.strength * (1.35 + 0.9 * Math.min(1, elapsed / (trace.strength + 0.5)))
      : Math.max(1, trace.strength * 0.45 + 0.8);
    this.#traces.set(caseKey, { strength: Math.min(240, strength), day });
  }

  #time(sure: number, known: boolean): number {
    const median = this.#person.speed * (1.25 - 0.45 * sure) * (known ? 1 : 1.7);
    return Math.round(Math.min(20, Math.max(0.35, median * Math.exp(0.34 * normal(this.#random)))) * 1000);
  }

  #mistake(set: CaseSet, caseKey: string, keys: readonly string[]): string {
    const c = set.byKey(caseKey);
    const mirror = c ? set.mirrorOf(c).key : caseKey;
    if (mirror !== caseKey && keys.includes(mirror) && this.#random() < 0.45) return mirror;
    const others = keys.filter((key) => key !== caseKey);
    return others[Math.floor(this.#random() * others.length)] ?? 'lost';
  }
}
