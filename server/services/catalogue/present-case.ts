import type { CatalogueCasesView } from '#shared/contracts/catalogue.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import type { CaseOfCatalogue } from './cases-of-catalogue.ts';

/** A case's name, place and prior as the catalogue's lists have them. */
export function presentCaseOfCatalogue(
  set: CaseSet,
  { case: c, name, alias, group }: CaseOfCatalogue,
): Omit<CatalogueCasesView['rows'][number], 'algorithms'> {
  return {
    key: c.key,
    number: c.number,
    name,
    alias,
    group,
    prior: { weight: c.weight, total: set.total },
    angles: c.angles,
  };
}
