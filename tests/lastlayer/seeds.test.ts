import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { WITH_EDITION } from '#database/seed/catalogue.ts';
import { readCaseFile } from '#server/services/intake/read-case-file.ts';
import { caseSet, readCaseLines } from '#shared/lastlayer/index.ts';

describe.each(WITH_EDITION)('the case file %s.csv', (key) => {
  const set = caseSet(key);
  const file = readCaseFile(
    readFileSync(new URL(`../../database/seed/case-sets/${key}.csv`, import.meta.url)),
  );
  const read = readCaseLines(set, file.lines);

  it('agrees with the cube on every line and covers every case', () => {
    expect(read.rows.filter(({ finding }) => finding !== 'agrees')).toEqual([]);
    expect(read.missing).toEqual([]);
    expect(read.covered).toBe(read.of);
    expect(file.unknownColumns).toEqual([]);
  });

  it('groups each case as the name tables do, and writes algorithms as they are normalised', () => {
    for (const row of read.rows) {
      expect(row.group, row.case).toBe(set.byName(row.case)?.group);
      expect(row.algorithm).toBe(row.normalised);
      expect(row.case).toBe(row.solves);
    }
  });

  it('says that it was written from memory', () => {
    expect(file.lines[0]?.note).toMatch(/from memory/u);
  });
});

describe('the sets that come with algorithms', () => {
  it('are those of up to 57 cases that the trade learns whole', () => {
    // Common practice: cases of each set, the skip apart.
    const cases = WITH_EDITION.map((key) => [key, caseSet(key).cases.length]);
    expect(Object.fromEntries(cases)).toEqual({
      oll: 57,
      pll: 21,
      ocll: 7,
      eoll: 3,
      cpll: 2,
      epll: 4,
      coll: 42,
      ell: 29,
    });
  });

  it('have their files, and no file stands without its set', () => {
    const files = readdirSync(new URL('../../database/seed/case-sets/', import.meta.url))
      .filter((name) => name.endsWith('.csv'))
      .map((name) => name.replace('.csv', ''));
    expect(files.sort()).toEqual([...WITH_EDITION].sort());
  });
});
