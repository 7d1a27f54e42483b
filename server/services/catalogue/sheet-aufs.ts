import type { CatalogueSheetView } from '#shared/contracts/catalogue-sheet.ts';
import { type CaseOfSet, type CaseSet, rightAufsBefore } from '#shared/lastlayer/index.ts';
import { casePicture, frontOf } from './case-picture.ts';

type SheetCase = CatalogueSheetView['groups'][number]['cases'][number];

/**
 * A case's picture for the sheet, from where its first algorithm solves it, and each algorithm with the AUF that
 * it needs there: none where it needs none, else the one that is right, U before its inverse where both are.
 */
export function pictureAndAufs(
  set: CaseSet,
  c: CaseOfSet,
  algorithms: readonly string[],
): Pick<SheetCase, 'picture' | 'algorithms'> {
  const [first] = algorithms;
  const shown = frontOf(set, c, first);
  return {
    picture: casePicture(set, c, first),
    algorithms: algorithms.map((algorithm) => ({
      algorithm,
      // Right AUFs come in order from none: the first is the one that turns least.
      auf: rightAufsBefore(set, algorithm, shown)[0] ?? 0,
    })),
  };
}
