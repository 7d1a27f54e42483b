/** A case set ready for use: its cases, and which of them a state belongs to. */
import { mirror } from './action.ts';
import { type Classes, classify } from './classes.ts';
import { clustersOf } from './clusters.ts';
import { labelsOf, plainName } from './naming.ts';
import { CASE_SETS, type CaseSetDefinition, caseKey, requireSolvable } from './sets.ts';
import { requireStateIndex, STATES } from './state.ts';

export interface CaseOfSet {
  /** Stable key, safe in addresses: see caseKey. */
  readonly key: string;
  /** Place in canonical order from 1; the skip is 0. */
  readonly number: number;
  /** Smallest full entry state of the case, 0..62207. */
  readonly canonical: number;
  /** Full entry states in the case, AUF included: prior = weight / set.states. */
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
  /** In canonical order, without the skip. */
  readonly cases: readonly CaseOfSet[];
  readonly skip: CaseOfSet;
  /** Number of entry states: the total of the priors. */
  readonly states: number;
  /** The case of a full state, null if the state does not meet the entry condition. */
  caseOfState(index: number): CaseOfSet | null;
  byKey(key: string): CaseOfSet | undefined;
  /** Forgiving: `T`, `PLL T`, `T-perm`, `OLL 07`, `#17`, `skip`, `solved`. */
  byName(name: string): CaseOfSet | undefined;
  /** The full states of a case, rising; as many as its weight. */
  statesOf(of: CaseOfSet): ArrayLike<number>;
  /** A full state of the case, each equally likely. `random` gives numbers in [0, 1). */
  drawState(of: CaseOfSet, random: () => number): number;
  /** The case of the mirrored states; the skip's mirror is the skip. */
  mirrorOf(of: CaseOfSet): CaseOfSet;
}

/** Full states sorted by case, with the place at which each case begins. */
function membersOf(classes: Classes): { members: Uint16Array; begins: Int32Array } {
  const begins = new Int32Array(classes.weight.length + 1);
  classes.weight.forEach((weight, at) => {
    begins[at + 1] = begins[at]! + weight;
  });
  const next = begins.slice();
  const members = new Uint16Array(classes.states);
  for (let index = 0; index < STATES; index++) {
    const of = classes.caseOf[index]!;
    if (of >= 0) members[next[of]!++] = index;
  }
  return { members, begins };
}

/**
 * Makes a set from its definition: 10 to 20 ms, and up to a few hundred more for clusters of thousands of
 * cases.
 * @throws RangeError if the definition could not be solved: see requireSolvable.
 */
export function buildCaseSet(definition: CaseSetDefinition): CaseSet {
  requireSolvable(definition);
  const classes = classify(definition.entry, definition.toldApart);
  const labels = labelsOf(definition, classes.canonical);
  const clusters = clustersOf(definition, classes);
  const all: readonly CaseOfSet[] = classes.canonical.map((canonical, number) => ({
    key: caseKey(definition, canonical),
    number,
    canonical,
    weight: classes.weight[number]!,
    angles: classes.angles[number]!,
    name: labels[number]!.name,
    group: labels[number]!.group,
    skip: number === 0,
    cluster: clusters[number]!,
  }));
  const keys = new Map(all.map((one) => [one.key, one]));
  const names = new Map(all.map((one) => [plainName(definition, one.name), one]));
  let states: ReturnType<typeof membersOf> | undefined;

  const statesOf = (of: CaseOfSet): Uint16Array => {
    states ??= membersOf(classes);
    return states.members.subarray(states.begins[of.number], states.begins[of.number + 1]);
  };
  const caseOfState = (index: number): CaseOfSet | null => {
    requireStateIndex(index);
    return all[classes.caseOf[index]!] ?? null;
  };
  return {
    definition,
    cases: all.slice(1),
    skip: all[0]!,
    states: classes.states,
    caseOfState,
    byKey: (key) => keys.get(key),
    byName: (name) => names.get(plainName(definition, name)),
    statesOf,
    drawState: (of, random) => statesOf(of)[Math.floor(random() * of.weight)]!,
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
