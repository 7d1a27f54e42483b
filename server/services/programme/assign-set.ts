import { and, eq, inArray, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { AssignSetInput, ProgrammeView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';
import { notFound, Problem, stale } from '../../http/problem.ts';
import { holdSet } from '../case-sets/hold-set.ts';
import { editionNumbers } from '../catalogue/read-edition.ts';
import { asCaptain, type Ctx } from '../context.ts';
import { beginSet } from '../rollups/begin-set.ts';
import { requireOneSetACase } from './one-set-a-case.ts';
import { programmeView } from './read-programme-view.ts';

const text = deskText.programme.problems;

/**
 * Puts a set on the club's programme (`version` 0) or changes how it is trained (`version` as it was read). Who
 * trains it sees it in their next Today: nothing is copied, Today reads the programme. Whoever
 * knows cases of it already has their figure of it at once.
 * @throws Problem not-found for no such set, cannot-take for an edition or a member that cannot be and for
 *   cases that somebody answers for through another set, stale when
 *   someone else was quicker.
 */
export async function assignSet(ctx: Ctx, input: AssignSetInput): Promise<ProgrammeView> {
  return asCaptain(ctx, async (tx, captain) => {
    const { clubId } = captain;
    await checkEdition(tx, input);
    const memberIds = await checkMembers(tx, clubId, input);
    await requireOneSetACase(tx, clubId, input);
    if (input.version === 0) await insert(tx, clubId, input);
    else await update(tx, clubId, input);
    await writeMembers(tx, clubId, input.setKey, memberIds);
    await beginSet(ctx, tx, captain, input.setKey);
    return programmeView(tx, clubId);
  });
}

async function checkEdition(tx: Transaction, { setKey, pinnedEdition }: AssignSetInput): Promise<void> {
  const { caseSet } = tables;
  await holdSet(tx, setKey, 'together');
  const [set] = await tx
    .select({ key: caseSet.setKey })
    .from(caseSet)
    .where(and(eq(caseSet.setKey, setKey), isNull(caseSet.retiredAt)));
  if (!set) throw notFound(text.noSet);
  const editions = (await editionNumbers(tx)).get(setKey) ?? [];
  if (editions.length === 0) throw refuse('/setKey', text.noEdition);
  if (pinnedEdition !== null && !editions.includes(pinnedEdition)) {
    throw refuse('/pinnedEdition', text.noSuchEdition(pinnedEdition));
  }
}

/** The chosen members, each once; all must be in the club now. */
async function checkMembers(tx: Transaction, clubId: string, input: AssignSetInput): Promise<string[]> {
  if (input.forEveryone) return [];
  const wanted = [...new Set(input.memberIds)];
  if (wanted.length === 0) throw refuse('/memberIds', text.nobody);
  const { membership } = tables;
  const found = await tx
    .select({ memberId: membership.memberId })
    .from(membership)
    .where(
      and(eq(membership.clubId, clubId), inArray(membership.memberId, wanted), isNull(membership.leftAt)),
    );
  if (found.length !== wanted.length) throw refuse('/memberIds', text.notOurs);
  return wanted;
}

async function insert(tx: Transaction, clubId: string, input: AssignSetInput): Promise<void> {
  const { programme } = tables;
  const written = await tx
    .insert(programme)
    .values({
      clubId,
      ...termsOf(input),
      setKey: input.setKey,
      position: sql`(select coalesce(max(p.position) + 1, 0) from programme p where p.club_id = ${clubId}::uuid)`,
    })
    .onConflictDoNothing()
    .returning({ setKey: programme.setKey });
  if (written.length === 0) throw stale(text.taken);
}

async function update(tx: Transaction, clubId: string, input: AssignSetInput): Promise<void> {
  const { programme } = tables;
  const written = await tx
    .update(programme)
    .set({ ...termsOf(input), version: sql`${programme.version} + 1` })
    .where(
      and(
        eq(programme.clubId, clubId),
        eq(programme.setKey, input.setKey),
        eq(programme.version, input.version),
      ),
    )
    .returning({ setKey: programme.setKey });
  if (written.length === 0) throw stale(text.changed);
}

function termsOf({ pinnedEdition, limitMs, asksAuf, forEveryone }: AssignSetInput) {
  return { pinnedEdition, limitMs, asksAuf, forEveryone };
}

/** Runs after the programme's row was written, which other edits of the set wait for. */
async function writeMembers(
  tx: Transaction,
  clubId: string,
  setKey: string,
  memberIds: readonly string[],
): Promise<void> {
  const { programmeMember } = tables;
  await tx
    .delete(programmeMember)
    .where(and(eq(programmeMember.clubId, clubId), eq(programmeMember.setKey, setKey)));
  if (memberIds.length === 0) return;
  await tx.insert(programmeMember).values(memberIds.map((memberId) => ({ clubId, setKey, memberId })));
}

function refuse(pointer: string, detail: string): Problem {
  return new Problem('cannot-take', detail, { errors: [{ pointer, detail }] });
}
