/** Trade names and groups of cases, read from the name tables through the engine. */
import type { Aspect } from './aspects.ts';
import { type Classes, classify } from './classes.ts';
import { OLL_NAMES } from './names-oll.ts';
import { PLL_NAMES } from './names-pll.ts';
import { parseMoves } from './notation.ts';
import { stateSolved } from './reading.ts';
import type { CaseSetDefinition } from './sets.ts';
import { cornerRank, flipOf, indexOf, twistOf } from './state.ts';

export interface Label {
  readonly name: string;
  readonly group: string;
}

type LabelOf = (state: number) => Label | undefined;

/** A look-up from state to label, made on first use from a table of known algorithms. */
function lookUp(classesOf: () => Classes, table: readonly (readonly [Label, string])[]): LabelOf {
  let made: { classes: Classes; labels: (Label | undefined)[] } | undefined;
  return (state) => {
    if (!made) {
      const classes = classesOf();
      const labels: (Label | undefined)[] = [];
      for (const [label, algorithm] of table) {
        const solved = stateSolved(parseMoves(algorithm));
        if (solved === null)
          throw new Error(`The algorithm beside ${label.name} breaks the first two layers.`);
        labels[classes.caseOf[solved]!] = label;
      }
      made = { classes, labels };
    }
    return made.labels[made.classes.caseOf[state]!];
  };
}

const CORNER_GROUPS = {
  adjacent: 'adjacent corners',
  diagonal: 'diagonal corners',
  none: 'edges only',
} as const;

/** Corner permutation as the trade tells it: two beside each other swapped, across, or none. */
const cornerSwap: LabelOf = lookUp(
  () => classify('co+eo', ['cp']),
  [
    [{ name: 'adjacent', group: '' }, PLL_NAMES.find(([name]) => name === 'T')![1]],
    [{ name: 'diagonal', group: '' }, PLL_NAMES.find(([name]) => name === 'Y')![1]],
  ],
);
const cornerGroup = (state: number): string => {
  const swap = cornerSwap(indexOf(cornerRank(state), 0, cornerRank(state), 0))?.name;
  return swap === 'adjacent' || swap === 'diagonal' ? CORNER_GROUPS[swap] : CORNER_GROUPS.none;
};

const oll: LabelOf = lookUp(
  () => classify('any', ['co', 'eo']),
  OLL_NAMES.map(([number, group, algorithm]) => [{ name: String(number), group }, algorithm] as const),
);
const pll: LabelOf = lookUp(
  () => classify('co+eo', ['cp', 'ep']),
  PLL_NAMES.map(([name, algorithm]) => [{ name, group: '' }, algorithm] as const),
);

/** OCLL names by OLL number; common practice. */
const OCLL: Readonly<Record<string, string>> = {
  '21': 'H',
  '22': 'Pi',
  '23': 'U',
  '24': 'T',
  '25': 'L',
  '26': 'Antisune',
  '27': 'Sune',
};
const twistName = (state: number): string | undefined =>
  OCLL[oll(indexOf(0, twistOf(state), 0, 0))?.name ?? ''];

/** All four flipped, two facing each other, two beside each other: what is left of the cross. */
const flipName = (state: number): string | undefined => {
  const flips = flipOf(state);
  if (flips === 0) return undefined;
  // Codes of flips over UF UR UB; UL makes the sum even: all, UF and UB, UR and UL.
  if (flips === 7) return 'dot';
  return flips === 5 || flips === 2 ? 'line' : 'L';
};

/** Trade name of the case that holds `state`, in the sets that have names. */
function tradeName(set: CaseSetDefinition, state: number): string | undefined {
  switch (set.key) {
    case 'oll':
      return oll(state)?.name;
    case 'pll':
    case 'epll':
      return pll(state)?.name;
    case 'ocll':
      return twistName(state);
    case 'eoll':
      return flipName(state);
    case 'cpll':
      return cornerSwap(state)?.name;
    default:
      return undefined;
  }
}

const NAMED_WITHOUT_GROUPS = new Set(['epll', 'ocll', 'eoll', 'cpll']);

/** Group of the case that holds `state`, by what the set tells apart first: orientation, then permutation. */
function groupOf(set: CaseSetDefinition, state: number): string {
  if (set.key === 'oll') return oll(state)?.group ?? '';
  if (NAMED_WITHOUT_GROUPS.has(set.key)) return '';
  const tells = (aspect: Aspect) => set.toldApart.includes(aspect);
  if (tells('co') && tells('eo')) {
    const number = oll(state)?.name;
    return number ? `OLL ${number}` : 'oriented';
  }
  if (tells('co')) return twistName(state) ?? 'corners oriented';
  if (tells('eo')) return flipName(state) ?? 'edges oriented';
  return tells('cp') ? cornerGroup(state) : '';
}

/** Where a set told apart by corner twist sees both permutations, groups are split by corner permutation. */
function splitByCorners(set: CaseSetDefinition, canonical: readonly number[], groups: string[]): string[] {
  const tells = (aspect: Aspect) => set.toldApart.includes(aspect);
  if (!(tells('co') && tells('cp') && tells('ep')) || tells('eo')) return groups;
  const corners = classify(set.entry, ['co', 'cp']);
  const numbers = new Map<number, number>();
  const inGroup = new Map<string, number>();
  return groups.map((group, at) => {
    const class_ = corners.caseOf[canonical[at]!]!;
    let number = numbers.get(class_);
    if (number === undefined) {
      number = (inGroup.get(group) ?? 0) + 1;
      inGroup.set(group, number);
      numbers.set(class_, number);
    }
    return `${group} ${number}`;
  });
}

/**
 * Names and groups of a set's cases in canonical order. Cases without a trade name are numbered: `#17`. The
 * solved class, which comes first, is called "skip".
 */
export function labelsOf(set: CaseSetDefinition, canonical: readonly number[]): readonly Label[] {
  const groups = splitByCorners(
    set,
    canonical,
    canonical.map((state) => groupOf(set, state)),
  );
  return canonical.map((state, at) =>
    at === 0 ? { name: 'skip', group: '' } : { name: tradeName(set, state) ?? `#${at}`, group: groups[at]! },
  );
}

/** What people write around a name, taken away: `PLL T-perm`, `oll 07`, `# 17`, `J b`. */
export function plainName(set: CaseSetDefinition, text: string): string {
  const lower = text.normalize('NFKC').trim().toLowerCase();
  const inner = lower.startsWith(set.key) ? lower.slice(set.key.length) : lower;
  const bare = inner
    .replace(/\b(?:case|number|no\.?|nr\.?)(?=[\s\d#])/gu, '')
    .replace(/[\s_-]*perm(?:utation)?$/u, '')
    .replace(/[\s#_.:-]+/gu, '');
  const named = bare === '' ? lower : bare;
  if (/^(?:skip|solved|none)$/u.test(named)) return 'skip';
  if (named === 'π') return 'pi';
  return named.replace(/^0+(?=\d)/u, '');
}
