import { isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { CatalogueView } from '#shared/contracts/catalogue.ts';
import { CASE_SETS } from '#shared/lastlayer/index.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { groupBy } from '../group-by.ts';

type SetOfCatalogue = CatalogueView['sets'][number];
type EditionOfSet = SetOfCatalogue['editions'][number];

const place = new Map(CASE_SETS.map(({ key }, at) => [key, at]));

/** Sets as the trade lists them: OLL and PLL before what is made of them; others after, by key. */
export function inTradeOrder(one: string, other: string): number {
  return (place.get(one) ?? place.size) - (place.get(other) ?? place.size) || (one < other ? -1 : 1);
}

/** The trade's sets, then what else the installation has, then clubs' own, each by name. */
function inCatalogueOrder(one: SetOfCatalogue, other: SetOfCatalogue): number {
  const rank = ({ setKey, ofClub }: SetOfCatalogue) => place.get(setKey) ?? place.size + (ofClub ? 1 : 0);
  return rank(one) - rank(other) || one.name.localeCompare(other.name, 'en', { numeric: true });
}

/** Every set this session may see that is not retired, with its editions, the newest first. */
export async function listCatalogue(ctx: Ctx): Promise<CatalogueView> {
  return asSignedIn(ctx, async (tx) => {
    const { caseSet } = tables;
    const rows = await tx
      .select({
        setKey: caseSet.setKey,
        name: caseSet.name,
        entry: caseSet.entry,
        mix: caseSet.mix,
        toldApart: caseSet.toldApart,
        solved: caseSet.solved,
        clubId: caseSet.clubId,
        parentKey: caseSet.parentKey,
        cases: sql<number>`(select count(*)::int from set_case c where c.set_key = case_set.set_key and not c.is_skip)`,
      })
      .from(caseSet)
      .where(isNull(caseSet.retiredAt));
    const names = new Map(rows.map(({ setKey, name }) => [setKey, name]));
    const editions = await editionsBySet(tx);
    return {
      sets: rows
        .map(({ clubId, parentKey, mix, ...set }) => ({
          ...set,
          mix: [...mix],
          ofClub: clubId !== null,
          parent: parentKey === null ? null : { setKey: parentKey, name: names.get(parentKey) ?? parentKey },
          editions: editions.get(set.setKey) ?? [],
        }))
        .sort(inCatalogueOrder),
    };
  });
}

interface EditionRow extends Record<string, unknown> {
  set_key: string;
  number: number;
  published_ms: number;
  note: string;
  cases: number;
  algorithms: number;
}

/** The editions that serve each set, newest first, counting only what the set has of them. */
async function editionsBySet(tx: Transaction): Promise<Map<string, EditionOfSet[]>> {
  const { rows } = await tx.execute<EditionRow>(sql`
    select s.set_key, e.number, e.note, extract(epoch from e.published_at)::float8 * 1000 as published_ms,
      (select count(*)::int from edition_case c join set_case m on m.set_key = s.set_key and m.case_key = c.case_key
        where c.set_key = e.set_key and c.edition_number = e.number) as cases,
      (select count(*)::int from edition_algorithm a join set_case m on m.set_key = s.set_key and m.case_key = a.case_key
        where a.set_key = e.set_key and a.edition_number = e.number) as algorithms
    from case_set s join edition e on e.set_key = coalesce(s.parent_key, s.set_key)
    where s.retired_at is null
    order by s.set_key, e.number desc`);
  const bySet = groupBy(rows, (row) => row.set_key);
  return new Map(
    [...bySet].map(([setKey, of]) => [
      setKey,
      of.map(({ number, note, cases, algorithms, published_ms }) => ({
        number,
        publishedAt: Math.round(published_ms),
        note,
        cases,
        algorithms,
      })),
    ]),
  );
}
