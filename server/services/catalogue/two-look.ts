import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import {
  ASPECTS,
  type CaseOfSet,
  orientationOf,
  seenThrough,
  twoLookRoutes,
} from '#shared/lastlayer/index.ts';
import { frontOf } from './case-picture.ts';
import type { ShownSet } from './read-shown-set.ts';
import type { ReferTo } from './refer-to-case.ts';

/** Routes shown: the shortest of each first look. */
const ROUTES = 3;

export interface TwoLookNeeds {
  readonly oll: ShownSet;
  readonly pll: ShownSet;
  readonly inOll: ReferTo;
  readonly inPll: ReferTo;
}

/**
 * How a case is solved in two looks with the catalogue's algorithms, from the first of its views; the shortest
 * ways first. null where the set does not see the whole last layer or the case is oriented already.
 */
export function twoLookOf(
  { set, content }: ShownSet,
  c: CaseOfSet,
  { oll, pll, inOll, inPll }: TwoLookNeeds,
): CatalogueCaseView['twoLook'] {
  const { entry, toldApart } = set.definition;
  const shows = orientationOf(set, c);
  if (seenThrough(entry, toldApart).length < ASPECTS.length || !shows || shows.skip) return null;
  const algorithmsOf = ({ content: of }: ShownSet, key: string) =>
    (of?.cases.get(key)?.algorithms ?? []).map(({ algorithm }) => algorithm);
  const routes = twoLookRoutes(
    frontOf(set, c, content?.cases.get(c.key)?.algorithms[0]?.algorithm),
    algorithmsOf(oll, shows.key),
    new Map(pll.set.cases.map(({ key }) => [key, algorithmsOf(pll, key)])),
  );
  const firsts = new Set<string>();
  return routes
    .filter(({ first }) => {
      const look = `${first?.before} ${first?.algorithm}`;
      return !firsts.has(look) && firsts.add(look);
    })
    .slice(0, ROUTES)
    .map(({ first, leaves, second, after, moves }) => ({
      before: first?.before ?? 0,
      orient: first && { case: inOll(shows), algorithm: first.algorithm },
      between: second?.before ?? 0,
      permute: second && { case: inPll(leaves), algorithm: second.algorithm },
      after,
      stm: moves,
    }));
}
