/** Trade names and groups of cases, read from the name tables through the engine. */
import { type Aspect, seenThrough } from './aspects.ts';
import { type Classes, classify } from './classes.ts';
import { OLL_NAMES } from './names-oll.ts';
import { PLL_NAMES } from './names-pll.ts';
import { parseMoves } from './notation.ts';
import { stateSolved } from './reading.ts';
import { type CaseSetDefinition, openIn } from './sets.ts';
import { cornerRank, edgeRank, flipOf, indexOf, twistOf } from './state.ts';

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
/** The corners of a state alone, oriented, the edges carried along. */
const permuted = (state: number): number => indexOf(cornerRank(state), 0, cornerRank(state), 0);
const cornerGroup = (state: number): string => {
  const swap = cornerSwap(permuted(state))?.name;
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

/** PLL letter of the pieces' permutation, whatever their orientation. */
const permutationName = (state: number): string | undefined =>
  pll(indexOf(cornerRank(state), 0, edgeRank(state), 0))?.name;

const CORNERS_ORIENTED = 'corners oriented';
const EDGES_ORIENTED = 'edges oriented';

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

/** What names hang on: the aspects that cases differ in, and whether both permutations are seen. */
interface Naming {
  readonly open: readonly Aspect[];
  readonly both: boolean;
}
const namingOf = (set: CaseSetDefinition): Naming => {
  const seen = seenThrough(set.entry, set.toldApart);
  return { open: openIn(set), both: seen.includes('cp') && seen.includes('ep') };
};

/** Trade name of the case that holds `state`; sets that tell orientation and permutation apart have none. */
function tradeName({ open, both }: Naming, state: number): string | undefined {
  switch (open.join()) {
    case 'co,eo':
      return oll(state)?.name;
    case 'co':
      return twistName(state);
    case 'eo':
      return flipName(state);
    case 'cp,ep':
      return permutationName(state);
    case 'cp':
      return both ? permutationName(state) : cornerSwap(permuted(state))?.name;
    case 'ep':
      return both ? permutationName(state) : undefined;
    default:
      return undefined;
  }
}

/** Group of the case that holds `state`, by what the set tells apart first: orientation, then permutation. */
function groupOf({ open }: Naming, state: number): string {
  if (open.length < 2) return '';
  const tells = (aspect: Aspect) => open.includes(aspect);
  if (tells('co') && tells('eo')) {
    const label = oll(state);
    if (open.length === 2) return label?.group ?? '';
    return label ? `OLL ${label.name}` : 'oriented';
  }
  if (tells('co')) return twistName(state) ?? CORNERS_ORIENTED;
  if (tells('eo')) return flipName(state) ?? EDGES_ORIENTED;
  return cornerGroup(state);
}

/** What a case shows of each aspect that its set tells apart; null where it does not. */
export interface Traits {
  /** Corner orientation by its trade name: `Sune`, or `corners oriented`. */
  readonly corners: string | null;
  /** Edge orientation by its shape: `dot`, `line`, `L`, or `edges oriented`. */
  readonly edges: string | null;
  /** Corner permutation: `adjacent corners`, `diagonal corners`, or `edges only`. */
  readonly swap: string | null;
}

/** The traits of the case that holds `state`. */
export function traitsOf(set: CaseSetDefinition, state: number): Traits {
  const open = openIn(set);
  return {
    corners: open.includes('co') ? (twistName(state) ?? CORNERS_ORIENTED) : null,
    edges: open.includes('eo') ? (flipName(state) ?? EDGES_ORIENTED) : null,
    swap: open.includes('cp') ? cornerGroup(state) : null,
  };
}

/** Where a set told apart by corner twist sees both permutations, groups are split by corner permutation. */
function splitByCorners(set: CaseSetDefinition, canonical: readonly number[], groups: string[]): string[] {
  if (openIn(set).join() !== 'co,cp,ep') return groups;
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
  const naming = namingOf(set);
  const groups = splitByCorners(
    set,
    canonical,
    canonical.map((state) => groupOf(naming, state)),
  );
  return canonical.map((state, at) =>
    at === 0
      ? { name: 'skip', group: '' }
      : { name: tradeName(naming, state) ?? `#${at}`, group: groups[at]! },
  );
}

/** A set called "U" must not swallow the first letter of "Ua". */
const SHORTEST_PREFIX = 3;

/** What people write around a name, taken away: `PLL T-perm`, `oll 07`, `# 17`, `J b`. */
export function plainName(set: CaseSetDefinition, text: string): string {
  const lower = text.normalize('NFKC').trim().toLowerCase();
  const prefix = [set.name.toLowerCase(), set.key].find(
    (word) => word.length >= SHORTEST_PREFIX && lower.startsWith(word),
  );
  const inner = lower.slice(prefix?.length ?? 0);
  const bare = inner
    .replace(/\b(?:case|number|no\.?|nr\.?)(?=[\s\d#])/gu, '')
    .replace(/[\s_-]*perm(?:utation)?$/u, '')
    .replace(/[\s#_.:-]+/gu, '');
  const named = bare === '' ? lower : bare;
  if (/^(?:skip|solved|none)$/u.test(named)) return 'skip';
  if (named === 'π') return 'pi';
  return named.replace(/^0+(?=\d)/u, '');
}
