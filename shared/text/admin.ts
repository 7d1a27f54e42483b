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
};

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

/** A prior as one in how many: whole where it is, else with two decimals at most. */
function oneIn({ weight, total }: { weight: number; total: number }): string {
  return `1 in ${(total / weight).toLocaleString('en-GB', { maximumFractionDigits: 2 })}`;
}

/** Words of the administrator's places other than Intake. */
export const adminText = {
  oneIn,
  sortBy: 'sort by',
  pages: {
    label: 'Pages',
    at: (page: number, of: number) => `Page ${page} of ${of}`,
    previous: 'Previous',
    next: 'Next',
  },
  catalogue: {
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
    entry: (entry: string) => ENTRIES[entry] ?? entry,
    aspects,
    cases: (n: number) => count(n, 'case', 'cases'),
    edition: (number: number) => `edition ${number}`,
    editionSize: (cases: number, algorithms: number) =>
      `${count(cases, 'case', 'cases')}, ${count(algorithms, 'algorithm', 'algorithms')}`,
    earlier: 'earlier',
    noEdition: 'no edition yet',
    toIntake: 'Bring in a file',
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
