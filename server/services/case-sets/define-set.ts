import { and, eq, isNull, or, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { writeCaseSet } from '#database/queries/write-case-set.ts';
import type { DefineSetInput } from '#shared/contracts/case-sets.ts';
import { type CaseSet, subsetOf } from '#shared/lastlayer/index.ts';
import { caseSetText } from '#shared/text/case-sets.ts';
import { notFound, Problem } from '../../http/problem.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { readSetRow } from '../catalogue/set-row.ts';
import type { Ctx } from '../context.ts';
import { asDefiner, type Definer } from './as-definer.ts';
import { buildDefinition, setWithSameCases } from './build-definition.ts';
import { newSetKey } from './new-set-key.ts';

const { problems } = caseSetText;

/** More than any club has use for; each costs a little at every look at the catalogue. */
const MOST_OF_A_CLUB = 100;

interface Made {
  readonly set: CaseSet;
  readonly parentKey: string | null;
}

/**
 * Makes a set: a captain's is their club's own, an administrator's everyone's.
 * @throws Problem not-found for a parent that is not there; cannot-take, naming the field, for a name that is
 *   taken, a definition that cannot be, cases the parent does not have, or a set that is there already.
 */
export async function defineSet(ctx: Ctx, input: DefineSetInput): Promise<{ setKey: string }> {
  return asDefiner(ctx, async (tx, definer) => {
    await queue(tx, definer);
    await requireFreeName(tx, definer, input.name);
    const names = { key: newSetKey(ctx, input.name), name: input.name };
    const { set, parentKey } =
      input.kind === 'whole'
        ? await whole(tx, definer, names, input)
        : await subset(tx, definer, names, input);
    await writeCaseSet(tx, set, { parentKey, clubId: definer.clubId, createdBy: definer.accountId });
    return { setKey: names.key };
  });
}

/** Definers of one owner come one after the other: names are looked up before they are given. */
async function queue(tx: Transaction, { clubId }: Definer): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`define ${clubId ?? ''}`}, 0))`);
}

/** A club's set must not go by the name of one it sees already, its own or everyone's. */
async function requireFreeName(tx: Transaction, { clubId }: Definer, name: string): Promise<void> {
  const { caseSet } = tables;
  const standing = await tx
    .select({ name: caseSet.name, clubId: caseSet.clubId })
    .from(caseSet)
    .where(
      and(
        isNull(caseSet.retiredAt),
        clubId === null ? isNull(caseSet.clubId) : or(isNull(caseSet.clubId), eq(caseSet.clubId, clubId)),
      ),
    );
  const wanted = name.toLowerCase();
  const same = standing.find((set) => set.name.toLowerCase() === wanted);
  if (same) throw refuse('/name', problems.taken(same.name));
  if (clubId !== null && standing.filter((set) => set.clubId !== null).length >= MOST_OF_A_CLUB) {
    throw refuse('/name', problems.tooMany(MOST_OF_A_CLUB));
  }
}

async function whole(
  tx: Transaction,
  definer: Definer,
  names: { key: string; name: string },
  input: Extract<DefineSetInput, { kind: 'whole' }>,
): Promise<Made> {
  const set = orRefuse('/toldApart', () => buildDefinition(names, input));
  const same = await setWithSameCases(tx, definer, set);
  if (!same) return { set, parentKey: null };
  if (set.definition.mix.length === 0) throw refuse('/toldApart', problems.sameSet(same.name));
  return { set, parentKey: same.setKey };
}

/** Some of a set's cases. Of a subset's, or a mix's, it takes the definition, and its editions from the same set. */
async function subset(
  tx: Transaction,
  { clubId }: Definer,
  names: { key: string; name: string },
  { parentKey, caseKeys }: Extract<DefineSetInput, { kind: 'subset' }>,
): Promise<Made> {
  const row = await readSetRow(tx, parentKey);
  // An administrator's set is everyone's; what is made of a club's own could be read by that club alone.
  if (row.retired || (clubId === null && row.clubId !== null)) throw notFound('There is no such set.');
  const parent = await loadCaseSet(tx, parentKey);
  const set = orRefuse('/caseKeys', () => subsetOf(parent, { ...names, caseKeys }));
  if (set.cases.length === parent.cases.length) {
    throw refuse('/caseKeys', problems.allOf(parent.definition.name));
  }
  return { set, parentKey: row.parentKey ?? parentKey };
}

function orRefuse<T>(pointer: string, make: () => T): T {
  try {
    return make();
  } catch (error) {
    if (error instanceof RangeError) throw refuse(pointer, error.message);
    throw error;
  }
}

function refuse(pointer: string, detail: string): Problem {
  return new Problem('cannot-take', detail, { errors: [{ pointer, detail }] });
}
