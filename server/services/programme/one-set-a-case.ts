import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { AssignSetInput } from '#shared/contracts/desk.ts';
import type { CaseSet } from '#shared/lastlayer/index.ts';
import { deskText } from '#shared/text/desk.ts';
import { Problem } from '../../http/problem.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';

const text = deskText.programme.problems;

/**
 * A member answers for a case through one set at a time: its memory is one, and so must be the limit it is judged
 * by. Refuses to hand out a set to somebody who answers for cases of it through another already. Edits of one
 * club's programme come one after the other until the transaction ends.
 * @throws Problem cannot-take with a sentence that names both sets and who.
 */
export async function requireOneSetACase(
  tx: Transaction,
  clubId: string,
  input: Pick<AssignSetInput, 'setKey' | 'forEveryone' | 'memberIds'>,
): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`programme ${clubId}`}, 0))`);
  const set = await loadCaseSet(tx, input.setKey);
  for (const other of await otherSets(tx, clubId, input.setKey)) {
    const otherSet = await loadCaseSet(tx, other.setKey);
    const shared = sharedCases(set, otherSet);
    if (shared === 0) continue;
    const chosen = new Set(input.memberIds);
    const who = other.members.filter(({ memberId }) => input.forEveryone || chosen.has(memberId));
    // Two sets for everyone meet even in a club where nobody is yet.
    if (who.length === 0 && !(other.forEveryone && input.forEveryone)) continue;
    const everyone = other.forEveryone && input.forEveryone;
    const detail = text.casesTwice({
      set: set.definition.name,
      other: otherSet.definition.name,
      cases: shared,
      who: everyone ? null : who.map(({ nickname }) => nickname),
    });
    throw new Problem('cannot-take', detail, {
      errors: [{ pointer: input.forEveryone ? '/forEveryone' : '/memberIds', detail }],
    });
  }
}

function sharedCases(one: CaseSet, other: CaseSet): number {
  // Keys of different families never agree; the skip says which family a set is of.
  if (one.skip.key !== other.skip.key) return 0;
  return one.cases.filter(({ key }) => other.byKey(key)).length;
}

interface OtherSet {
  readonly setKey: string;
  readonly forEveryone: boolean;
  /** Who answers for it. */
  readonly members: { memberId: string; nickname: string }[];
}

async function otherSets(tx: Transaction, clubId: string, setKey: string): Promise<OtherSet[]> {
  const { programme, programmeMember, membership } = tables;
  const rows = await tx
    .select({
      setKey: programme.setKey,
      forEveryone: programme.forEveryone,
      memberId: membership.memberId,
      nickname: membership.nickname,
      chosen: programmeMember.memberId,
    })
    .from(programme)
    .leftJoin(membership, and(eq(membership.clubId, programme.clubId), isNull(membership.leftAt)))
    .leftJoin(
      programmeMember,
      and(
        eq(programmeMember.clubId, programme.clubId),
        eq(programmeMember.setKey, programme.setKey),
        eq(programmeMember.memberId, membership.memberId),
      ),
    )
    .where(eq(programme.clubId, clubId))
    .orderBy(asc(programme.position), asc(programme.setKey), asc(sql`lower(${membership.nickname})`));
  const others = new Map<string, OtherSet>();
  for (const { setKey: key, forEveryone, memberId, nickname, chosen } of rows) {
    if (key === setKey) continue;
    const other = others.get(key) ?? { setKey: key, forEveryone, members: [] };
    if (memberId !== null && nickname !== null && (forEveryone || chosen !== null)) {
      other.members.push({ memberId, nickname });
    }
    others.set(key, other);
  }
  return [...others.values()];
}
