import type { CatalogueCaseInput, CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import {
  AUFS,
  act,
  type CaseOfSet,
  inverseOf,
  mirrorInverseOf,
  moveCounts,
  orientationOf,
  permutationOf,
  rightAufsBefore,
  stabiliser,
} from '#shared/lastlayer/index.ts';
import { TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';
import { notFound } from '../../http/problem.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { readChanges } from './case-changes.ts';
import { frontOf, seenStickers } from './case-picture.ts';
import { type CaseOfCatalogue, caseOfCatalogue, casesOfCatalogue } from './cases-of-catalogue.ts';
import { orderOf } from './find-cases.ts';
import { presentCaseOfCatalogue } from './present-case.ts';
import { presentSet } from './present-set.ts';
import { readAliases } from './read-aliases.ts';
import { readShownSet, type ShownSet } from './read-shown-set.ts';
import { referencesIn } from './refer-to-case.ts';
import { twoLookOf } from './two-look.ts';

/**
 * All that the catalogue knows of one case, the skip too.
 * @throws Problem not-found for an unknown set or case.
 */
export async function showCase(ctx: Ctx, input: CatalogueCaseInput): Promise<CatalogueCaseView> {
  return asSignedIn(ctx, async (tx, actor) => {
    const shown = await readShownSet(tx, input.setKey);
    const { set, content } = shown;
    const c = set.byKey(input.caseKey);
    if (!c) throw notFound('There is no such case in that set.');
    const aliases = await readAliases(tx, actor);
    const one = caseOfCatalogue(c, content, aliases);
    const referTo = referencesIn(shown, aliases);
    const oll = await readShownSet(tx, 'oll');
    const pll = await readShownSet(tx, 'pll');
    const inOll = referencesIn(oll, aliases);
    const inPll = referencesIn(pll, aliases);
    const reference = (to: CaseOfSet | null, refer: typeof referTo) => to && refer(to);
    const { key } = set.definition;
    return {
      ...(await presentSet(tx, shown)),
      edition: content?.number ?? null,
      case: { ...presentCaseOfCatalogue(set, one), skip: c.skip },
      ...viewsOf(shown, one),
      stabiliser: [...stabiliser(set, c)],
      mirror: referTo(set.mirrorOf(c)),
      inverse: reference(inverseOf(set, c), referTo),
      mirrorInverse: reference(mirrorInverseOf(set, c), referTo),
      orientation: key === 'oll' ? null : reference(orientationOf(set, c), inOll),
      permutation: key === 'pll' ? null : reference(permutationOf(set, c), inPll),
      twoLook: twoLookOf(shown, c, { oll, pll, inOll, inPll }),
      changes: await readChanges(tx, shown, c.key),
      ...neighboursOf(casesOfCatalogue(set, content, aliases), one),
    };
  });
}

/** A case's really different angles, the one its first algorithm solves as it is in front, and what solves each. */
function viewsOf(
  { set }: ShownSet,
  { case: c, algorithms }: CaseOfCatalogue,
): Pick<CatalogueCaseView, 'views' | 'algorithms'> {
  const front = frontOf(set, c, algorithms[0]?.algorithm);
  const views = AUFS.slice(0, c.angles).map((turns) => act(front, turns, 0));
  return {
    views: views.map((state) => ({ stickers: seenStickers(set, state), colouring: TABLE_COLOURING })),
    algorithms: algorithms.map(({ algorithm, note }) => ({
      algorithm,
      note,
      counts: moveCounts(algorithm),
      rightAufs: views.map((state) => [...rightAufsBefore(set, algorithm, state)]),
    })),
  };
}

/** The cases before and after one by name; none for the skip. */
function neighboursOf(
  cases: readonly CaseOfCatalogue[],
  of: CaseOfCatalogue,
): Pick<CatalogueCaseView, 'previous' | 'next'> {
  if (of.case.skip) return { previous: null, next: null };
  const sorted = [...cases].sort(orderOf('name'));
  const at = sorted.findIndex((one) => one.case.key === of.case.key);
  const named = (one: CaseOfCatalogue | undefined) =>
    one ? { key: one.case.key, name: one.alias ?? one.name } : null;
  return { previous: named(sorted[at - 1]), next: named(sorted[at + 1]) };
}
