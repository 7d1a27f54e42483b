import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';
import type { MemberPageView } from '#shared/contracts/desk.ts';
import type { Outcome } from '#shared/memory/index.ts';
import { deskText } from '#shared/text/desk.ts';
import { withAliases } from '../aliases/with-aliases.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import { readEditionContent } from '../catalogue/read-edition.ts';
import type { MemberDay } from '../training/member-day.ts';

const words: Readonly<Record<string, string>> = deskText.member.namedWords;

interface AnswerRow extends Record<string, unknown> {
  review_id: string;
  at: number;
  set_key: string;
  case_key: string;
  edition_number: number;
  named: string;
  outcome: Outcome;
  recognition_ms: number | null;
  lost_by: string | null;
  mis_tapped: boolean;
}

/** A member's newest answers, newest first, each named as the edition of its showing names it. */
export async function latestAnswers(
  tx: Transaction,
  { actor, aliases }: MemberDay,
  count: number,
): Promise<MemberPageView['lately']> {
  const { rows } = await tx.execute<AnswerRow>(sql`
    select r.review_id, (extract(epoch from r.answered_at) * 1000)::float8 as at, r.set_key, r.case_key,
      r.edition_number, r.named, r.outcome, r.recognition_ms, r.lost_by,
      exists (select 1 from mis_tap t where t.club_id = r.club_id and t.member_id = r.member_id
        and t.review_id = r.review_id) as mis_tapped
    from review r
    where r.club_id = ${actor.clubId}::uuid and r.member_id = ${actor.memberId}::uuid
    order by r.local_day desc, r.answered_at desc, r.review_id desc
    limit ${count}`);
  const lately: MemberPageView['lately'] = [];
  for (const row of rows) {
    const set = await loadCaseSet(tx, row.set_key);
    const content = await readEditionContent(tx, row.set_key, row.edition_number);
    const { cases } = withAliases(content, aliases);
    const nameOf = (key: string) => cases.get(key)?.name ?? set.byKey(key)?.name ?? key;
    lately.push({
      id: row.review_id,
      at: row.at,
      setName: set.definition.name,
      name: nameOf(row.case_key),
      named: words[row.named] ?? nameOf(row.named),
      outcome: row.outcome,
      recognitionMs: row.recognition_ms,
      lostBy: row.mis_tapped ? deskText.member.misTap : row.lost_by,
    });
  }
  return lately;
}
