import { aufText } from './auf.ts';
import { numberText } from './numbers.ts';

const { count, fraction, whole } = numberText;

interface Turns {
  readonly before: number;
  readonly after: number;
}

/** One turn of a symmetry: before, after, or both. */
function turns({ before, after }: Turns): string {
  return [
    before === 0 ? '' : `${aufText.name(before)} before`,
    after === 0 ? '' : `${aufText.name(after)} after`,
  ]
    .filter(Boolean)
    .join(' with ');
}

/** Words of the Catalogue's page of a case. */
export const catalogueCaseText = {
  title: 'Case',
  missing: 'There is no such case in that set.',
  name: (set: string, name: string) => `${set} ${name}`,
  alias: (alias: string) => `called ${alias} here`,
  skip: 'The solved case: a solve that is dealt it skips this step. It needs no algorithm.',
  previous: (name: string) => `Previous: ${name}`,
  next: (name: string) => `Next: ${name}`,
  neighbours: 'Neighbouring cases',
  fraction,
  prior: (weight: number, total: number) => `prior; weight ${whole(weight)} of ${whole(total)}`,
  solves: ({ weight, total }: { weight: number; total: number }) =>
    `${(total / weight).toLocaleString('en-GB', { maximumFractionDigits: 2 })} solves`,
  dealtOnceIn: 'dealt once in',
  angles: (n: number) => (n === 1 ? 'angle' : 'angles'),
  number: (n: number) => `number ${whole(n)} of its set`,

  views: {
    title: 'Angles',
    view: (n: number) => `View ${n}`,
    auf: (right: readonly number[]) =>
      right.length === 1 && right[0] === 0 ? 'no AUF' : `AUF ${aufText.anyOf(right)}`,
    note: (n: number, algorithm: boolean) => {
      const from = algorithm ? 'The first is how the first algorithm takes it. ' : '';
      return n === 1
        ? `${from}It looks the same from all sides.`
        : `${from}Each next one is a turn U further.`;
    },
  },

  symmetry: {
    title: 'Symmetry',
    /** By number of angles. */
    words: (angles: number) =>
      angles === 4
        ? 'None: it looks different from all four sides.'
        : angles === 2
          ? 'Half a turn: opposite sides look the same.'
          : 'A quarter turn: all four sides look the same.',
    /** Turns that leave the case as it is, the one that does nothing left out. */
    turns: (list: readonly Turns[]) => {
      const befores = [...new Set(list.map(({ before }) => before))];
      // Where no permutation is seen, a turn after it changes nothing at all.
      const seen = list.length < befores.length * 4;
      const said = (seen ? list : befores.map((before) => ({ before, after: 0 }))).map(turns).filter(Boolean);
      return said.length === 0 ? '' : `It stays as it is under ${said.join('; ')}.`;
    },
  },

  algorithms: {
    title: 'Algorithms',
    caption: 'Algorithms of the case, the one shown first on top',
    none: 'None yet. An edition with one comes through Intake.',
    noneForSkip: 'None is needed.',
    algorithm: 'algorithm',
    counts: { htm: 'HTM', qtm: 'QTM', stm: 'STM', etm: 'ETM' },
    countsMean: {
      htm: 'half turns',
      qtm: 'quarter turns',
      stm: 'slice turns',
      etm: 'all that the hands do, rotations too',
    },
    auf: (view: number) => `AUF, view\u00a0${view}`,
    edition: (n: number) => `As in edition ${n}`,
  },

  relations: {
    title: 'Related cases',
    mirror: 'mirror',
    inverse: 'inverse',
    mirrorInverse: 'mirror of the inverse',
    orientation: 'orientation',
    permutation: 'permutation',
    itself: 'itself',
    oriented: 'nothing to orient',
    permuted: 'nothing to permute',
    notDefined: 'not defined here',
    /** Said of a case that has to be oriented first. */
    otherPermutation:
      'The permutation is that of the pieces as they lie. OLL algorithms permute pieces too, so the PLL that two looks leave can be another.',
    whyNot: 'The set tells how pieces are turned but not where they come from.',
  },

  twoLook: {
    title: 'In two looks',
    note: (direct: number | null) =>
      direct === null
        ? 'From view 1, with the newest editions of OLL and PLL. Slice turns, AUFs among them.'
        : `From view 1, with the newest editions of OLL and PLL. Slice turns, AUFs among them; in one look ${direct}.`,
    none: 'The newest editions of OLL and PLL have no algorithms for it.',
    moves: (n: number) => `${n} STM`,
    auf: (n: number) => `AUF ${aufText.name(n)}`,
    lastAuf: (n: number) => `then AUF ${aufText.name(n)}`,
    nothing: 'nothing is left to permute',
  },

  changes: {
    title: 'Changes',
    none: 'No edition has had an algorithm for it.',
    edition: (n: number) => `edition ${n}`,
    added: (n: number) => `${count(n, 'algorithm', 'algorithms')} added`,
    removed: (n: number) => `${count(n, 'algorithm', 'algorithms')} taken out`,
    reordered: 'put in another order',
  },
} as const;
