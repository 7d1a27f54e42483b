import { randomUUID } from 'node:crypto';
import { v7 } from 'uuid';
import { isTradeSet } from '#server/services/catalogue/load-set.ts';
import { definitionOfRow } from '#server/services/catalogue/set-row.ts';
import type { AnswerInput, AnswersResult, TodayView } from '#shared/contracts/today.ts';
import { buildCaseSet, type CaseSetDefinition, caseSet, rightAufsBefore } from '#shared/lastlayer/index.ts';
import type { TestApi } from './api.ts';
import type { Person } from './factories.ts';

export interface RealShowing {
  readonly caseKey: string;
  readonly setKey: string;
  readonly state: number;
  readonly rightAufs: readonly number[];
}

/** A member at their phone: reads Today and answers it, knowing (as the owner) what each showing really is. */
export class Phone {
  readonly #api: TestApi;
  readonly #person: Person;

  constructor(api: TestApi, person: Person) {
    this.#api = api;
    this.#person = person;
  }

  async today(): Promise<TodayView> {
    const res = await this.#api.as(this.#person.claims).get('/api/today');
    if (res.status !== 200) throw new Error(`${res.status} ${res.text}`);
    return res.body as TodayView;
  }

  /** What a showing really is. */
  async look(showingId: string): Promise<RealShowing> {
    const [row] = await this.#api.factory.sql<{
      case_key: string;
      set_key: string;
      editions_of: string;
      name: string;
      entry: string;
      mix: CaseSetDefinition['mix'];
      told_apart: string[];
      solved: string[];
      state: number;
      algorithm: string;
    }>(
      `select s.case_key, s.set_key, a.set_key as editions_of, s.state, a.algorithm,
         c.name, c.entry, c.mix, c.told_apart, c.solved from showing s
       join case_set c on c.set_key = s.set_key
       join edition_algorithm a on a.set_key = coalesce(c.parent_key, c.set_key) and a.edition_number = s.edition_number
         and a.case_key = s.case_key and a.rank = 1
       where s.showing_id = $1`,
      [showingId],
    );
    if (!row) throw new Error(`There is no showing ${showingId}.`);
    const { set_key: setKey, editions_of: whole, told_apart: toldApart } = row;
    const set = isTradeSet(whole)
      ? caseSet(whole)
      : buildCaseSet(definitionOfRow({ ...row, setKey, toldApart }));
    const rightAufs = rightAufsBefore(set, row.algorithm, row.state);
    return { caseKey: row.case_key, setKey: row.set_key, state: row.state, rightAufs };
  }

  /** A right answer to a showing, in time; `change` bends it. */
  async answerTo(showingId: string, change: Partial<AnswerInput> = {}): Promise<AnswerInput> {
    const real = await this.look(showingId);
    return {
      id: v7({ msecs: this.#api.clock.now() }),
      showingId,
      named: real.caseKey,
      aufBefore: real.rightAufs[0] ?? 0,
      recognitionMs: 400,
      namingMs: 300,
      answeredAt: this.#api.clock.now(),
      ...change,
    };
  }

  /** Sends answers; the clock moves on first, so that they can have taken the time they say. */
  async send(...answers: AnswerInput[]) {
    this.#api.clock.advance(10_000 * answers.length);
    return this.#api.as(this.#person.claims).post('/api/today/answers', { answers });
  }

  /** Answers the first open showing. */
  async answerNext(change: Partial<AnswerInput> = {}): Promise<AnswersResult> {
    const first = (await this.today()).showings[0];
    if (!first) throw new Error('There is nothing to answer.');
    const res = await this.send(await this.answerTo(first.id, change));
    if (res.status !== 200) throw new Error(`${res.status} ${res.text}`);
    return res.body as AnswersResult;
  }
}

export const anyId = () => randomUUID();
