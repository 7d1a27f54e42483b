import { type CsvError, parse } from 'csv-parse/sync';
import type { CaseLine } from '#shared/lastlayer/index.ts';
import { findingsText } from '#shared/text/findings.ts';

const MEGABYTE = 1_000_000;
export const LARGEST_CASE_FILE_MB = 5;
export const MOST_CASE_FILE_LINES = 50_000;

/** The file cannot be read as a case file. The message is a sentence for the person who brought it. */
export class CaseFileError extends Error {
  constructor(
    message: string,
    /** Physical line from 1, where the trouble has one. */
    readonly line: number | null = null,
  ) {
    super(message);
    this.name = 'CaseFileError';
  }
}

export interface CaseFile {
  /** The data lines, fields trimmed, in file order. */
  readonly lines: readonly Required<CaseLine>[];
  /** Header names that mean nothing here, as written. */
  readonly unknownColumns: readonly string[];
}

const COLUMNS = ['case', 'algorithm', 'group', 'note'] as const;
type Column = (typeof COLUMNS)[number];
const SEPARATORS = [',', ';', '\t'] as const;
const { fileErrors } = findingsText;

/** What Windows-1252 has at 0x80 to 0x9f, typographic primes among it; Node decodes those as Latin-1. */
const WINDOWS_1252 = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';
const decodeWindows = (bytes: Uint8Array): string =>
  Buffer.from(bytes)
    .toString('latin1')
    .replace(/[\u0080-\u009f]/gu, (char) => WINDOWS_1252[char.charCodeAt(0) - 0x80]!);

/** Bytes to text: UTF-8, UTF-16 with its mark, or what older spreadsheets save. Line ends become \n. */
function decode(bytes: Uint8Array): string {
  const [first, second] = bytes;
  const utf16 =
    first === 0xff && second === 0xfe ? 'utf-16le' : first === 0xfe && second === 0xff ? 'utf-16be' : null;
  let text: string;
  try {
    text = new TextDecoder(utf16 ?? 'utf-8', { fatal: true }).decode(bytes);
  } catch {
    if (utf16) throw new CaseFileError(fileErrors.notText);
    text = decodeWindows(bytes);
  }
  if (text.includes('\0')) throw new CaseFileError(fileErrors.notText);
  return text.replace(/\r\n?/gu, '\n');
}

const normalName = (header: string): string => header.trim().toLowerCase();
const isColumn = (name: string): name is Column => (COLUMNS as readonly string[]).includes(name);

interface Row {
  readonly line: number;
  readonly fields: readonly string[];
}

const MISPLACED_QUOTE = new Set<string>([
  'INVALID_OPENING_QUOTE',
  'CSV_INVALID_CLOSING_QUOTE',
  'CSV_NON_TRIMABLE_CHAR_AFTER_CLOSING_QUOTE',
]);

/** Why csv-parse gave up, by its error codes. */
function asCaseFileError(error: CsvError, line: number): CaseFileError {
  if (error.code === 'CSV_QUOTE_NOT_CLOSED') return new CaseFileError(fileErrors.quoteOpen(line), line);
  if (MISPLACED_QUOTE.has(error.code)) return new CaseFileError(fileErrors.quoteInside(line), line);
  return new CaseFileError(fileErrors.unreadable(line), line);
}

/** RFC 4180 rows that are not blank, each with the physical line on which it begins. */
function rowsOf(text: string, separator: string, most: number): Row[] {
  const rows: Row[] = [];
  let lastLine = 0;
  try {
    parse(text, {
      delimiter: separator,
      record_delimiter: '\n',
      ltrim: separator !== '\t',
      rtrim: separator !== '\t',
      relax_column_count: true,
      to: most,
      on_record: (fields: string[], { lines }) => {
        const trimmed = fields.map((field) => field.trim());
        if (trimmed.length > 1 || trimmed[0] !== '') rows.push({ line: lastLine + 1, fields: trimmed });
        lastLine = lines;
        return null;
      },
    });
  } catch (error) {
    if (!(error instanceof Error) || !('code' in error)) throw error;
    throw asCaseFileError(error as CsvError, lastLine + 1);
  }
  return rows;
}

/** The separator under which the first line that is not blank names the two columns that must be there. */
function separatorOf(text: string): string {
  const start = text.search(/\S/u);
  const header = text.slice(start, `${text}\n`.indexOf('\n', start));
  for (const separator of SEPARATORS) {
    const names = header.split(separator).map((field) => normalName(field.replaceAll('"', '')));
    if (names.includes('case') && names.includes('algorithm')) return separator;
  }
  throw new CaseFileError(fileErrors.noHeader, 1);
}

/** Where each known column stands; what else the header names. */
function readHeader(header: Row): { at: Partial<Record<Column, number>>; unknown: string[] } {
  const at: Partial<Record<Column, number>> = {};
  const unknown: string[] = [];
  header.fields.forEach((field, place) => {
    const name = normalName(field);
    if (!isColumn(name)) {
      if (name !== '') unknown.push(field);
    } else if (at[name] !== undefined) {
      throw new CaseFileError(fileErrors.columnTwice(name), header.line);
    } else {
      at[name] = place;
    }
  });
  return { at, unknown };
}

/**
 * Reads a case file: RFC 4180 with a header naming `case` and `algorithm`, and if wanted `group` and `note`,
 * in any order and case; comma, semicolon or tab between fields. Blank lines are passed over; a row that has
 * separators and nothing else is a line with missing fields.
 * @throws CaseFileError if it is over 5 MB or 50,000 lines, is not text, lacks the header, or is no CSV.
 */
export function readCaseFile(bytes: Uint8Array): CaseFile {
  if (bytes.byteLength > LARGEST_CASE_FILE_MB * MEGABYTE)
    throw new CaseFileError(fileErrors.tooLarge(LARGEST_CASE_FILE_MB));
  const text = decode(bytes);
  if (text.trim() === '') throw new CaseFileError(fileErrors.empty);
  // The header and one line too many are enough to see that there are too many.
  const [header, ...rows] = rowsOf(text, separatorOf(text), MOST_CASE_FILE_LINES + 2);
  if (rows.length > MOST_CASE_FILE_LINES)
    throw new CaseFileError(fileErrors.tooManyLines(MOST_CASE_FILE_LINES));
  const { at, unknown } = readHeader(header!);
  const lines = rows.map(({ line, fields }) => {
    if (fields.slice(header!.fields.length).some((field) => field !== ''))
      throw new CaseFileError(fileErrors.tooManyFields(line), line);
    const field = (name: Column): string => fields[at[name] ?? -1] ?? '';
    return {
      line,
      case: field('case'),
      algorithm: field('algorithm'),
      group: field('group'),
      note: field('note'),
    };
  });
  return { lines, unknownColumns: unknown };
}
