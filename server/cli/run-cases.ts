/** The `cases` command as a function: what a case file says, how many cases a step has. Needs no database. */
import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { parseArgs } from 'node:util';
import {
  ASPECTS,
  CASE_SETS,
  type CaseSet,
  caseSet,
  countCases,
  EVERY_ENTRY,
  isAspect,
  isEntry,
  ledgerOf,
  type ReadLine,
  readCaseLines,
} from '#shared/lastlayer/index.ts';
import { findingsText } from '#shared/text/findings.ts';
import { expandAlgorithm } from '../services/intake/expand-algorithm.ts';
import { CaseFileError, readCaseFile } from '../services/intake/read-case-file.ts';

const { command, labels, says } = findingsText;

/** The command was called wrongly, or its file cannot be opened: exit code 2. */
class UsageError extends Error {}

/** Where the command writes, and the folder that relative file names start from. */
export interface Surroundings {
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
  readonly folder: string;
}
type Print = (text: string) => void;
const asJson = (value: unknown): string => JSON.stringify(value, null, 2);

function knownSet(word: string | undefined): CaseSet {
  const names = command.sets(CASE_SETS.map(({ name }) => name));
  if (!word) throw new UsageError(`${command.wanted('--set')} ${names}`);
  if (!CASE_SETS.some(({ key }) => key === word.trim().toLowerCase()))
    throw new UsageError(`${command.unknownSet(word)} ${names}`);
  return caseSet(word);
}

function openFile(folder: string, file: string | undefined): Uint8Array {
  if (!file) throw new UsageError(command.wanted('FILE'));
  try {
    return readFileSync(resolve(folder, file));
  } catch {
    throw new UsageError(command.cannotOpen(file));
  }
}

const present = ({ line, case: name, algorithm, solves, finding, column }: ReadLine) => ({
  line,
  case: name,
  algorithm,
  solves,
  finding,
  ...(column === undefined ? {} : { column }),
});

function sentence(set: CaseSet, row: ReadLine): string {
  const facts = { ...row, known: set.byName(row.case) !== undefined, set: set.definition.name };
  return command.line(row.line, row.case, labels[row.finding], says(facts));
}

/** @returns 0 when every line agrees, 1 when any does not. */
function read(print: Print, bytes: () => Uint8Array, setWord: string | undefined, json: boolean): number {
  const set = knownSet(setWord);
  const { lines, unknownColumns } = readCaseFile(bytes());
  const { rows, covered, of, missing } = readCaseLines(set, lines, expandAlgorithm);
  const agreeing = rows.filter(({ finding }) => finding === 'agrees').length;
  if (json) {
    print(asJson({ set: set.definition.name, rows: rows.map(present), covered, of }));
  } else {
    for (const row of rows) print(sentence(set, row));
    print(command.tally(agreeing, rows.length));
    print(command.covered(set.definition.name, covered, of));
    if (missing.length > 0) print(command.notCovered(missing));
    if (unknownColumns.length > 0) print(command.unknownColumns(unknownColumns));
  }
  return agreeing === rows.length ? 0 : 1;
}

function count(print: Print, entry: string | undefined, list: string | undefined, json: boolean): number {
  const entries = command.entries(EVERY_ENTRY);
  if (!entry) throw new UsageError(`${command.wanted('--entry')} ${entries}`);
  if (!isEntry(entry)) throw new UsageError(`${command.unknownEntry(entry)} ${entries}`);
  const known = command.aspects(ASPECTS);
  if (list === undefined) throw new UsageError(`${command.wanted('--aspects')} ${known}`);
  const aspects = list
    .split(',')
    .map((word) => word.trim())
    .filter((word) => word !== '')
    .map((word) => {
      if (!isAspect(word)) throw new UsageError(`${command.unknownAspect(word)} ${known}`);
      return word;
    });
  const counted = countCases(entry, aspects);
  if (json) {
    print(asJson({ ...counted, ledger: ledgerOf(entry, aspects) }));
  } else {
    print(command.counted(counted.cases, counted.states));
    for (const { weight, cases } of counted.weights) print(command.weight(cases, weight, counted.states));
  }
  return 0;
}

function readArguments(args: string[]) {
  try {
    return parseArgs({
      args,
      allowPositionals: true,
      options: {
        set: { type: 'string' },
        entry: { type: 'string' },
        aspects: { type: 'string' },
        json: { type: 'boolean', default: false },
        help: { type: 'boolean', short: 'h', default: false },
      },
    });
  } catch (error) {
    throw new UsageError(error instanceof Error ? error.message : String(error));
  }
}

function dispatch(args: string[], { out: print, folder }: Surroundings): number {
  const { values, positionals } = readArguments(args);
  if (values.help) {
    print(command.usage);
    return 0;
  }
  const [word, file, ...rest] = positionals;
  if (rest.length > 0) throw new UsageError(command.unknownArgument(rest[0]!));
  if (word === 'read') return read(print, () => openFile(folder, file), values.set, values.json);
  if (word === 'count') {
    if (file !== undefined) throw new UsageError(command.unknownArgument(file));
    return count(print, values.entry, values.aspects, values.json);
  }
  throw new UsageError(word === undefined ? command.wanted('read or count') : command.unknownCommand(word));
}

/**
 * Runs the command.
 * @returns its exit code: 0, 1 when a line does not agree, 2 for wrong use or an unreadable file, which is
 *   explained in a sentence on `err`.
 */
export function runCases(args: string[], surroundings: Surroundings): number {
  try {
    return dispatch(args, surroundings);
  } catch (error) {
    if (error instanceof UsageError) surroundings.err(`${error.message}\n\n${command.usage}`);
    else if (error instanceof CaseFileError) surroundings.err(error.message);
    else throw error;
    return 2;
  }
}
