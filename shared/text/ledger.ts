import type { Aspect, Entry } from '../lastlayer/index.ts';
import { aufText } from './auf.ts';
import { numberText } from './numbers.ts';

const { count } = numberText;

/** Entry conditions as choices: the trade's six, then the rest. A permutation done is done up to AUF. */
const entries: Readonly<Record<Entry, string>> = {
  any: 'first two layers only',
  eo: 'edges oriented',
  co: 'corners oriented',
  'co+eo': 'both oriented',
  corners: 'all corners',
  'corners+eo': 'corners, edges oriented',
  cp: 'corners permuted',
  'cp+eo': 'corners permuted, edges oriented',
  ep: 'edges permuted',
  'co+ep': 'corners oriented, edges permuted',
  edges: 'all edges',
  'co+edges': 'edges, corners oriented',
  'cp+ep': 'both permuted',
  'corners+ep': 'corners, edges permuted',
  'cp+edges': 'edges, corners permuted',
};

const aspects: Readonly<Record<Aspect, string>> = {
  co: 'corner orientation',
  eo: 'edge orientation',
  cp: 'corner permutation',
  ep: 'edge permutation',
};

const listed = (words: readonly string[]): string => words.join(', ');

/** Groups of thousands set off, as 62,208. */
const whole = (n: number): string => String(n).replace(/\B(?=(\d{3})+$)/g, ',');

interface Fraction {
  readonly numerator: number;
  readonly denominator: number;
}

/** 1/18; a whole number stands alone. */
const fraction = ({ numerator, denominator }: Fraction): string =>
  denominator === 1 ? whole(numerator) : `${whole(numerator)}/${whole(denominator)}`;

const QUARTERS = ['', '¼', '½', '¾'];
/** A fraction with its whole part first: 40½, 6¾; where it is not made of quarters, to one decimal: ≈ 14.2. */
const mixed = ({ numerator, denominator }: Fraction): string => {
  const [units, rest] = [Math.floor(numerator / denominator), numerator % denominator];
  if ((rest * 4) % denominator !== 0) {
    const tenths = Math.round((numerator * 10) / denominator);
    return `≈ ${whole(Math.floor(tenths / 10))}.${tenths % 10}`;
  }
  return `${units === 0 ? '' : whole(units)}${QUARTERS[(rest * 4) / denominator]}`;
};

/** Permutations of four, and three and two ways to turn each of four. */
const POWERS: Readonly<Record<number, string>> = { 24: '4!', 81: '3⁴', 16: '2⁴' };

/** Numbers multiplied: 24 · 24. */
const times = (factors: readonly (number | string)[]): string => factors.join(' · ');

export const ledgerText = {
  title: 'What a solve can deal',
  lead: 'Choose what is done when the last layer begins and what is told apart. The counts are exact.',
  entries,
  aspects,
  whole,
  fraction,
  mixed,

  form: {
    entry: 'Solved on arrival',
    moreEntries: 'Nine more',
    moreEntriesLegend: 'Solved on arrival, more',
    aspects: 'Told apart',
    done: 'done on arrival',
    go: 'Count',
    problemTitle: 'Not all of this can be counted',
    with: 'Second way to arrive',
    entryMissing: 'Choose what is solved on arrival.',
    asked: (what: string, value: string) => `${what}: “${value}” is none of the choices.`,
    tradeSets: 'With this entry:',
  },
  /** The step in one line, for print and for assistive technology. */
  step: (entry: Entry, told: readonly Aspect[]) =>
    `Solved on arrival: ${entries[entry]}. Told apart: ${told.length === 0 ? 'nothing' : listed(told.map((one) => aspects[one]))}.`,
  tradeName: 'Trade name:',
  noTradeName: 'No trade name',
  csv: 'Download CSV',
  counted: (cases: number) =>
    cases === 1 ? 'One case, the skip' : `${whole(cases)} cases, the skip among them`,

  counts: {
    assemblies: 'assemblies',
    solvable: 'solvable',
    withoutAuf: 'without AUF after',
    cases: 'cases, the skip among them',
    caseAlone: 'case, the skip',
    noPermutation: 'no permutation is seen',
  },

  symmetry: {
    title: 'Cases by symmetry',
    caption: 'Cases by the number of angles they have',
    columns: {
      angles: 'angles',
      cases: 'cases',
      pictures: 'pictures',
      weight: (of: number) => `weight, of ${whole(of)}`,
      prior: 'prior',
      dealtOnceIn: 'dealt once in',
    },
    list: 'List of all cases',
    angles: (angles: number) => count(angles, 'angle', 'angles'),
    cases: (cases: number) => `${whole(cases)} ${cases === 1 ? 'case' : 'cases'}`,
    weight: (weight: string, of: number) => `weight ${weight} of ${whole(of)}`,
    prior: (prior: string) => `prior ${prior}`,
    dealtOnceIn: (solves: string) => `dealt once in ${solves}`,
    solves: (value: Fraction) =>
      `${mixed(value)} ${value.numerator === value.denominator ? 'solve' : 'solves'}`,
    everyLong: (cases: number, angles: number) =>
      `All ${count(cases, 'case', 'cases')} with ${count(angles, 'angle', 'angles')}`,
    note: 'Angles: the really different pictures of a case as you walk round the cube. Its prior is the chance that a solve which arrives here is dealt it.',
  },

  three: {
    title: 'Counts that agree',
    /** What each line counts. Where no permutation is seen there is no AUF after to leave out. */
    what: {
      statesWithoutAuf: 'States without AUF after, by formula',
      states: 'States, by formula',
      statesAgain: 'The same states: cases times their angles',
      cases: 'Cases, by Burnside: the mean of the fixed states',
      casesAgain: 'The same cases, as listed by symmetry',
    },
    states: (formula: string, solvable: number, without: number) =>
      without < solvable
        ? `${formula} = ${whole(solvable)}; ${whole(solvable)} / 4 = ${count(without, 'state', 'states')}`
        : formula === whole(solvable)
          ? count(solvable, 'state', 'states')
          : `${formula} = ${count(solvable, 'state', 'states')}`,
    classes: (classes: readonly { cases: number; angles: number }[], sum: number) =>
      `${classes.map(({ cases, angles }) => `${whole(cases)} · ${angles}`).join(' + ')} = ${count(sum, 'state', 'states')}`,
    burnside: (fixed: readonly { value: number; times: number }[], cases: number) =>
      `(${fixed.map(({ value, times: n }) => (n === 1 ? whole(value) : `${n} · ${whole(value)}`)).join(' + ')}) / 16 = ${count(cases, 'case', 'cases')}`,
    listed: (classes: readonly { cases: number }[], sum: number) => {
      const total = count(sum, 'case', 'cases');
      return classes.length === 1
        ? total
        : `${classes.map(({ cases }) => whole(cases)).join(' + ')} = ${total}`;
    },
  },

  burnside: {
    title: 'Burnside’s table',
    caption: 'States that each of the sixteen pairs of turns leaves as they are',
    note: 'Each cell: the states that U before and U after together leave as they are. Their mean is the number of cases.',
    before: 'AUF before',
    after: 'AUF after',
    turn: aufText.name,
    sum: (sum: number, cases: number) => `Sum ${whole(sum)}, a sixteenth of it ${whole(cases)}.`,
  },

  upTo: {
    title: 'Up to mirror and inverse',
    cases: 'cases',
    mirror: 'up to mirror',
    inverse: 'up to inverse',
    both: 'up to mirror and inverse',
    none: '–',
    undefinedHere:
      'Inverse is not defined here: the orientation of pieces is seen without their permutation, so the inverse of a case is not one case.',
  },

  mix: {
    title: 'A mix of arrivals',
    lead: 'For a solver who only sometimes arrives with more done, or less.',
    with: 'Some solves arrive with',
    nobody: 'no mix',
    share: 'In per cent of solves',
    go: 'Mix',
    narrow: (header: string, value: string) => `${header}: ${value}`,
    caption: 'Cases by prior, mixed',
    says: (share: number, second: Entry, first: Entry) =>
      `${share} of 100 solves arrive with: ${entries[second]}. The other ${100 - share}: ${entries[first]}.`,
    columns: {
      cases: 'cases',
      pictures: 'pictures',
      under: (entry: Entry) => entries[entry],
      mixed: 'mixed prior',
      dealtOnceIn: 'dealt once in',
    },
  },

  list: {
    pageTitle: 'Cases of a step',
    title: (name: string | null) => (name === null ? 'All cases' : `All cases of ${name}`),
    back: 'Ledger',
    caption: 'Cases',
    found: (found: number, all: number) =>
      found === all ? count(all, 'case', 'cases') : `${whole(found)} of ${count(all, 'case', 'cases')}`,
    /** Which of those found stand on this page. */
    part: (from: number, to: number, of: number) =>
      `${whole(from)} to ${whole(to)} of ${whole(of)} on this page`,
    onePage: (found: number) => `All ${whole(found)} on one page`,
    pages: 'Page by page',
    columns: {
      picture: 'picture',
      number: 'number',
      name: 'name',
      group: 'group',
      angles: 'angles',
      prior: 'prior',
      dealtOnceIn: 'dealt once in',
    },
    filters: 'Show',
    anyAngles: 'all angles',
    withAngles: (angles: number) => count(angles, 'angle', 'angles'),
    group: 'Group',
    anyGroup: 'all groups',
    go: 'Show',
    empty: 'No case fits.',
    number: (number: number) => `no. ${number}`,
    onceIn: (solves: string) => `once in ${solves}`,
  },

  csvFile: {
    name: (entry: Entry, told: readonly Aspect[]) =>
      `ledger-${entry.replaceAll('+', '-')}-${told.join('-') || 'nothing'}.csv`,
    broken: 'There is no such file of the Ledger: the address is not right.',
    /** With its set, as the trade writes it: OLL 28. */
    caseName: (set: string | null, name: string) => (set === null ? name : `${set} ${name}`),
    head: [
      'place in this list',
      'name',
      'group',
      'key',
      'angles',
      'full states',
      'prior numerator',
      'prior denominator',
      'dealt once in',
    ],
  },

  /** 24 · 24 / 2; a product of nothing is 1. */
  formula: ({
    factors,
    divisors,
  }: {
    readonly factors: readonly number[];
    readonly divisors: readonly number[];
  }) => {
    const top = times(factors.length === 0 ? [1] : factors.map(whole));
    if (divisors.length === 0) return top;
    return divisors.length === 1 ? `${top} / ${divisors[0]}` : `${top} / (${times(divisors)})`;
  },

  /** The ways to put pieces in as they come about: 4! · 3⁴. */
  powers: (factors: readonly number[]) =>
    times(factors.length === 0 ? [1] : factors.map((factor) => POWERS[factor] ?? whole(factor))),

  problems: {
    entry: (words: readonly string[]) => `entry is one of ${listed(words)}.`,
    aspects: (words: readonly string[]) => `aspects is a list of ${listed(words)}, separated by commas.`,
    share: 'The share is a whole number of per cent from 1 to 99.',
    mixHalf: 'A mix needs both: what some solves arrive with, and the share of solves that do.',
    mixSame: 'The second way to arrive is the same as the first. Choose another.',
  },
} as const;
