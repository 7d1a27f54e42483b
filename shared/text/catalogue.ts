import { numberText } from './numbers.ts';

const { count } = numberText;

/** Entry conditions in words. */
const ENTRIES: Readonly<Record<string, string>> = {
  any: 'any last layer',
  eo: 'edges oriented',
  co: 'corners oriented',
  'co+eo': 'corners and edges oriented',
  corners: 'corners solved',
  'corners+eo': 'corners solved, edges oriented',
  cp: 'corners permuted',
  'cp+eo': 'corners permuted, edges oriented',
  ep: 'edges permuted',
  'co+ep': 'corners oriented, edges permuted',
  edges: 'edges solved',
  'co+edges': 'edges solved, corners oriented',
  'cp+ep': 'corners and edges permuted',
  'corners+ep': 'corners solved, edges permuted',
  'cp+edges': 'edges solved, corners permuted',
};

const entryWords = (entry: string): string => ENTRIES[entry] ?? entry;

/** Aspects in words: orientation before permutation, each with its pieces. */
function aspects(list: readonly string[]): string {
  if (list.length === 4) return 'everything';
  const of = (corners: string, edges: string): string =>
    [list.includes(corners) ? 'corners' : '', list.includes(edges) ? 'edges' : '']
      .filter(Boolean)
      .join(' and ');
  const orientation = of('co', 'eo');
  const permutation = of('cp', 'ep');
  if (orientation === permutation) return `orientation and permutation of ${orientation}`;
  return [
    orientation ? `orientation of ${orientation}` : '',
    permutation ? `permutation of ${permutation}` : '',
  ]
    .filter(Boolean)
    .join(', ');
}

/** Words of the Catalogue. */
export const catalogueText = {
  sets: {
    title: 'Catalogue',
    lead: 'Case sets, what each tells apart and solves, and the editions published of them.',
    caption: 'Case sets',
    columns: {
      set: 'set',
      entry: 'reached with',
      toldApart: 'told apart',
      solved: 'solved',
      cases: 'cases',
      editions: 'editions',
    },
    entry: entryWords,
    /** A single entry, or the parts of a mix: `2 of 5 edges oriented, 3 of 5 any last layer`. */
    entryOrMix: (entry: string, mix: readonly { readonly entry: string; readonly parts: number }[]) => {
      const all = mix.reduce((sum, { parts }) => sum + parts, 0);
      if (all === 0) return entryWords(entry);
      return mix.map((one) => `${one.parts} of ${all} ${entryWords(one.entry)}`).join(', ');
    },
    ofClub: (setKey: string | null) => (setKey === null ? 'a club’s own' : `a club’s own, key ${setKey}`),
    retired: (name: string) => `“${name}” is retired`,
    madeOf: (name: string) => `from ${name}`,
    csv: 'Sets, CSV',
    csvFile: 'case-sets.csv',
    csvColumns: [
      'set',
      'reached with',
      'told apart',
      'solved',
      'cases',
      'newest edition',
      'cases in it',
      'algorithms in it',
    ],
    aspects,
    cases: (n: number) => count(n, 'case', 'cases'),
    edition: (number: number) => `edition ${number}`,
    editionSize: (cases: number, algorithms: number) =>
      `${count(cases, 'case', 'cases')}, ${count(algorithms, 'algorithm', 'algorithms')}`,
    earlier: 'earlier',
    noEdition: 'no edition yet',
    toIntake: 'Bring in a file',
  },
  set: {
    title: 'Case set',
    lead: (entry: string, toldApart: string, solved: string) =>
      `Reached with ${entry}. Told apart: ${toldApart}. Solved: ${solved}.`,
    casesOf: (cases: number, of: number) =>
      cases === of
        ? 'Its cases are those of'
        : `${numberText.whole(cases)} of the ${numberText.whole(of)} cases of`,
    key: (setKey: string) => `Key ${setKey}: name it to the administrator who brings in its algorithms.`,
    keyOnly: (setKey: string) => `A club’s own, key ${setKey}.`,
    /** Before the day, and after it. */
    retired: 'Retired on',
    retiredDetail: 'it cannot be put on a programme any more.',
    cases: (n: number) => (n === 1 ? 'case beside the skip' : 'cases beside the skip'),
    skip: 'solves skip it',
    withAlgorithm: (n: number, of: number) => (n === of ? 'all' : `${numberText.whole(n)}`),
    withAlgorithmLabel: 'with an algorithm',
    sheet: 'Algorithm sheet',
    csv: 'Cases, CSV',
    csvFile: (setKey: string) => `${setKey}-cases.csv`,
    csvColumns: ['number', 'case', 'alias', 'group', 'angles', 'weight', 'of', 'algorithms'],
    csvFailed: 'The file could not be made. Try again.',
    noEdition: 'No edition is published yet: the cases are there, algorithms are not.',
    showIn: 'shown in edition',
    find: 'Find',
    findHint: 'name, number or moves',
    group: 'Group',
    allGroups: 'all groups',
    angles: 'Angles',
    anyAngles: 'any',
    algorithms: 'Algorithms',
    anyAlgorithms: 'with or without',
    with: 'with',
    without: 'without',
    choice: (name: string, cases: number) => `${name} (${numberText.whole(cases)})`,
    show: 'Show',
    shown: (from: number, to: number, found: number, all: number) => {
      const of =
        found === all
          ? numberText.whole(all)
          : `${numberText.whole(found)} found among ${numberText.whole(all)}`;
      if (found === 0) return `None of ${numberText.whole(all)}`;
      return to - from + 1 === found
        ? `${of} ${all === 1 ? 'case' : 'cases'}`
        : `${numberText.whole(from)} to ${numberText.whole(to)} of ${of} cases`;
    },
    caption: 'Cases of the set',
    columns: {
      picture: 'picture',
      name: 'case',
      number: 'number',
      group: 'group',
      prior: 'prior',
      angles: 'angles',
      algorithm: 'algorithm',
    },
    noGroup: '–',
    noAlgorithm: 'none yet',
    more: (n: number) => `and ${n} more`,
    none: 'No case fits.',
    showAll: 'Show all',
    pages: 'Pages',
    previous: 'Previous page',
    next: 'Next page',
  },
  edition: {
    title: (set: string, number: number) => `${set}, edition ${number}`,
    loading: 'Reading the edition',
    cannotLoad: 'The edition could not be loaded',
    published: 'Published',
    newest: 'The newest edition.',
    notNewest: (newest: number) => `Edition ${newest} is the newest.`,
    others: 'Editions',
    number: (number: number) => String(number),
    numbers: {
      cases: (n: number, of: number) => `${n} of ${of}`,
      casesLabel: 'cases',
      algorithms: (n: number) => (n === 1 ? 'algorithm' : 'algorithms'),
      missing: (names: readonly string[]) =>
        names.length <= 6 ? `; without ${names.join(', ')}` : `; ${names.length} are not in it`,
    },
    csv: 'Edition, CSV',
    csvFile: (setKey: string, number: number) => `${setKey}-edition-${number}.csv`,
    csvColumns: ['case', 'algorithm', 'group', 'note'],
    filter: 'Show cases with',
    filterHint: 'name, group, algorithm or note',
    clear: 'Clear',
    shown: (shown: number, of: number) =>
      shown === of ? count(of, 'case', 'cases') : `${shown} of ${count(of, 'case', 'cases')}`,
    none: (words: string) => `No case has “${words}” in its name, group, algorithms or notes.`,
    caption: 'Cases of the edition',
    columns: {
      picture: 'picture',
      name: 'case',
      group: 'group',
      prior: 'prior',
      angles: 'angles',
      algorithms: 'algorithms',
    },
    angles: (n: number) => count(n, 'angle', 'angles'),
    noGroup: '–',
  },
} as const;
