import type { Difference, Finding } from '../lastlayer/index.ts';

const plural = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;
const listed = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;

/** The nine places of the top, row by row from the back left; the middle one is never told. */
const TOP_PLACES = [
  'back left',
  'back',
  'back right',
  'left',
  'middle',
  'right',
  'front left',
  'front',
  'front right',
];
const SIDE_PLACES = ['at left', 'in the middle', 'at right'];

type RunWord = Extract<Difference, { kind: 'run' }>['shown'];
const RUNS: Readonly<Record<RunWord, string>> = {
  alike: 'has three alike',
  'starts-alike': 'starts with two alike',
  'ends-alike': 'ends in two alike',
  'outer-alike': 'has its outer two alike',
  different: 'has three different',
};

type RelationWord = Extract<Difference, { kind: 'relation' }>['shown'];
const RELATIONS: Readonly<Record<RelationWord, string>> = {
  none: 'has no opposite colours',
  opposite: 'has the odd one opposite in colour',
  neighbour: 'has the odd one of a neighbouring colour',
  'outer-opposite': 'has opposite colours outside',
  'first-opposite': 'starts with opposite colours',
  'last-opposite': 'ends in opposite colours',
};

const topColour = (places: readonly number[]): string =>
  places.length === 0
    ? 'has no top colour'
    : `has the top colour ${listed(places.map((place) => SIDE_PLACES[place]!))}`;

const up = (places: readonly number[]): string => listed(places.map((place) => TOP_PLACES[place]!));

/** Where two pictures differ, in one short sentence without a full stop. */
function differs(at: Difference, shown: string, other: string): string {
  switch (at.kind) {
    case 'up':
      return at.shown.length > 0
        ? `top: ${up(at.shown)} ${at.shown.length === 1 ? 'faces' : 'face'} up in ${shown}, not in ${other}`
        : `top: ${up(at.other)} ${at.other.length === 1 ? 'faces' : 'face'} up in ${other}, not in ${shown}`;
    case 'places':
      return `top: ${up(at.places)} ${at.places.length === 1 ? 'is' : 'are'} of another colour`;
    case 'top-colour':
      return `${at.face} face: ${shown} ${topColour(at.shown)}, ${other} ${topColour(at.other)}`;
    case 'run':
      return `${at.face} face: ${shown} ${RUNS[at.shown]}, ${other} ${RUNS[at.other]}`;
    case 'relation':
      return `${at.face} face: ${shown} ${RELATIONS[at.shown]}, ${other} ${RELATIONS[at.other]}`;
    case 'colours':
      return `${at.face} face: the same pattern in other colours`;
  }
}

/** The facts of a read line that its sentence needs. */
export interface FindingFacts {
  readonly finding: Finding;
  readonly case: string;
  readonly solves: string | null;
  readonly column?: number | null;
  readonly token?: string | null;
  readonly pieces?: readonly string[];
  readonly sameAs?: number;
  /** Whether `case` is a name of the set. */
  readonly known?: boolean;
  readonly set: string;
}

const solved = (name: string | null, set: string): string =>
  name === 'skip' ? 'leaves a solved cube as it is' : `solves ${set} ${name ?? ''}`.trim();

/** What was found on a line, in a sentence. */
function says(row: FindingFacts): string {
  switch (row.finding) {
    case 'agrees':
      return `Solves ${row.set} ${row.solves ?? row.case}, as the line says.`;
    case 'solves-other':
      return row.known === false
        ? `${row.set} has no case called ${row.case}; the algorithm ${solved(row.solves, row.set)}.`
        : `Says ${row.case}, but the algorithm ${solved(row.solves, row.set)}.`;
    case 'first-two-layers-broken':
      return row.pieces && row.pieces.length > 0
        ? `Breaks the first two layers: ${row.pieces.length > 4 ? `${row.pieces.slice(0, 4).join(', ')} and more` : listed(row.pieces)} out of place.`
        : 'Breaks the first two layers.';
    case 'not-a-move':
      return row.token
        ? `${row.token} is not a move (character ${row.column ?? '?'}).`
        : `The algorithm cannot be read from character ${row.column ?? '?'} on.`;
    case 'duplicate':
      return row.sameAs === undefined
        ? 'The same algorithm as an earlier line.'
        : `The same algorithm as line ${row.sameAs}.`;
    case 'not-in-set':
      return `Keeps the first two layers, but solves no case of ${row.set}: it undoes what is done before this step.`;
    case 'missing-field':
      return row.case === '' ? 'The case is missing.' : 'The algorithm is missing.';
  }
}

/** What can be done about it. */
const HINTS: Readonly<Record<Finding, string>> = {
  agrees: '',
  'solves-other': 'Take it for the case it solves, correct the line, or drop it.',
  'first-two-layers-broken': 'Correct the algorithm or drop the line.',
  'not-a-move': 'Correct the algorithm or drop the line.',
  duplicate: 'Drop the line, or put another algorithm there.',
  'not-in-set': 'Drop the line, or bring it in with the set it belongs to.',
  'missing-field': 'Fill in what is missing or drop the line.',
};

/** Short labels for lists and tallies. */
const LABELS: Readonly<Record<Finding, string>> = {
  agrees: 'Agrees',
  'solves-other': 'Solves another case',
  'first-two-layers-broken': 'Breaks the first two layers',
  'not-a-move': 'Not a move',
  duplicate: 'Duplicate',
  'not-in-set': 'Not in this set',
  'missing-field': 'Field missing',
};

/** Why a case file cannot be read at all. */
const fileErrors = {
  empty: 'The file is empty.',
  notText: 'The file is not text. Save it as CSV.',
  tooLarge: (megabytes: number) => `The file is larger than ${megabytes} MB.`,
  tooManyLines: (lines: number) => `The file has more than ${lines} lines.`,
  noHeader: 'The first line must name the columns: case and algorithm, and if wanted group and note.',
  columnTwice: (name: string) => `The header names the column ${name} twice.`,
  quoteOpen: (line: number) => `Line ${line}: a quotation mark is opened and never closed.`,
  quoteInside: (line: number) =>
    `Line ${line}: a quotation mark in the middle of a field. Put the field in quotation marks and double the inner ones.`,
  tooManyFields: (line: number) =>
    `Line ${line} has more fields than the header. Put quotation marks round a field that holds a separator.`,
  unreadable: (line: number) => `Line ${line} cannot be read as CSV.`,
};

/** The `cases` command. */
const command = {
  usage: [
    'Usage:',
    '  npm run -s cases -- read FILE --set SET [--json]',
    '  npm run -s cases -- count --entry ENTRY --aspects ASPECTS [--json]',
    '',
    'read   says of every line of a case file what its algorithm solves.',
    '       Exit code 0 when every line agrees, 1 when one does not, 2 when the file cannot be read.',
    'count  says how many cases a step has, skip included, and how many of each weight;',
    '       with --json the whole page of the Ledger too.',
  ].join('\n'),
  sets: (names: readonly string[]) => `SET is one of ${names.join(', ')}.`,
  entries: (words: readonly string[]) => `ENTRY is one of ${words.join(', ')}.`,
  aspects: (words: readonly string[]) => `ASPECTS is a list of ${words.join(', ')}, separated by commas.`,
  unknownArgument: (word: string) => `"${word}" is one word too many.`,
  unknownCommand: (word: string) => `There is no command "${word}".`,
  unknownSet: (word: string) => `There is no set "${word}".`,
  unknownEntry: (word: string) => `There is no entry condition "${word}".`,
  unknownAspect: (word: string) => `There is no aspect "${word}".`,
  wanted: (what: string) => `${what} is missing.`,
  cannotOpen: (file: string) => `The file ${file} cannot be opened.`,
  covered: (set: string, covered: number, of: number) => `${set}: ${covered} of ${of} cases covered.`,
  notCovered: (names: readonly string[]) => `Not covered: ${names.join(', ')}.`,
  tally: (agreeing: number, lines: number) => `${agreeing} of ${plural(lines, 'line', 'lines')} agree.`,
  unknownColumns: (names: readonly string[]) => `Columns not used: ${names.join(', ')}.`,
  line: (line: number, name: string, label: string, sentence: string) =>
    `line ${String(line).padStart(4)}  ${name.padEnd(6)}  ${label.padEnd(27)}  ${sentence}`.trimEnd(),
  counted: (cases: number, states: number) =>
    `${plural(cases, 'case', 'cases')}, skip included, in ${plural(states, 'entry state', 'entry states')}.`,
  weight: (cases: number, weight: number, states: number) =>
    `${String(cases).padStart(6)} of weight ${String(weight).padStart(6)}  (prior ${weight}/${states})`,
};

/** Said where two pictures differ in nothing the seat shows. */
const differsOutOfView = 'they differ only on the sides that are turned away';

export const findingsText = {
  differsOutOfView,
  differs,
  says,
  hint: (finding: Finding) => HINTS[finding],
  labels: LABELS,
  fileErrors,
  command,
};
