import type { FindingName } from '../contracts/intake.ts';
import { numberText } from './numbers.ts';

const { count } = numberText;
/** Thousands apart, as in print. */
const grouped = (n: number): string => n.toLocaleString('en-GB');
const listed = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
/** Primes as they are printed. */
const printed = (moves: string): string => moves.replaceAll("'", '′');
const shortened = (text: string, most: number): string =>
  text.length > most ? `${text.slice(0, most)}…` : text;

const SIDES: Readonly<Record<string, string>> = {
  U: 'top',
  D: 'bottom',
  F: 'front',
  B: 'back',
  L: 'left',
  R: 'right',
};
const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten'];

/** `FR` is the front-right edge, `DFR` the front-right corner (below it). */
function pieceName(piece: string): string {
  const corner = piece.length === 3;
  const sides = Array.from(corner ? piece.slice(1) : piece, (face) => SIDES[face] ?? face);
  return `the ${sides.join('-')} ${corner ? 'corner' : 'edge'}`;
}

/** Which pieces of the first two layers are out of place, in few words. */
function brokenPieces(pieces: readonly string[]): string {
  const [corner, edge] = pieces;
  if (pieces.length === 2 && corner?.length === 3 && corner.slice(1) === edge) {
    return `${pieceName(edge).replace(/ edge$/u, '')} pair`;
  }
  if (pieces.length <= 2) return listed(pieces.map(pieceName));
  return `${NUMBERS[pieces.length] ?? String(pieces.length)} pieces`;
}

/** The facts of a line that its sentences need. */
export interface LineFacts {
  readonly finding: FindingName;
  readonly setName: string;
  readonly caseName: string;
  readonly algorithm: string;
  /** Whether the set has a case of that name. */
  readonly known: boolean;
  readonly solves: string | null;
  readonly angles: number | null;
  readonly column: number | null;
  readonly token: string | null;
  readonly pieces: readonly string[];
  readonly sameAs: number | null;
}

/** What was found, as the heading of a line. */
function says(line: LineFacts): string {
  switch (line.finding) {
    case 'agrees':
      return 'Agrees';
    case 'solves-other':
      if (line.solves === 'skip') return 'Solves nothing: it leaves the case as it is';
      return `Solves ${line.solves}, the file says ${line.caseName}`;
    case 'first-two-layers-broken':
      return 'Breaks the first two layers';
    case 'not-a-move':
      return line.token
        ? `${shortened(printed(line.token), 20)} is not a move`
        : 'Too long for a last-layer algorithm';
    case 'duplicate':
      return line.sameAs === null ? 'The same as an earlier line' : `The same as line ${line.sameAs}`;
    case 'not-in-set':
      return `Solves no case of ${line.setName}`;
    case 'missing-field':
      return line.caseName === '' && line.algorithm === ''
        ? 'Case and algorithm are missing'
        : line.caseName === ''
          ? 'The case is missing'
          : 'The algorithm is missing';
  }
}

/** What there is to know beside it. */
function hint(line: LineFacts): string {
  switch (line.finding) {
    case 'agrees':
      return line.angles === null ? '' : count(line.angles, 'angle', 'angles');
    case 'solves-other':
      return line.known ? '' : `${line.setName} has no case called ${line.caseName}`;
    case 'first-two-layers-broken':
      return line.pieces.length > 0 ? brokenPieces(line.pieces) : '';
    case 'not-a-move':
      return line.column === null ? '' : `character ${line.column}`;
    case 'duplicate':
      return 'after cancelling and normalising';
    case 'not-in-set':
      return 'it undoes what is done before this step';
    case 'missing-field':
      return line.caseName === '' && line.solves !== null && line.solves !== 'skip'
        ? `the algorithm solves ${line.solves}`
        : '';
  }
}

/** Sentences of refusals. */
const problems = {
  noSet: 'There is no such set.',
  noEditions: (name: string) =>
    `${name} takes its algorithms from another set. Bring the file in for that one.`,
  noDraft: 'There is no such draft.',
  noLine: (line: number) => `The draft has no line ${line}.`,
  noLines: 'The file names its columns, but no line follows.',
  tooLong: (line: number, field: string, most: number) =>
    `Line ${line}: the ${field} is longer than ${most} characters.`,
  control: 'Control characters cannot be taken.',
  stale: 'The draft was changed meanwhile, or another edition of its set was published.',
  published: (edition: number) => `The draft was published already, as edition ${edition}.`,
  discarded: 'The draft was discarded already.',
  cannotTake: (line: number) =>
    `Line ${line} cannot be taken as it is: its algorithm does not solve another case of the set.`,
  blocked: (lines: number) =>
    `${count(lines, 'line is', 'lines are')} still to settle. Take, correct or drop ${lines === 1 ? 'it' : 'them'} first.`,
  nothing: 'Nothing would be published: every line is dropped.',
  tooMany: (name: string, algorithms: number, most: number) =>
    `${name} would have ${algorithms} algorithms; a case can have ${most}.`,
} as const;

const list = {
  title: 'Intake',
  lead: 'Bring in algorithms from a file. Every one is turned on a solved cube and read back before it goes in.',
  loading: 'Reading the drafts',
  cannotLoad: 'The drafts could not be loaded',
  form: 'Bring in a file',
  set: 'Set',
  chooseSet: 'Choose the set',
  setOption: (name: string, cases: number, newest: number | null) =>
    `${name}: ${count(cases, 'case', 'cases')}, ${newest === null ? 'no edition yet' : `edition ${newest}`}`,
  file: 'File',
  fileHint:
    'CSV with the columns case and algorithm, and if wanted group and note; at most 5 MB and 50,000 lines.',
  send: 'Read the file',
  noSetChosen: 'Choose the set the file is for.',
  noFile: 'Choose a file.',
  tooLarge: 'The file is larger than 5 MB.',
  unreadable: 'The browser could not read the file. Choose it again.',
  formErrors: 'The file was not taken',
  reading: 'Reading the file',
  sending: 'Sending it and turning every algorithm on the cube',
  drafts: 'Open drafts',
  draftsCaption: 'Open drafts',
  earlier: 'Earlier files',
  earlierCaption: 'Files published or discarded',
  noDrafts: 'No draft is open',
  noDraftsHint: 'A file you bring in waits here until its lines are settled and you publish it.',
  fileName: 'file',
  setColumn: 'set',
  lines: 'lines',
  broughtIn: 'brought in',
  outcome: 'outcome',
  published: (edition: number) => `edition ${edition}`,
  discarded: 'discarded',
} as const;

/** What a step does to a line. */
const DONE = { take: 'taken', drop: 'dropped', none: 'taken back', edit: 'changed' } as const;

const draft = {
  loading: 'Turning every algorithm on the cube',
  cannotLoad: 'The draft could not be loaded',
  back: 'All drafts',
  lead: (set: string, newest: number | null) =>
    newest === null
      ? `${set}, to become its first edition. Every algorithm was turned on a solved cube and read back.`
      : `${set}, to merge into edition ${newest}. Every algorithm was turned on a solved cube and read back.`,
  leadPublished: (set: string, edition: number) => `${set}, published as edition ${edition}.`,
  leadDiscarded: (set: string) => `${set}, discarded. Nothing of it was published.`,
  unknownColumns: (names: readonly string[]) =>
    `Not read: ${names.length === 1 ? 'the column' : 'the columns'} ${listed(names)}.`,
  numbers: {
    lines: (n: number) => (n === 1 ? 'line' : 'lines'),
    covered: (covered: number, of: number) => `${grouped(covered)} of ${grouped(of)}`,
    coveredLabel: 'cases covered',
    stay: (names: readonly string[], edition: number) =>
      names.length === 0
        ? ''
        : names.length <= 4
          ? `; ${listed(names)} ${names.length === 1 ? 'stays' : 'stay'} as in edition ${edition}`
          : `; ${grouped(names.length)} stay as in edition ${edition}`,
    without: (names: readonly string[]) =>
      names.length === 0
        ? ''
        : names.length <= 4
          ? `; ${listed(names)} ${names.length === 1 ? 'has' : 'have'} no algorithm yet`
          : `; ${grouped(names.length)} have no algorithm yet`,
    cannot: 'cannot go in',
    decide: 'to decide',
    dropped: 'dropped',
  },
  report: 'Report, CSV',
  reportFile: (fileName: string) => `report-${fileName.replace(/\.[^.]*$/u, '')}.csv`,
  reportColumns: [
    'line',
    'case',
    'algorithm',
    'group',
    'solves',
    'finding',
    'column',
    'says',
    'standing',
    'note',
  ],
  standings: { fine: 'goes in', decide: 'to decide', cannot: 'cannot go in', out: 'dropped' },
  discard: 'Discard',
  publish: 'Publish',
  publishBlocked: (lines: number) => `Publish: ${count(lines, 'line', 'lines')} to settle`,
  publishNothing: 'Publish: every line is dropped',
  filters: { all: 'All', settle: 'To settle', cannot: 'Cannot go in', fine: 'Goes in', dropped: 'Dropped' },
  filterLabel: 'Lines shown',
  pages: (page: number, of: number) => `Page ${page} of ${of}`,
  pagesLabel: 'Pages of lines',
  previous: 'Previous',
  next: 'Next',
  caption: 'Lines of the file',
  columns: {
    line: 'line',
    picture: 'picture',
    case: 'case',
    algorithm: 'algorithm',
    solves: 'solves',
    prior: 'prior',
    finding: 'finding',
  },
  lineNumber: (line: number) => `line ${line}`,
  none: '–',
  noLines: {
    all: 'The file has no lines.',
    settle: 'Nothing is left to settle.',
    cannot: 'No line is kept out.',
    fine: 'No line goes in yet.',
    dropped: 'No line is dropped.',
  },
  take: (name: string) => `take as ${name}`,
  edit: 'edit',
  drop: 'drop',
  takeBack: 'take back',
  save: 'Save',
  cancel: 'Cancel',
  busy: 'Turning it on the cube',
  forLine: (action: string, line: number) => `${action}, line ${line}`,
  editCase: (line: number) => `Case, line ${line}`,
  editAlgorithm: (line: number) => `Algorithm, line ${line}`,
  taken: (name: string) => `Taken as ${name}`,
  takenHint: (name: string) => `the file says ${name}`,
  dropped: 'Dropped',
  fileSaid: (words: string) => `the file said ${words}`,
  fileSaidNothing: 'nothing stood there in the file',
  settled: (line: number, step: keyof typeof DONE, left: number) =>
    `Line ${line} is ${DONE[step]}. ${left === 0 ? 'Nothing is left to settle.' : `${count(left, 'line is', 'lines are')} left to settle.`}`,
  stale: {
    title: 'Someone else was quicker',
    detail: 'It was read again. Your last step was not written.',
  },
  refused: 'That was not written',
  publishDialog: {
    title: (set: string, edition: number) => `Publish ${set}, edition ${edition}?`,
    effects: (
      effect: { newCases: number; newAlgorithms: number; keptCases: number; alreadyThere: number },
      newest: number | null,
    ): string[] =>
      newest === null
        ? [
            `${count(effect.newCases, 'case', 'cases')} with ${count(effect.newAlgorithms, 'algorithm', 'algorithms')}.`,
          ]
        : [
            effect.newAlgorithms === 0
              ? `Nothing that edition ${newest} does not have.`
              : `New beside edition ${newest}: ${count(effect.newAlgorithms, 'algorithm', 'algorithms')}${effect.newCases === 0 ? '' : `, among them of ${count(effect.newCases, 'case', 'cases')} it lacks`}.`,
            ...(effect.alreadyThere === 0
              ? []
              : [
                  `Already there: ${count(effect.alreadyThere, 'algorithm', 'algorithms')}, put first in the order of the file.`,
                ]),
            ...(effect.keptCases === 0
              ? []
              : [
                  `As ${effect.keptCases === 1 ? 'it is' : 'they are'}: ${count(effect.keptCases, 'case', 'cases')} the file has no line for.`,
                ]),
          ],
    final: 'An edition cannot be changed. Clubs that follow the newest edition train with it from now on.',
    note: 'Note',
    noteHint: 'What is new, for whoever reads the list of editions.',
    confirm: 'Publish',
    cancel: 'Not yet',
  },
  discardDialog: {
    title: (fileName: string) => `Discard ${fileName}?`,
    detail: 'What was settled here is lost with it. The file itself is kept among the earlier files.',
    confirm: 'Discard',
    cancel: 'Keep it',
  },
  publishedNotice: (set: string, edition: number) => `${set}, edition ${edition} is published.`,
  openEdition: 'Open the edition',
} as const;

/** A club's own set, with its key: two clubs may have one of the same name. As the administrator's lists name it. */
const ofAClub = (name: string, setKey: string) => `${name} (a club’s own, key ${setKey})`;

export const intakeText = { ofAClub, says, hint, printed, grouped, problems, list, draft } as const;
