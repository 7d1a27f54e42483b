import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';
import { rightAufsBefore } from '#shared/lastlayer/index.ts';
import { deskText } from '#shared/text/desk.ts';
import { groupBy } from '../group-by.ts';
import type { Loss } from './lost-cases.ts';

const text = deskText.lostBy;

interface FailureRow extends Record<string, unknown> {
  case_key: string;
  kind: 'late' | 'auf' | 'unrecognised' | 'named';
  /** The case named instead, for `named`. */
  named: string | null;
  times: number;
  recognition_ms: number | null;
}

interface Period {
  readonly clubId: string;
  readonly fromDay: number;
}

/** Days between the making of an answer's id and its local day that pruning by id must allow for. */
const SLACK_DAYS = 3;

/** For each loss what is behind it most, in a few words, from the squad's answers since `fromDay`. */
export async function explainLosses(
  tx: Transaction,
  period: Period,
  losses: readonly Loss[],
): Promise<Map<string, string>> {
  const failures = await readFailures(
    tx,
    period,
    losses.map((loss) => loss.case.key),
  );
  const byCase = groupBy(failures, (row) => row.case_key);
  const words = new Map<string, string>();
  for (const loss of losses) {
    words.set(loss.case.key, await explain(tx, period, loss, byCase.get(loss.case.key) ?? []));
  }
  return words;
}

async function explain(
  tx: Transaction,
  period: Period,
  loss: Loss,
  failures: readonly FailureRow[],
): Promise<string> {
  if (loss.unmetShare * 2 >= loss.share) return text.unmet(loss.unmet, loss.members);
  const [most] = [...failures].sort((a, b) => b.times - a.times || a.kind.localeCompare(b.kind));
  if (!most) return loss.unmet.length > 0 ? text.unmet(loss.unmet, loss.members) : text.fading;
  switch (most.kind) {
    case 'late':
      return text.late((most.recognition_ms ?? 0) / 1000);
    case 'auf':
      return text.auf(await usualAufError(tx, period, loss));
    case 'unrecognised':
      return text.unrecognised;
    case 'named':
      return namedInstead(loss, most.named ?? '');
  }
}

function namedInstead({ set, content, case: shown }: Loss, named: string): string {
  if (named === 'solved') return text.solved;
  const c = set.byKey(named);
  const name = content.cases.get(named)?.name ?? c?.name ?? text.unknownCase;
  return c && c.key !== shown.key && set.mirrorOf(shown).key === c.key ? text.mirror(name) : text.named(name);
}

/** Answers that were not held, by case and what went wrong. Mis-taps say nothing about the case. */
async function readFailures(
  tx: Transaction,
  { clubId, fromDay }: Period,
  caseKeys: readonly string[],
): Promise<FailureRow[]> {
  if (caseKeys.length === 0) return [];
  const { rows } = await tx.execute<FailureRow>(sql`
    select f.case_key, f.kind, f.named, count(*)::int as times,
      percentile_cont(0.5) within group (order by f.recognition_ms)::float8 as recognition_ms
    from (
      select r.case_key, r.recognition_ms, case
          when r.outcome = 'late' then 'late'
          when r.case_right then 'auf'
          when r.named in ('unrecognised', 'lost') then 'unrecognised'
          else 'named' end as kind,
        case when r.outcome = 'missed' and not r.case_right and r.named not in ('unrecognised', 'lost')
          then r.named end as named
      from review r
      where ${failedSince(clubId, fromDay)} and r.case_key = any(${sql.param(caseKeys)}::text[])
    ) f
    group by f.case_key, f.kind, f.named`);
  return rows;
}

/** Quarter turns by which the AUF before of a case is most often off; null when it was never just one. */
async function usualAufError(
  tx: Transaction,
  { clubId, fromDay }: Period,
  loss: Loss,
): Promise<1 | 2 | 3 | null> {
  const { rows } = await tx.execute<{ state: number; algorithm: string; chosen: number; times: number }>(sql`
    select r.state, r.algorithm, r.auf_before as chosen, count(*)::int as times
    from review r
    where ${failedSince(clubId, fromDay)} and r.case_key = ${loss.case.key} and r.outcome = 'missed'
      and r.case_right and r.algorithm is not null and r.auf_before is not null
    group by r.state, r.algorithm, r.auf_before`);
  const off = new Map<number, number>();
  for (const { state, algorithm, chosen, times } of rows) {
    const right = rightAufsBefore(loss.set, algorithm, state);
    // With several right answers there is no one distance to tell.
    if (right.length !== 1 || right[0] === undefined) continue;
    const turns = (((chosen - right[0]) % 4) + 4) % 4;
    off.set(turns, (off.get(turns) ?? 0) + times);
  }
  const [most] = [...off].sort((a, b) => b[1] - a[1] || a[0] - b[0]);
  return most && (most[0] === 1 || most[0] === 2 || most[0] === 3) ? most[0] : null;
}

function failedSince(clubId: string, fromDay: number) {
  return sql`r.club_id = ${clubId}::uuid and r.local_day >= ${fromDay}
    and r.review_id >= uuidv7_floor(to_timestamp(${(fromDay - SLACK_DAYS) * 86_400}::float8))
    and r.scored and not r.carried and r.outcome in ('late', 'missed')
    and not exists (select 1 from mis_tap t
      where t.club_id = r.club_id and t.member_id = r.member_id and t.review_id = r.review_id)`;
}
