export { type CsvValue, csvOf } from '#shared/text/csv.ts';

/** Hands the text to the browser as a file to keep; the mark at its start tells spreadsheets that it is UTF-8. */
export function downloadCsv(name: string, csv: string): void {
  const url = URL.createObjectURL(new Blob(['\uFEFF', csv], { type: 'text/csv;charset=utf-8' }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  // The download has its own hold on the data once it has begun.
  setTimeout(() => URL.revokeObjectURL(url), 10_000);
}
