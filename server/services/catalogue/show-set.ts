import type { CatalogueSetInput, CatalogueSetView } from '#shared/contracts/catalogue.ts';
import { mayRetire } from '../case-sets/may-retire.ts';
import { whatFor } from '../case-sets/what-for.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { casePicture } from './case-picture.ts';
import { type CaseOfCatalogue, caseOfCatalogue, casesOfCatalogue } from './cases-of-catalogue.ts';
import { filterCases, orderOf, pageOfCases } from './find-cases.ts';
import { presentCaseOfCatalogue } from './present-case.ts';
import { presentSet } from './present-set.ts';
import { readAliases } from './read-aliases.ts';
import { inNameOrder } from './read-edition.ts';
import { readShownSet } from './read-shown-set.ts';

/** Rows of a page: as many as read well, and as few as load quickly with a picture each. */
const PAGE = 100;

/** A page of a set's cases, filtered and sorted. @throws Problem not-found for an unknown set or edition. */
export async function showSet(ctx: Ctx, input: CatalogueSetInput): Promise<CatalogueSetView> {
  return asSignedIn(ctx, async (tx, actor) => {
    const shown = await readShownSet(tx, input.setKey, input.edition);
    const { set, editions, content } = shown;
    const aliases = await readAliases(tx, actor);
    const all = casesOfCatalogue(set, content, aliases);
    const order = orderOf(input.sort);
    const found = filterCases(all, input).sort(order);
    const at = (key: string | undefined) => {
      const c = key === undefined ? undefined : set.byKey(key);
      return c && caseOfCatalogue(c, content, aliases);
    };
    const retirable = await mayRetire(tx, actor, input.setKey);
    const page = pageOfCases(found, order, { after: at(input.after), before: at(input.before), size: PAGE });
    return {
      ...(await presentSet(tx, shown)),
      edition: content?.number ?? null,
      editions: [...editions],
      cases: all.length,
      skip: { key: set.skip.key, prior: { weight: set.skip.weight, total: set.total } },
      withAlgorithm: all.filter(({ algorithms }) => algorithms.length > 0).length,
      groups: groupsOf(all),
      angles: ([4, 2, 1] as const).map((angles) => ({
        angles,
        cases: all.filter((one) => one.case.angles === angles).length,
      })),
      found: found.length,
      from: page.from,
      rows: page.rows.map((one) => ({
        ...presentCaseOfCatalogue(set, one),
        picture: casePicture(set, one.case, one.algorithms[0]?.algorithm),
        algorithm: one.algorithms[0]?.algorithm ?? null,
        algorithms: one.algorithms.length,
      })),
      retirable,
      inUse: retirable ? await whatFor(tx, input.setKey, actor?.clubId ?? null) : null,
      next: page.next,
      previous: page.previous,
    };
  });
}

function groupsOf(cases: readonly CaseOfCatalogue[]): CatalogueSetView['groups'] {
  const counts = new Map<string, number>();
  for (const { group } of cases) if (group !== '') counts.set(group, (counts.get(group) ?? 0) + 1);
  return [...counts]
    .map(([name, count]) => ({ name, cases: count }))
    .sort((one, other) => inNameOrder(one.name, other.name));
}
