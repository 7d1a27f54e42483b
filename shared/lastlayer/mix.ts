/** Mixes of entries: a solver who only sometimes has more done on arrival, and what that does to the priors. */
import { type Entry, entryFixing, fixedBy, isEntryState } from './aspects.ts';
import type { Classes } from './classes.ts';
import { greatestDivisor } from './fractions.ts';
import { STATES } from './state.ts';

/** So many parts of the solves arrive with this entry: 2 parts and 3 parts are 40 % and 60 %. */
export interface EntryShare {
  readonly entry: Entry;
  /** A whole number from 1 to MOST_PARTS. */
  readonly parts: number;
}

/** Enough for tenths of a per cent. */
export const MOST_PARTS = 1000;

/**
 * What all entries have in common: the entry of the mix's cases.
 * @throws RangeError if there is no entry at all.
 */
export function meetOf(entries: readonly Entry[]): Entry {
  const [first, ...rest] = entries.map(fixedBy);
  if (!first) throw new RangeError('A mix needs entries.');
  return entryFixing(first.filter((aspect) => rest.every((fixed) => fixed.includes(aspect))))!;
}

export interface Deal {
  /** Chance of each class of being dealt, in `total`ths: whole numbers, in lowest terms all together. */
  readonly weight: readonly number[];
  readonly total: number;
  /** How many different full states are dealt. */
  readonly states: number;
  isDealt(index: number): boolean;
  /**
   * One of the entries, drawn as likely as it is that a state of this class came by it.
   * `random` gives numbers in [0, 1).
   */
  drawEntry(class_: number, random: () => number): Entry;
}

/**
 * The priors of a mix: of each share's solves every state that meets its entry is equally likely. With parts p,
 * of P in all, and n states that meet an entry, a class with k of them has weight Σ p·k/n of P, kept whole.
 * @param classes the cases of what the entries have in common.
 */
export function dealOf(mix: readonly EntryShare[], classes: Classes): Deal {
  const inClass = mix.map(() => new Int32Array(classes.canonical.length));
  const met = mix.map(() => 0);
  const dealt = new Uint8Array(STATES);
  mix.forEach(({ entry }, at) => {
    for (let index = 0; index < STATES; index++) {
      if (!isEntryState(entry, index)) continue;
      dealt[index] = 1;
      met[at] = met[at]! + 1;
      inClass[at]![classes.caseOf[index]!]!++;
    }
  });
  // Every entry's states are a whole share of all 62,208, so all chances are whole multiples of 1/(parts · 62,208).
  const share = (class_: number, at: number): number =>
    mix[at]!.parts * inClass[at]![class_]! * (STATES / met[at]!);
  const shares = (class_: number): number[] => mix.map((_, at) => share(class_, at));
  const whole = classes.canonical.map((_, class_) => shares(class_).reduce((sum, one) => sum + one, 0));
  const all = mix.reduce((sum, { parts }) => sum + parts, 0) * STATES;
  const divisor = whole.reduce(greatestDivisor, all);
  return {
    weight: whole.map((one) => one / divisor),
    total: all / divisor,
    states: dealt.reduce((sum, one) => sum + one, 0),
    isDealt: (index) => dealt[index] === 1,
    drawEntry: (class_, random) => {
      let left = random() * whole[class_]!;
      const found = shares(class_).findIndex((one) => {
        left -= one;
        return left < 0;
      });
      return mix[found]!.entry;
    },
  };
}
