import type { CatalogueCasesInput, CatalogueCasesView } from '#shared/contracts/catalogue.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { casesOfCatalogue } from './cases-of-catalogue.ts';
import { filterCases, orderOf } from './find-cases.ts';
import { presentCaseOfCatalogue } from './present-case.ts';
import { readAliases } from './read-aliases.ts';
import { readShownSet } from './read-shown-set.ts';

/** All cases of a set that fit, sorted. @throws Problem not-found for an unknown set or edition. */
export async function listCases(ctx: Ctx, input: CatalogueCasesInput): Promise<CatalogueCasesView> {
  return asSignedIn(ctx, async (tx, actor) => {
    const { set, content } = await readShownSet(tx, input.setKey, input.edition);
    const cases = casesOfCatalogue(set, content, await readAliases(tx, actor));
    return {
      setKey: input.setKey,
      edition: content?.number ?? null,
      rows: filterCases(cases, input)
        .sort(orderOf(input.sort))
        .map((one) => ({
          ...presentCaseOfCatalogue(set, one),
          algorithms: one.algorithms.map(({ algorithm }) => algorithm),
        })),
    };
  });
}
