export type CsvValue = string | number | null;

/** A spreadsheet would run a text that begins so; a number with a sign is harmless and stays one. */
const FORMULA = /^[=+\-@\t\r]/;

/**
 * Rows as CSV by RFC 4180: comma, CRLF after every row, fields quoted where they hold a comma, a quote or a line
 * break. Texts that a spreadsheet would take for a formula get an apostrophe in front. Null is an empty field.
 */
export function csvOf(rows: readonly (readonly CsvValue[])[]): string {
  return rows.map((row) => `${row.map(field).join(',')}\r\n`).join('');
}

function field(value: CsvValue): string {
  if (value === null) return '';
  if (typeof value === 'number') return String(value);
  const safe = FORMULA.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
