import type { Locator, Page, Request, Response } from 'playwright-core';
import { expect } from 'vitest';
import type { AnswersInput, AnswersResult, TodayView, Verdict } from '#shared/contracts/today.ts';
import { aufText } from '#shared/text/auf.ts';
import { openPage } from './open-page.ts';
import { type RealShowing, realShowing } from './showing.ts';
import type { Site } from './site.ts';

/** A way to answer a showing. */
export type Manner = 'right' | 'wrong name' | 'wrong AUF' | 'not recognised' | 'lost';

/** What a person has at hand. */
export type Hands = 'thumb' | 'pointer' | 'keyboard';

export interface Given {
  readonly manner: Manner;
  readonly showingId: string;
  readonly real: RealShowing;
  readonly verdict: Verdict;
}

const GOT_IT = /^Got it/;

/** Somebody at Today who sees only what is on the screen, and a test that knows what the pictures are. */
export class Trainee {
  /** Bodies of the answers as the page sent them, in order. */
  readonly bodies: AnswersInput[] = [];
  readonly given: Given[] = [];
  readonly #site: Site;
  readonly #page: Page;
  readonly #hands: Hands;
  #today: TodayView | undefined;

  constructor(site: Site, page: Page, hands: Hands) {
    this.#site = site;
    this.#page = page;
    this.#hands = hands;
    page.on('request', (request) => {
      if (isAnswers(request)) this.bodies.push(request.postDataJSON() as AnswersInput);
    });
  }

  get gotIt(): Locator {
    return this.#page.getByRole('button', { name: GOT_IT });
  }

  get goOn(): Locator {
    return this.#page.getByRole('button', { name: 'Go on', exact: true });
  }

  /** How many of the day's showings the ruler says are answered. */
  async progress(): Promise<{ answered: number; planned: number }> {
    const words = await this.#page.getByRole('progressbar').getAttribute('aria-valuetext');
    const [, answered, planned] = /^(\d+) of (\d+) answered$/.exec(words ?? '') ?? [];
    return { answered: Number(answered), planned: Number(planned) };
  }

  /** Opens Today, or loads it anew, and puts up the first picture. */
  async begin(): Promise<void> {
    await openPage(this.#page, '/today');
    await this.readQueue();
    await this.#press(this.#page.getByRole('button', { name: /^(Begin|Go on) / }));
    await this.gotIt.waitFor();
  }

  /** Takes notice of the queue as the server has it. */
  async readQueue(): Promise<void> {
    const answer = await this.#page.request.get('/api/today');
    this.#today = (await answer.json()) as TodayView;
  }

  /** The showing whose picture is up. */
  async current(): Promise<{ id: string; real: RealShowing }> {
    const next = this.#today?.showings[0];
    if (!next) throw new Error('The queue is empty.');
    return { id: next.id, real: await realShowing(this.#site.sql, next.id) };
  }

  /** Answers the picture that is up and waits for its verdict to have come from the server. */
  async answer(manner: Manner): Promise<Given> {
    const { id, real } = await this.current();
    const [response] = await Promise.all([
      this.#page.waitForResponse(
        (one) => isAnswers(one.request()) && answersOf(one.request()).some((a) => a.showingId === id),
      ),
      manner === 'not recognised' ? this.#pressOnPicture('I don’t recognise it') : this.#name(real, manner),
    ]);
    const given = await this.#verdictOf(response, id, manner, real);
    this.given.push(given);
    return given;
  }

  /** From a verdict to the next picture. */
  async next(): Promise<void> {
    await this.#press(this.goOn);
    await this.gotIt.waitFor();
  }

  /** Presses Got it and waits for the names. */
  async recognise(): Promise<Locator> {
    await this.#pressOnPicture(GOT_IT);
    const names = this.#page.getByRole('toolbar', { name: 'Case' });
    await names.waitFor();
    return names;
  }

  async #name(real: RealShowing, manner: Exclude<Manner, 'not recognised'>): Promise<void> {
    const names = await this.recognise();
    if (manner === 'lost') return this.#press(names.getByRole('button', { name: 'lost it' }));
    const name = manner === 'wrong name' ? this.#anotherName(real) : real.name;
    // Alone on its key, or with the first moves of the algorithm.
    await this.#press(names.getByRole('button', { name: new RegExp(`^${name}( |$)`) }), name);
    const turns = [0, 1, 2, 3].find((k) => real.rightAufs.includes(k) === (manner !== 'wrong AUF')) ?? 0;
    const aufs = this.#page.getByRole('toolbar', { name: 'AUF before' });
    await aufs.waitFor();
    await this.#press(aufs.getByRole('button', { name: aufText.name(turns), exact: true }), String(turns));
  }

  /** A name that is offered with the picture that is up, and is not its own. */
  #anotherName({ setKey, caseKey }: RealShowing): string {
    const grids = this.#today?.sets.find((set) => set.setKey === setKey)?.grids ?? {};
    const keys = grids[this.#today?.showings[0]?.grid ?? ''] ?? [];
    const other = keys.find(({ key }) => key !== caseKey && key !== 'solved');
    if (!other) throw new Error(`Nothing else is offered with ${caseKey}.`);
    return other.label;
  }

  async #verdictOf(response: Response, id: string, manner: Manner, real: RealShowing): Promise<Given> {
    expect(response.status()).toBe(200);
    const result = (await response.json()) as AnswersResult;
    this.#today = result.today;
    const answerId = answersOf(response.request()).find(({ showingId }) => showingId === id)?.id;
    const verdict = result.verdicts.find((one) => one.id === answerId);
    if (!verdict) throw new Error('The answer came back without its verdict.');
    return { manner, showingId: id, real, verdict };
  }

  /** A press before the picture has been painted is none: the clock has not begun. */
  async #pressOnPicture(name: string | RegExp): Promise<void> {
    const key = this.#page.getByRole('button', { name });
    await key.waitFor();
    await this.#page.evaluate(async () => {
      for (let k = 0; k < 4; k++) await new Promise(requestAnimationFrame);
    });
    await this.#press(key, name === GOT_IT ? ' ' : undefined);
  }

  /** Presses a key of the screen; `typed` is what the keyboard has for it, else it is gone to and entered. */
  async #press(key: Locator, typed?: string): Promise<void> {
    if (this.#hands === 'thumb') return key.tap();
    if (this.#hands === 'pointer') return key.click();
    return typed === undefined ? key.press('Enter') : this.#page.keyboard.type(typed);
  }
}

function answersOf(request: Request): AnswersInput['answers'] {
  return (request.postDataJSON() as AnswersInput).answers;
}

function isAnswers(request: Request): boolean {
  return request.method() === 'POST' && new URL(request.url()).pathname === '/api/today/answers';
}
