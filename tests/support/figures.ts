import { v7 } from 'uuid';
import { caseSet } from '#shared/lastlayer/index.ts';
import type { Outcome } from '#shared/memory/index.ts';
import type { Factory, Person } from './factories.ts';

export const DAY_MS = 86_400_000;

/** Number of today's training day in the zone of the test's people; before 4 in the morning it is yesterday's. */
export function londonDay(now: number): number {
  const parts = new Intl.DateTimeFormat('en-CA', { timeZone: 'Europe/London' }).format(
    new Date(now - 4 * 3_600_000),
  );
  return Date.parse(`${parts}T00:00:00Z`) / DAY_MS;
}

export interface RollupOf {
  day: number;
  setKey?: string;
  group?: string;
  sumP?: number;
  sumPe: number;
  sumPee?: number;
  shift?: number;
  information?: number;
  answers?: number;
  held?: number;
  late?: number;
  missed?: number;
  left?: number;
  misTaps?: number;
  spentMs?: number;
}

/** Writes a rollup row as it stands, behind the walls: what the figures of boards are read from. */
export async function insertRollup(factory: Factory, person: Person, row: RollupOf): Promise<void> {
  await factory.sql(
    `insert into rollup (club_id, day, member_id, set_key, group_name, edition_number, sum_p, sum_pe, sum_pee,
       shift, information, answers, held, late, missed, left_count, mis_taps, spent_ms)
     values ($1, $2, $3, $4, $5, 1, $6, $7, $8, $9, $10, $11, $12, $13, $14, $15, $16, $17)`,
    [
      person.clubId,
      row.day,
      person.memberId,
      row.setKey ?? 'pll',
      row.group ?? '',
      row.sumP ?? 284,
      row.sumPe,
      row.sumPee ?? 20,
      row.shift ?? 0,
      row.information ?? 4,
      row.answers ?? 0,
      row.held ?? row.answers ?? 0,
      row.late ?? 0,
      row.missed ?? 0,
      row.left ?? 0,
      row.misTaps ?? 0,
      row.spentMs ?? 0,
    ],
  );
}

export interface AnswerOf {
  setKey?: string;
  caseName: string;
  at: number;
  localDay: number;
  outcome: Outcome;
  /** A case's name, or one of the words for no case; the case itself unless told. */
  named?: string;
  aufBefore?: number | null;
  caseRight?: boolean;
  aufRight?: boolean | null;
  algorithm?: string | null;
  state?: number;
  recognitionMs?: number | null;
  scored?: boolean;
}

const WORDS = new Set(['solved', 'unrecognised', 'lost', 'left']);

/** Writes one row of the log as it stands, behind the walls. */
export async function insertAnswer(factory: Factory, person: Person, answer: AnswerOf): Promise<string> {
  const set = caseSet(answer.setKey ?? 'pll');
  const shown = set.byName(answer.caseName);
  if (!shown) throw new Error(`No case ${answer.caseName}.`);
  const named = answer.named ?? answer.caseName;
  const namedKey = WORDS.has(named) ? named : (set.byName(named)?.key ?? named);
  const id = v7({ msecs: answer.at });
  const caseRight = answer.caseRight ?? namedKey === shown.key;
  const state = answer.state ?? shown.canonical;
  await factory.sql(
    `insert into review (club_id, member_id, review_id, showing_id, set_key, case_key, edition_number, state,
       colouring, keys_offered, limit_ms, asks_auf, algorithm, named, auf_before, recognition_ms, naming_ms,
       outcome, case_right, auf_right, scored, on_boards, local_day, issued_at, answered_at, received_at, body_hash)
     values ($1, $2, $3, $4, $5, $6, 1, $7, 0, 22, 3000, true, $8, $9, $10, $11, 900, $12, $13, $14, $15, true,
       $16, $17, $17, $17, '\\x00')`,
    [
      person.clubId,
      person.memberId,
      id,
      v7({ msecs: answer.at }),
      set.definition.key,
      shown.key,
      state,
      answer.algorithm ?? null,
      namedKey,
      answer.aufBefore ?? null,
      answer.recognitionMs === undefined ? 1500 : answer.recognitionMs,
      answer.outcome,
      caseRight,
      answer.aufRight ?? (caseRight ? true : null),
      answer.scored ?? answer.outcome !== 'left',
      answer.localDay,
      new Date(answer.at),
    ],
  );
  return id;
}

/** Writes what a member remembers of a case. */
export async function insertMemory(
  factory: Factory,
  person: Person,
  memory: { setKey?: string; caseName: string; stability: number; lastDay: number; firstDay?: number },
): Promise<void> {
  const set = caseSet(memory.setKey ?? 'pll');
  const c = set.byName(memory.caseName);
  if (!c) throw new Error(`No case ${memory.caseName}.`);
  await factory.sql(
    `insert into case_state (club_id, member_id, case_key, set_key, stability, difficulty, first_day, last_day,
       answers, lapses, last_review_id)
     values ($1, $2, $3, $4, $5, 5, $6, $7, 9, 1, $8)`,
    [
      person.clubId,
      person.memberId,
      c.key,
      set.definition.key,
      memory.stability,
      memory.firstDay ?? memory.lastDay - 30,
      memory.lastDay,
      v7(),
    ],
  );
}
