import type { CaseOfSet, CaseSet } from '#shared/lastlayer/index.ts';
import type { EditionAlgorithm, EditionContent } from './read-edition.ts';

/** A case with all that the catalogue says of it. */
export interface CaseOfCatalogue {
  readonly case: CaseOfSet;
  readonly name: string;
  /** What the reader's club calls it. */
  readonly alias: string | null;
  readonly group: string;
  /** In order of preference. */
  readonly algorithms: readonly EditionAlgorithm[];
}

/** What the catalogue says of one case: names and groups come from the edition, where it has the case. */
export function caseOfCatalogue(
  c: CaseOfSet,
  content: EditionContent | null,
  aliases: ReadonlyMap<string, string>,
): CaseOfCatalogue {
  const edition = content?.cases.get(c.key);
  return {
    case: c,
    name: edition?.name ?? c.name,
    alias: aliases.get(c.key) ?? null,
    group: edition?.group || c.group,
    algorithms: edition?.algorithms ?? [],
  };
}

/** Every case of a set but the skip, in canonical order. */
export function casesOfCatalogue(
  set: CaseSet,
  content: EditionContent | null,
  aliases: ReadonlyMap<string, string>,
): CaseOfCatalogue[] {
  return set.cases.map((c) => caseOfCatalogue(c, content, aliases));
}
