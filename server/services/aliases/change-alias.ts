import { and, eq, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { SetAliasInput } from '#shared/contracts/case-sets.ts';
import type { CaseOfSet } from '#shared/lastlayer/index.ts';
import { caseSetText } from '#shared/text/case-sets.ts';
import { notFound, Problem } from '../../http/problem.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { type EditionContent, newestEditions, readEditionContent } from '../catalogue/read-edition.ts';
import { readSetRow } from '../catalogue/set-row.ts';
import { asCaptain, type Ctx } from '../context.ts';

const { problems } = caseSetText;

interface Named {
  readonly alias: string | null;
}

/**
 * Gives a case the name that the captain's club calls it by, in every set that has the case. An alias is given once
 * among the cases that stand together in a set, and is no name of another of them.
 * @throws Problem not-found for no such set or case; cannot-take, naming the field, for a name that is another's.
 */
export async function setAlias(ctx: Ctx, input: SetAliasInput): Promise<Named> {
  return asCaptain(ctx, async (tx, { clubId }) => {
    const { caseAlias } = tables;
    const { alias } = input;
    // Names are looked up before one is given: two captains of a club take turns.
    await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`aliases ${clubId}`}, 0))`);
    const named = await findCase(tx, input);
    await requireFree(tx, clubId, named, alias);
    await tx
      .insert(caseAlias)
      .values({ clubId, caseKey: named.case.key, setKey: named.setKey, alias })
      .onConflictDoUpdate({
        target: [caseAlias.clubId, caseAlias.caseKey],
        set: { alias, setKey: named.setKey },
      });
    return { alias };
  });
}

/** Takes the club's own name of a case away; where there is none, nothing happens. @throws Problem not-found. */
export async function clearAlias(ctx: Ctx, input: { setKey: string; key: string }): Promise<Named> {
  return asCaptain(ctx, async (tx, { clubId }) => {
    const { caseAlias } = tables;
    const { case: c } = await findCase(tx, input);
    await tx.delete(caseAlias).where(and(eq(caseAlias.clubId, clubId), eq(caseAlias.caseKey, c.key)));
    return { alias: null };
  });
}

interface FoundCase {
  /** The set that names the case: for a subset the whole. */
  readonly setKey: string;
  readonly case: CaseOfSet;
}

async function findCase(
  tx: Transaction,
  { setKey, key }: { setKey: string; key: string },
): Promise<FoundCase> {
  const row = await readSetRow(tx, setKey);
  const c = (await loadCaseSet(tx, setKey)).byKey(key);
  if (!c) throw notFound(problems.noCase(row.definition.name, key));
  if (c.skip) throw refuse(problems.skipHasNone);
  return { setKey: row.parentKey ?? setKey, case: c };
}

async function requireFree(
  tx: Transaction,
  clubId: string,
  { setKey, case: c }: FoundCase,
  alias: string,
): Promise<void> {
  const set = await loadCaseSet(tx, setKey);
  const newest = (await newestEditions(tx)).get(setKey);
  const content = newest === undefined ? null : await readEditionContent(tx, setKey, newest);
  const nameOf = (key: string) => content?.cases.get(key)?.name ?? set.byKey(key)?.name ?? key;
  const owner = ownerOf(content, alias) ?? set.byName(alias)?.key;
  if (owner !== undefined) {
    throw refuse(owner === c.key ? problems.ownName(alias) : problems.nameOfOther(alias, nameOf(owner)));
  }
  const { caseAlias } = tables;
  const [other] = await tx
    .select({ caseKey: caseAlias.caseKey })
    .from(caseAlias)
    .where(
      and(
        eq(caseAlias.clubId, clubId),
        eq(caseAlias.setKey, setKey),
        eq(sql`lower(${caseAlias.alias})`, sql`lower(${alias})`),
      ),
    );
  if (other && other.caseKey !== c.key) throw refuse(problems.nameOfOther(alias, nameOf(other.caseKey)));
}

/** The case that an edition calls so. */
function ownerOf(content: EditionContent | null, alias: string): string | undefined {
  const wanted = alias.toLowerCase();
  return [...(content?.cases.values() ?? [])].find(({ name }) => name.toLowerCase() === wanted)?.key;
}

function refuse(detail: string): Problem {
  return new Problem('cannot-take', detail, { errors: [{ pointer: '/alias', detail }] });
}
