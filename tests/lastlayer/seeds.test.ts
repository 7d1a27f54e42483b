import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readCaseFile } from '#server/services/intake/read-case-file.ts';
import { caseSet, readCaseLines } from '#shared/lastlayer/index.ts';

describe.each(['oll', 'pll'])('the case file %s.csv', (key) => {
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
