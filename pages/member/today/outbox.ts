import { ApiError } from '#renderer/api.ts';
import type { AnswerInput, AnswersResult, MisTapInput, TodayView } from '#shared/contracts/today.ts';
import { type Letter, type LetterStore, type Person, samePerson } from './letter-store.ts';

/** Why letters are not on their way just now. */
export type Trouble = 'offline' | 'waiting' | 'signed-out' | 'other-person';

export interface OutboxState {
  readonly unsent: number;
  /** Unsent answers that count in today's progress: showings not left. */
  readonly unsentAnswers: number;
  readonly trouble: Trouble | null;
  /** Answers that the server will never take, until the person has seen it. */
  readonly refused: { readonly count: number; readonly detail: string } | null;
}

export interface OutboxNeeds {
  readonly store: LetterStore;
  readonly person: Person;
  sendAnswers(answers: readonly AnswerInput[]): Promise<AnswersResult>;
  sendMisTap(input: MisTapInput): Promise<TodayView>;
  /** Who is signed in on this device now. */
  readPerson(): Promise<Person | null>;
  isOnline(): boolean;
  /** Calls back after so many milliseconds; the returned function takes it back. */
  later(ms: number, then: () => void): () => void;
}

export interface OutboxListener {
  result(result: AnswersResult): void;
  today(view: TodayView): void;
  /** Answers refused for good, or all of a request that failed: nothing is to be waited for. */
  notTaken(ids: readonly string[]): void;
}

const BATCH = 50;
const FIRST_RETRY_MS = 2_000;
const LAST_RETRY_MS = 30_000;

/**
 * Answers on their way to the club. Each is stored before it is sent and kept until the server has said that
 * it has it, with the same id for ever: whatever is lost, repeated or reloaded, it counts once. Letters are
 * bound to a person and a club and sent under no other.
 */
export class Outbox {
  readonly #needs: OutboxNeeds;
  readonly #watchers = new Set<() => void>();
  readonly #listeners = new Set<OutboxListener>();
  readonly #given = new Set<string>();
  #state: OutboxState;
  #running: Promise<void> | null = null;
  #again = false;
  #retryMs = FIRST_RETRY_MS;
  #cancelRetry: (() => void) | null = null;

  constructor(needs: OutboxNeeds) {
    this.#needs = needs;
    for (const letter of this.letters()) this.#note(letter);
    this.#state = { ...this.#count(), trouble: null, refused: null };
  }

  get state(): OutboxState {
    return this.#state;
  }

  /** The unsent letters, oldest first. */
  letters(): Letter[] {
    return this.#needs.store.read();
  }

  /** Showings answered on this device since the document was loaded, sent or not. */
  get given(): ReadonlySet<string> {
    return this.#given;
  }

  watch(watcher: () => void): () => void {
    this.#watchers.add(watcher);
    return () => this.#watchers.delete(watcher);
  }

  listen(listener: OutboxListener): () => void {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  }

  /** Stores a letter; it goes out with the next flush. */
  put(letter: Letter): void {
    this.#needs.store.write(letter);
    this.#note(letter);
    this.#update({});
  }

  /** Takes notice of answers that were sent by another way (on leaving the page). */
  settle(result: AnswersResult): void {
    this.#acknowledge(result);
  }

  dismissRefused(): void {
    this.#update({ refused: null });
  }

  /** Sends all there is, unless a sending is under way: then it looks again afterwards. */
  flush(): Promise<void> {
    this.#again = true;
    this.#running ??= this.#run().finally(() => {
      this.#running = null;
    });
    return this.#running;
  }

  async #run(): Promise<void> {
    while (this.#again) {
      this.#again = false;
      this.#cancelRetry?.();
      this.#cancelRetry = null;
      try {
        if (!(await this.#sendAll())) continue;
        this.#retryMs = FIRST_RETRY_MS;
        this.#update({ trouble: null });
      } catch (error) {
        if (!(error instanceof ApiError)) throw error;
        this.#failed(error);
      }
    }
  }

  /** False when it stopped because the letters belong to somebody who is not signed in here now. */
  async #sendAll(): Promise<boolean> {
    for (;;) {
      const letters = this.letters();
      const answers = letters.flatMap((l) => (l.kind === 'answer' ? [l.body] : [])).slice(0, BATCH);
      if (answers.length > 0) {
        if (!(await this.#sendBatch(answers))) return false;
        continue;
      }
      const misTap = letters.find((l) => l.kind === 'mis-tap');
      if (misTap?.kind !== 'mis-tap') return true;
      await this.#sendMisTap(misTap.body);
    }
  }

  async #sendBatch(answers: readonly AnswerInput[]): Promise<boolean> {
    try {
      const result = await this.#needs.sendAnswers(answers);
      if (result.refused.length > 0 && !(await this.#isTheirs())) return false;
      this.#acknowledge(result);
      return true;
    } catch (error) {
      if (!(error instanceof ApiError) || !neverTaken(error.status)) throw error;
      if (!(await this.#isTheirs())) return false;
      if (answers.length > 1) {
        // One that can never be taken must not hold up the others.
        for (const answer of answers) if (!(await this.#sendBatch([answer]))) return false;
        return true;
      }
      this.#refuse(
        answers.map((answer) => answer.id),
        error.message,
      );
      return true;
    }
  }

  async #sendMisTap(body: MisTapInput): Promise<void> {
    try {
      const view = await this.#needs.sendMisTap(body);
      this.#needs.store.remove(misTapId(body));
      for (const listener of this.#listeners) listener.today(view);
    } catch (error) {
      if (!(error instanceof ApiError) || !neverTaken(error.status)) throw error;
      this.#needs.store.remove(misTapId(body));
    }
    this.#update({});
  }

  async #isTheirs(): Promise<boolean> {
    const now = await this.#needs.readPerson();
    const theirs = now !== null && samePerson(now, this.#needs.person);
    if (!theirs) {
      this.#update({ trouble: now === null ? 'signed-out' : 'other-person' });
      this.#tellNotTaken();
    }
    return theirs;
  }

  #acknowledge(result: AnswersResult): void {
    for (const { id } of result.verdicts) this.#needs.store.remove(id);
    const refused = result.refused;
    if (refused.length > 0)
      this.#refuse(
        refused.map(({ id }) => id),
        refused[0]?.detail ?? '',
      );
    this.#update({});
    for (const listener of this.#listeners) listener.result(result);
  }

  #refuse(ids: readonly string[], detail: string): void {
    for (const id of ids) this.#needs.store.remove(id);
    this.#update({ refused: { count: (this.#state.refused?.count ?? 0) + ids.length, detail } });
    for (const listener of this.#listeners) listener.notTaken(ids);
  }

  #failed(error: ApiError): void {
    const signedOut = error.status === 401 || error.status === 403;
    const trouble = signedOut ? 'signed-out' : this.#needs.isOnline() ? 'waiting' : 'offline';
    this.#update({ trouble });
    this.#tellNotTaken();
    if (signedOut) return;
    this.#cancelRetry = this.#needs.later(this.#retryMs, () => void this.flush());
    this.#retryMs = Math.min(this.#retryMs * 2, LAST_RETRY_MS);
  }

  /** Nothing came back for what is still here: whoever waits for a verdict goes on without it. */
  #tellNotTaken(): void {
    const ids = this.letters().map((letter) => letter.id);
    for (const listener of this.#listeners) listener.notTaken(ids);
  }

  #note(letter: Letter): void {
    if (letter.kind === 'answer') this.#given.add(letter.body.showingId);
  }

  #count(): Pick<OutboxState, 'unsent' | 'unsentAnswers'> {
    const letters = this.letters();
    return {
      unsent: letters.length,
      unsentAnswers: letters.filter((l) => l.kind === 'answer' && l.body.named !== 'left').length,
    };
  }

  #update(change: Partial<OutboxState>): void {
    this.#state = { ...this.#state, ...this.#count(), ...change };
    for (const watcher of this.#watchers) watcher();
  }
}

/** Statuses at which sending the same again can never help. */
function neverTaken(status: number): boolean {
  return status === 400 || status === 404 || status === 413 || status === 422;
}

export function misTapId(body: MisTapInput): string {
  return `mis-tap-${body.reviewId}`;
}
