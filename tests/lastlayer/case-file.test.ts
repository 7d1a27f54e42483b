import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CaseFileError, LARGEST_CASE_FILE_MB, readCaseFile } from '#server/services/intake/read-case-file.ts';

const bytes = (text: string) => new TextEncoder().encode(text);
const lines = (text: string) => readCaseFile(bytes(text)).lines;
const pairs = (text: string) => lines(text).map((row) => [row.line, row.case, row.algorithm]);

describe('a case file', () => {
  it.each([
    ['commas', 'case,algorithm\nT,R U\n'],
    ['semicolons', 'case;algorithm\nT;R U\n'],
    ['tabs', 'case\talgorithm\nT\tR U\n'],
    ['CRLF', 'case,algorithm\r\nT,R U\r\n'],
    ['CR alone', 'case,algorithm\rT,R U\r'],
    ['a byte order mark', '\ufeffcase,algorithm\nT,R U'],
    ['any case and spaces', ' Case , ALGORITHM \n T , R U '],
    ['quotes', '"case","algorithm"\n"T","R U"\n'],
    ['quotes behind a space', 'case, "algorithm"\nT, "R U"\n'],
    ['another order', 'algorithm,case\nR U,T\n'],
    ['a trailing separator', 'case,algorithm,\nT,R U,\n'],
    ['more empty fields than the header', 'case,algorithm\nT,R U,,,\n'],
  ])('may come with %s', (_, text) => {
    expect(lines(text)).toEqual([{ line: 2, case: 'T', algorithm: 'R U', group: '', note: '' }]);
  });

  it('may come as older spreadsheets and as UTF-16 save it', () => {
    const windows = Uint8Array.from([...bytes('case,algorithm\nT,R U R'), 0x92, 0x0a]);
    expect(readCaseFile(windows).lines[0]?.algorithm).toBe('R U R’');
    const little = new Uint8Array(Buffer.from('\ufeffcase,algorithm\nT,R′', 'utf16le'));
    expect(readCaseFile(little).lines[0]?.algorithm).toBe('R′');
    expect(readCaseFile(Uint8Array.from(Buffer.from(little).swap16())).lines[0]?.algorithm).toBe('R′');
  });

  it('has line numbers as an editor counts them, across quoted line ends and blank lines', () => {
    const text = 'case,algorithm,note\n\nT,R U,"one\ntwo\n\nthree"\nJa,R,\n  \nJb,"R\nU",x\n';
    for (const end of ['\n', '\r\n', '\r'])
      expect(pairs(text.replaceAll('\n', end))).toEqual([
        [3, 'T', 'R U'],
        [7, 'Ja', 'R'],
        [9, 'Jb', 'R\nU'],
      ]);
    expect(pairs('\n\ncase,algorithm\nT,R')).toEqual([[4, 'T', 'R']]);
  });

  it('keeps rows that miss fields, and takes group and note', () => {
    expect(lines('case,algorithm,group,note\nT\n,R\n,\nT,R,"a, ""b""",c\n')).toEqual([
      { line: 2, case: 'T', algorithm: '', group: '', note: '' },
      { line: 3, case: '', algorithm: 'R', group: '', note: '' },
      { line: 4, case: '', algorithm: '', group: '', note: '' },
      { line: 5, case: 'T', algorithm: 'R', group: 'a, "b"', note: 'c' },
    ]);
  });

  it('names the columns that mean nothing here', () => {
    expect(readCaseFile(bytes('case,Probability,algorithm,__proto__\nT,1/18,R,x')).unknownColumns).toEqual([
      'Probability',
      '__proto__',
    ]);
    expect(lines('case,__proto__,algorithm,constructor\nT,x,R,y')).toEqual([
      { line: 2, case: 'T', algorithm: 'R', group: '', note: '' },
    ]);
  });

  it.each([
    ['nothing', '', /empty/u, null],
    ['only blanks', ' \n\t\n', /empty/u, null],
    ['no header', 'T,R U\nF,R', /must name the columns/u, 1],
    ['a header without the algorithm', 'case,alg\nT,R', /must name the columns/u, 1],
    ['a column named twice', 'case,algorithm,Case\nT,R,F', /column case twice/u, 1],
    ['a quote never closed', 'case,algorithm\nT,R\n\nF,"R U\nJa,R\n', /^Line 4: .*never closed/u, 4],
    ['a quote inside a field', 'case,algorithm\nT,R "U"\n', /^Line 2: .*middle of a field/u, 2],
    ['text behind a quoted field', 'case,algorithm\nT,"R" U\n', /^Line 2: /u, 2],
    ['a field that holds a bare comma', 'case,algorithm\nT,[R, U]\n', /^Line 2 has more fields/u, 2],
    ['NUL', 'case,algorithm\nT,R\0\n', /not text/u, null],
    ['JSON', '{"case":"T","algorithm":"R"}', /must name the columns/u, 1],
  ])('with %s is refused, with the line where there is one', (_, text, message, line) => {
    const reading = () => readCaseFile(bytes(text));
    expect(reading).toThrow(CaseFileError);
    expect(reading).toThrow(message);
    try {
      reading();
    } catch (error) {
      expect((error as CaseFileError).line).toBe(line);
    }
  });

  it('is refused over 5 MB and over 50,000 lines, quickly', () => {
    expect(() => readCaseFile(new Uint8Array(LARGEST_CASE_FILE_MB * 1_000_000 + 1))).toThrow(
      /larger than 5 MB/u,
    );
    const row = 'T,R U\n';
    expect(() => lines(`case,algorithm\n${row.repeat(50_001)}`)).toThrow(/more than 50000 lines/u);
    expect(lines(`case,algorithm\n${row.repeat(50_000)}`)).toHaveLength(50_000);
    expect(lines(`case,algorithm\nT,${'R '.repeat(2_000_000)}`)[0]?.algorithm).toHaveLength(3_999_999);
  }, 60_000);

  it('of any bytes at all is read or refused with a sentence', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 200 }), fc.boolean(), (noise, headed) => {
        const file = headed ? Uint8Array.from([...bytes('case,algorithm\n'), ...noise]) : noise;
        try {
          for (const { line } of readCaseFile(file).lines) expect(line).toBeGreaterThan(1);
        } catch (error) {
          expect(error).toBeInstanceOf(CaseFileError);
        }
      }),
      { seed: 16, numRuns: 200 },
    );
  });

  it('gives back what a careful writer wrote', () => {
    const field = fc.string({ unit: fc.constantFrom(...'ab,;"\n\t \'é’'), maxLength: 12 });
    const quoted = (text: string) => `"${text.replaceAll('"', '""')}"`;
    fc.assert(
      fc.property(
        fc.array(fc.record({ case: field, algorithm: field, group: field, note: field }), { maxLength: 5 }),
        (rows) => {
          const text = rows
            .map((row) => [row.note, row.case, row.group, row.algorithm].map(quoted).join(','))
            .join('\n');
          const read = lines(`note,case,group,algorithm\n${text}`);
          expect(read.map(({ line: _, ...row }) => row)).toEqual(
            rows.map((row) =>
              Object.fromEntries(Object.entries(row).map(([name, value]) => [name, value.trim()])),
            ),
          );
        },
      ),
      { seed: 16 },
    );
  });
});
