import { DEFAULT_WEIGHTS, type MemoryModel, memoryModel, type Trace, type Weights } from './fsrs.ts';
import { traceAfterHeld } from './guess.ts';
import type { AnswerKind, CaseMemory, FirstAnswer, LogRow } from './types.ts';

export interface FoldResult {
  /** null while no scored answer stands. */
  readonly memory: CaseMemory | null;
  /** In order of day; at most one per training day. */
  readonly firsts: FirstAnswer[];
  readonly kinds: Map<string, AnswerKind>;
}

/** Order of the log: by moment, then by id (code units), so that every device and rebuild agrees. */
export function compareRows(a: LogRow, b: LogRow): number {
  return a.answeredAt - b.answeredAt || (a.id < b.id ? -1 : a.id > b.id ? 1 : 0);
}

/**
 * A case's memory from its whole log, in whatever order the rows come. Pure and exact: the same rows give
 * the same numbers, so a rebuilt state differs from the stored one by zero.
 *
 * - Only a training day's first scored answer moves long-term memory.
 * - If it was not held, the next scored answer of that day (the retest) takes the same-day step; nothing
 *   later that day moves anything.
 * - Unscored and abandoned showings move nothing. A mis-tapped answer moves nothing either, but still is
 *   the day's first answer for calibration and boards, with the outcome it had.
 * - A day number lower than one already seen (a traveller going west) counts as the day already seen.
 * - A row that comes twice counts once.
 *
 * @throws RangeError for a malformed row, or one id with two different bodies.
 */
export function foldCase(rows: readonly LogRow[], weights: Weights = DEFAULT_WEIGHTS): FoldResult {
  const fold = startFold(weights);
  for (const row of [...rows].sort(compareRows)) fold.push(row);
  return fold.result();
}

/** A fold under way. Rows must come in the order of `compareRows`. */
export interface CaseFold {
  push(row: LogRow): void;
  result(): FoldResult;
}

/** Begins a fold that rows are pushed into one by one, as a simulation or a bench does. */
export function startFold(weights: Weights = DEFAULT_WEIGHTS): CaseFold {
  return new Fold(memoryModel(weights));
}

class Fold implements CaseFold {
  readonly #model: MemoryModel;
  readonly #firsts: FirstAnswer[] = [];
  readonly #kinds = new Map<string, AnswerKind>();
  #last: LogRow | null = null;
  #trace: Trace | null = null;
  #firstDay = 0;
  #lastDay = 0;
  #lastId = '';
  #answers = 0;
  #lapses = 0;
  /** The day's first was not held and its retest has not come yet. */
  #retestOpen = false;
  #boardDay = Number.NEGATIVE_INFINITY;

  constructor(model: MemoryModel) {
    this.#model = model;
  }

  push(row: LogRow): void {
    checkRow(row);
    if (this.#isDuplicate(row)) return;
    this.#last = row;
    if (!row.scored || row.outcome === 'left') {
      this.#kinds.set(row.id, 'unscored');
      return;
    }
    this.#noteFirst(row);
    this.#kinds.set(row.id, row.misTapped ? 'mis-tap' : this.#move(row));
  }

  result(): FoldResult {
    const memory = this.#trace && {
      stability: this.#trace.stability,
      difficulty: this.#trace.difficulty,
      firstDay: this.#firstDay,
      lastDay: this.#lastDay,
      answers: this.#answers,
      lapses: this.#lapses,
      lastId: this.#lastId,
    };
    return { memory, firsts: [...this.#firsts], kinds: new Map(this.#kinds) };
  }

  #isDuplicate(row: LogRow): boolean {
    const last = this.#last;
    if (last && compareRows(last, row) > 0) {
      throw new RangeError(`Answer ${row.id} comes before ${last.id}: push rows in the order of the log.`);
    }
    if (!this.#kinds.has(row.id)) return false;
    if (last && last.id === row.id && sameBody(last, row)) return true;
    throw new RangeError(`Answer ${row.id} stands in the log twice with different contents.`);
  }

  #noteFirst(row: LogRow): void {
    if (row.localDay <= this.#boardDay) return;
    this.#boardDay = row.localDay;
    const trace = this.#trace;
    this.#firsts.push({
      id: row.id,
      localDay: row.localDay,
      recallBefore: trace ? this.#model.recall(row.localDay - this.#lastDay, trace.stability) : null,
      held: row.outcome === 'held',
      keysOffered: row.keysOffered,
    });
  }

  #move(row: LogRow): AnswerKind {
    this.#answers += 1;
    const held = row.outcome === 'held';
    const isFirst = this.#trace === null || row.localDay > this.#lastDay;
    if (!isFirst && !this.#retestOpen) return 'repeat';
    const elapsed = this.#trace && isFirst ? row.localDay - this.#lastDay : 0;
    this.#trace = held
      ? traceAfterHeld(this.#model, this.#trace, elapsed, row.keysOffered)
      : this.#model.next(this.#trace, elapsed, false);
    this.#lastId = row.id;
    this.#retestOpen = isFirst && !held;
    if (!isFirst) return 'retest';
    if (this.#answers === 1) this.#firstDay = row.localDay;
    this.#lastDay = row.localDay;
    if (!held) this.#lapses += 1;
    return 'first';
  }
}

function sameBody(a: LogRow, b: LogRow): boolean {
  return (
    a.answeredAt === b.answeredAt &&
    a.localDay === b.localDay &&
    a.outcome === b.outcome &&
    a.scored === b.scored &&
    a.keysOffered === b.keysOffered &&
    a.misTapped === b.misTapped
  );
}

function checkRow(row: LogRow): void {
  if (!Number.isFinite(row.answeredAt)) throw new RangeError(`Answer ${row.id}: no moment of answering.`);
  if (!Number.isInteger(row.localDay))
    throw new RangeError(`Answer ${row.id}: the day is not a whole number.`);
  if (!Number.isInteger(row.keysOffered) || row.keysOffered < 1) {
    throw new RangeError(`Answer ${row.id}: at least one key must have been offered.`);
  }
}
