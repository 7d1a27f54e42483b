import type { CatalogueSheetInput, CatalogueSheetView } from '#shared/contracts/catalogue-sheet.ts';
import { notFound } from '../../http/problem.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { groupBy } from '../group-by.ts';
import { casesOfCatalogue } from './cases-of-catalogue.ts';
import { orderOf } from './find-cases.ts';
import { readAliases } from './read-aliases.ts';
import { inNameOrder } from './read-edition.ts';
import { readShownSet } from './read-shown-set.ts';
import { pictureAndAufs } from './sheet-aufs.ts';

/**
 * The algorithm sheet of an edition: every case that has an algorithm, by group and name.
 * @throws Problem not-found for an unknown set, one without an edition, or an edition it does not have.
 */
export async function showSheet(ctx: Ctx, input: CatalogueSheetInput): Promise<CatalogueSheetView> {
  return asSignedIn(ctx, async (tx, actor) => {
    const { set, content } = await readShownSet(tx, input.setKey, input.edition);
    if (!content) throw notFound('There is no edition of that set yet, so there is nothing to print.');
    const aliases = await readAliases(tx, actor);
    const cases = casesOfCatalogue(set, content, aliases)
      .filter(({ algorithms }) => algorithms.length > 0)
      .sort(orderOf('name'));
    const groups = [...groupBy(cases, ({ group }) => group)].sort(([one], [other]) =>
      inNameOrder(one, other),
    );
    return {
      setKey: input.setKey,
      setName: set.definition.name,
      edition: content.number,
      publishedAt: content.publishedAt.getTime(),
      groupNames: groups.map(([name]) => name).filter(Boolean),
      groups: groups
        .filter(([name]) => input.group === undefined || name === input.group)
        .map(([name, of]) => ({
          name,
          cases: of.map((one) => ({
            key: one.case.key,
            name: one.name,
            alias: one.alias,
            prior: { weight: one.case.weight, total: set.total },
            ...pictureAndAufs(
              set,
              one.case,
              one.algorithms.map(({ algorithm }) => algorithm),
            ),
          })),
        })),
    };
  });
}
