import type { CaseChoices } from '#shared/contracts/case-sets.ts';
import { groupsOf } from '#shared/lastlayer/index.ts';
import { notFound } from '../../http/problem.ts';
import { casePicture } from '../catalogue/case-picture.ts';
import { caseOfCatalogue } from '../catalogue/cases-of-catalogue.ts';
import { readAliases } from '../catalogue/read-aliases.ts';
import { readShownSet } from '../catalogue/read-shown-set.ts';
import { readSetRow } from '../catalogue/set-row.ts';
import type { Ctx } from '../context.ts';
import { asDefiner } from './as-definer.ts';

/** A set's cases with what a subset of them can be chosen by. @throws Problem not-found. */
export async function showChoices(ctx: Ctx, { setKey }: { setKey: string }): Promise<CaseChoices> {
  return asDefiner(ctx, async (tx, { clubId }) => {
    if ((await readSetRow(tx, setKey)).retired) throw notFound('There is no such set.');
    const { set, content } = await readShownSet(tx, setKey);
    const aliases = await readAliases(tx, clubId === null ? null : { clubId });
    return {
      setKey,
      name: set.definition.name,
      total: set.total,
      cases: groupsOf(set).map(({ case: c, corners, edges, swap }) => {
        const { name, alias, group, algorithms } = caseOfCatalogue(c, content, aliases);
        return {
          key: c.key,
          name,
          alias,
          group,
          corners,
          edges,
          swap,
          weight: c.weight,
          picture: casePicture(set, c, algorithms[0]?.algorithm),
          known: algorithms.length > 0,
        };
      }),
    };
  });
}
