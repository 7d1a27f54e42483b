import { desc, sql } from 'drizzle-orm';
import { tables } from '#database/client.ts';
import type { CatalogueView } from '#shared/contracts/catalogue.ts';
import { CASE_SETS } from '#shared/lastlayer/index.ts';
import { asSignedIn, type Ctx } from '../context.ts';

type SetOfCatalogue = CatalogueView['sets'][number];

const place = new Map(CASE_SETS.map(({ key }, at) => [key, at]));

/** Sets as the trade lists them: OLL and PLL before what is made of them; others after, by key. */
export function inTradeOrder(one: string, other: string): number {
  return (place.get(one) ?? place.size) - (place.get(other) ?? place.size) || (one < other ? -1 : 1);
}

/** Every set with its editions, the newest first. */
export async function listCatalogue(ctx: Ctx): Promise<CatalogueView> {
  return asSignedIn(ctx, async (tx) => {
    const { caseSet, edition } = tables;
    const sets = await tx
      .select({
        setKey: caseSet.setKey,
        name: caseSet.name,
        entry: caseSet.entry,
        toldApart: caseSet.toldApart,
        solved: caseSet.solved,
        cases: sql<number>`(select count(*)::int from set_case c where c.set_key = case_set.set_key and not c.is_skip)`,
      })
      .from(caseSet);
    const editions = await tx
      .select({
        setKey: edition.setKey,
        number: edition.number,
        publishedAt: edition.publishedAt,
        note: edition.note,
        cases: sql<number>`(select count(*)::int from edition_case c where c.set_key = edition.set_key and c.edition_number = edition.number)`,
        algorithms: sql<number>`(select count(*)::int from edition_algorithm a where a.set_key = edition.set_key and a.edition_number = edition.number)`,
      })
      .from(edition)
      .orderBy(desc(edition.number));
    const bySet = new Map<string, SetOfCatalogue['editions']>();
    for (const { setKey, publishedAt, ...rest } of editions) {
      const of = bySet.get(setKey) ?? [];
      of.push({ ...rest, publishedAt: publishedAt.getTime() });
      bySet.set(setKey, of);
    }
    return {
      sets: sets
        .sort((one, other) => inTradeOrder(one.setKey, other.setKey))
        .map((set) => ({ ...set, editions: bySet.get(set.setKey) ?? [] })),
    };
  });
}
