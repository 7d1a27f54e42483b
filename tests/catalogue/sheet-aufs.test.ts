import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { WITH_EDITION } from '#database/seed/catalogue.ts';
import { frontOf } from '#server/services/catalogue/case-picture.ts';
import { pictureAndAufs } from '#server/services/catalogue/sheet-aufs.ts';
import { readCaseFile } from '#server/services/intake/read-case-file.ts';
import { type CaseSet, caseSet, rightAufsBefore, solvesCase } from '#shared/lastlayer/index.ts';
import { solvedOnCube } from '../lastlayer/support/puzzle.ts';

const TURNS = ['', 'U ', 'U2 ', "U' "] as const;

/** Algorithms of the case file a set comes with, by case, in its order. */
function algorithmsOf(set: CaseSet): ReadonlyMap<string, readonly string[]> {
  const file = readFileSync(
    new URL(`../../database/seed/case-sets/${set.definition.key}.csv`, import.meta.url),
  );
  const byCase = new Map<string, string[]>();
  for (const line of readCaseFile(file).lines)
    byCase.set(line.case, [...(byCase.get(line.case) ?? []), line.algorithm]);
  return byCase;
}

describe.each(WITH_EDITION)('AUFs on the sheet of %s', (key) => {
  const set = caseSet(key);

  it('solve the state in the picture, and stand only where they are needed', () => {
    let printed = 0;
    for (const [name, algorithms] of algorithmsOf(set)) {
      const c = set.byName(name)!;
      const shown = frontOf(set, c, algorithms[0]);
      for (const { algorithm, auf } of pictureAndAufs(set, c, algorithms).algorithms) {
        const whole = `${TURNS[auf]}${algorithm}`;
        expect(solvesCase(set, whole), whole).toMatchObject({ kind: 'case', case: { key: c.key } });
        expect(rightAufsBefore(set, whole, shown), whole).toContain(0);
        expect(auf === 0, whole).toBe(rightAufsBefore(set, algorithm, shown).includes(0));
        printed += 1;
      }
    }
    expect(printed).toBeGreaterThanOrEqual(set.cases.length);
  });

  it('do so on a puzzle that is not ours', () => {
    for (const [name, algorithms] of algorithmsOf(set)) {
      const c = set.byName(name)!;
      const shown = frontOf(set, c, algorithms[0]);
      for (const { algorithm, auf } of pictureAndAufs(set, c, algorithms).algorithms) {
        const whole = `${TURNS[auf]}${algorithm}`;
        expect(solvedOnCube(set.definition.solved, shown, whole), whole).toBe(true);
      }
    }
  });
});

it('gives U′ before the second algorithm of OLL 27', () => {
  const oll = caseSet('oll');
  const algorithms = algorithmsOf(oll).get('27')!;
  // Derived: of four angles one AUF alone is right, and the puzzle model shows it to be this one.
  expect(pictureAndAufs(oll, oll.byName('27')!, algorithms).algorithms.slice(0, 2)).toEqual([
    { algorithm: "R U R' U R U2 R'", auf: 0 },
    { algorithm: "R' U2 R U R' U R", auf: 3 },
  ]);
});
