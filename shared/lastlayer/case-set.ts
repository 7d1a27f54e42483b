/** A case set ready for use: its cases, and which of them a state belongs to. */
import { mirror } from './action.ts';
import { type Entry, isEntryState } from './aspects.ts';
import { clusterFinder, lookUps } from './case-look-ups.ts';
import { type Classes, classify } from './classes.ts';
import { dealOf } from './mix.ts';
import { labelsOf } from './naming.ts';
import { requireDefinition } from './requirements.ts';
import { CASE_SETS, type CaseSetDefinition, caseKey } from './sets.ts';
import { requireStateIndex, STATES } from './state.ts';

export interface CaseOfSet {
  /** Stable key, safe in addresses: see caseKey. */
  readonly key: string;
  /** Place in canonical order from 1; the skip is 0. */
  readonly number: number;
  /** Smallest full entry state of the case, 0..62207. */
  readonly canonical: number;
  /** Full entry states in the case, AUF included, or its share of a mix: prior = weight / set.total. */
  readonly weight: number;
  /** Really different pictures as one walks round the cube. */
  readonly angles: 1 | 2 | 4;
  /** Trade name (`T`, `21`) or number (`#17`); `skip` for the solved class. */
  readonly name: string;
  /** Shape or orientation group; empty if the set has none. */
  readonly group: string;
  readonly skip: boolean;
  /** The fixed cluster whose names a showing offers, from 1; 0 where a set offers all its names. */
  readonly cluster: number;
}

export interface CaseSet {
  readonly definition: CaseSetDefinition;
  /** The set whose cases these are chosen from; null for a set of its own. */
  readonly parent: CaseSet | null;
  /** In canonical order, without the skip. */
  readonly cases: readonly CaseOfSet[];
  readonly skip: CaseOfSet;
  /** Number of different full states that reach the step. */
  readonly states: number;
  /** Denominator of the priors: the entry states, or for a mix what its shares come to. */
  readonly total: number;
  /**
   * The case of a full state; null if the state does not meet the entry condition, or its case is none that the
   * mix can deal or the subset has chosen.
   */
  caseOfState(index: number): CaseOfSet | null;
  byKey(key: string): CaseOfSet | undefined;
  /** Forgiving: `T`, `PLL T`, `T-perm`, `OLL 07`, `#17`, `skip`, `solved`. */
  byName(name: string): CaseOfSet | undefined;
  /** The full states of a case that can be dealt, rising. */
  statesOf(of: CaseOfSet): ArrayLike<number>;
  /**
   * A full state of the case: each equally likely, in a mix as likely as its entries deal it.
   * `random` gives numbers in [0, 1).
   */
  drawState(of: CaseOfSet, random: () => number): number;
  /** The case of the mirrored states; the skip's mirror is the skip. A subset may have left it out. */
  mirrorOf(of: CaseOfSet): CaseOfSet;
}

/** Full states sorted by case, with the place at which each case begins. */
function membersOf(
  classes: Classes,
  isDealt: (index: number) => boolean,
): { members: Uint16Array; begins: Int32Array } {
  const begins = new Int32Array(classes.canonical.length + 1);
  const dealt = (index: number): number => (isDealt(index) ? classes.caseOf[index]! : -1);
  for (let index = 0; index < STATES; index++) {
    const of = dealt(index);
    if (of >= 0) begins[of + 1]!++;
  }
  for (let at = 1; at < begins.length; at++) begins[at]! += begins[at - 1]!;
  const next = begins.slice();
  const members = new Uint16Array(begins.at(-1)!);
  for (let index = 0; index < STATES; index++) {
    const of = dealt(index);
    if (of >= 0) members[next[of]!++] = index;
  }
  return { members, begins };
}

/**
 * Makes a set from its definition: 10 to 20 ms, for a mix some more. Clusters are found when the first of them is
 * asked for, which takes up to a few hundred milliseconds for thousands of cases.
 * @throws RangeError if there can be no such set: see requireDefinition.
 */
export function buildCaseSet(definition: CaseSetDefinition): CaseSet {
  requireDefinition(definition);
  const classes = classify(definition.entry, definition.toldApart);
  const labels = labelsOf(definition, classes.canonical);
  const deal = definition.mix.length > 0 ? dealOf(definition.mix, classes) : null;
  const { weight, total, states } = deal ?? { ...classes, total: classes.states };
  const everyCase = classes.canonical.map((_, number) => number).filter((number) => weight[number]! > 0);
  const clusterAt = clusterFinder(definition, () => classes, everyCase);
  const all: readonly CaseOfSet[] = everyCase.map((number) => ({
    key: caseKey(definition, classes.canonical[number]!),
    number,
    canonical: classes.canonical[number]!,
    weight: weight[number]!,
    angles: classes.angles[number]!,
    name: labels[number]!.name,
    group: labels[number]!.group,
    skip: number === 0,
    get cluster() {
      return clusterAt(number);
    },
  }));
  const byNumber: CaseOfSet[] = [];
  for (const one of all) byNumber[one.number] = one;
  let sorted: ReturnType<typeof membersOf> | undefined;

  const statesOf = (of: CaseOfSet): Uint16Array => {
    sorted ??= membersOf(classes, deal?.isDealt ?? (() => true));
    return sorted.members.subarray(sorted.begins[of.number], sorted.begins[of.number + 1]);
  };
  // Drawing from a mix asks again and again for the same few: those are kept.
  const arriving = new Map<string, Uint16Array>();
  const statesArriving = (of: CaseOfSet, entry: Entry): Uint16Array => {
    const id = `${of.number} ${entry}`;
    const found = arriving.get(id) ?? statesOf(of).filter((index) => isEntryState(entry, index));
    arriving.set(id, found);
    return found;
  };
  const caseOfState = (index: number): CaseOfSet | null => {
    requireStateIndex(index);
    return byNumber[classes.caseOf[index]!] ?? null;
  };
  return {
    definition,
    parent: null,
    cases: all.slice(1),
    skip: all[0]!,
    states,
    total,
    caseOfState,
    ...lookUps(definition, all),
    statesOf,
    drawState: (of, random) => {
      const entry = deal?.drawEntry(of.number, random);
      const from = entry ? statesArriving(of, entry) : statesOf(of);
      return from[Math.floor(random() * from.length)]!;
    },
    mirrorOf: (of) => caseOfState(mirror(of.canonical))!,
  };
}

const made = new Map<string, CaseSet>();

/**
 * One of the trade's sets by key (`oll`, `pll`, … ; case does not matter), made on first use and kept.
 * @throws RangeError if there is no such set.
 */
export function caseSet(key: string): CaseSet {
  const wanted = key.trim().toLowerCase();
  const known = made.get(wanted);
  if (known) return known;
  const definition = CASE_SETS.find((set) => set.key === wanted);
  if (!definition) {
    const names = CASE_SETS.map((set) => set.name).join(', ');
    throw new RangeError(`There is no set "${key}". Known sets: ${names}.`);
  }
  const set = buildCaseSet(definition);
  made.set(wanted, set);
  return set;
}
