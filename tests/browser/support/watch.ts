import type { BrowserContext } from 'playwright-core';

/**
 * Notes whatever no page of ours may do: print to the console as an error or warning, throw, break the content
 * security policy, ask another site for anything, or get an answer that says our server erred.
 */
export class Watch {
  readonly #origin: string;
  readonly #faults: string[] = [];
  readonly #expected: RegExp[] = [];

  constructor(origin: string) {
    this.#origin = origin;
  }

  follow(context: BrowserContext): void {
    context.on('console', (message) => {
      if (message.type() === 'error' || message.type() === 'warning') {
        this.#note(`${message.type()}: ${message.text()} (${message.location().url})`);
      }
    });
    context.on('weberror', (error) => this.#note(`thrown: ${error.error().stack ?? error.error().message}`));
    context.on('request', (request) => {
      const url = new URL(request.url());
      // Downloads and pictures made in the page have addresses that lead nowhere.
      if (url.protocol === 'data:' || url.protocol === 'blob:') return;
      if (url.origin !== this.#origin) this.#note(`request to another site: ${request.url()}`);
    });
    context.on('response', (response) => {
      if (response.status() >= 500) this.#note(`${response.status()} from ${response.url()}`);
    });
  }

  /** Something a test brings about on purpose: the browser logs every answer from 400 on as an error. */
  expect(fault: RegExp): void {
    this.#expected.push(fault);
  }

  /** What was noted since the last time. */
  take(): string[] {
    this.#expected.length = 0;
    return this.#faults.splice(0);
  }

  #note(fault: string): void {
    if (!this.#expected.some((expected) => expected.test(fault))) this.#faults.push(fault);
  }
}
