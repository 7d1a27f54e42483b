import type { CaseReference } from '#shared/contracts/catalogue-case.ts';
import type { CaseOfSet, CaseSet } from '#shared/lastlayer/index.ts';
import { casePicture } from './case-picture.ts';
import { caseOfCatalogue } from './cases-of-catalogue.ts';
import type { ShownSet } from './read-shown-set.ts';

/** Points to cases of one set. */
export type ReferTo = (c: CaseOfSet) => CaseReference;

/** References to cases as the set's edition names them; what a subset has left out is its parent's. */
export function referencesIn(
  { set, namedBy, content }: Pick<ShownSet, 'set' | 'namedBy' | 'content'>,
  aliases: ReadonlyMap<string, string>,
): ReferTo {
  return (c) => {
    const { name, alias, group, algorithms } = caseOfCatalogue(c, content, aliases);
    return {
      setKey: holds(set, c) ? set.definition.key : namedBy,
      key: c.key,
      name,
      alias,
      group,
      skip: c.skip,
      picture: casePicture(set, c, algorithms[0]?.algorithm),
    };
  };
}

function holds(set: CaseSet, c: CaseOfSet): boolean {
  return set.byKey(c.key) !== undefined;
}
