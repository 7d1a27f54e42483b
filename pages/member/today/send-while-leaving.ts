import { endpoints } from '#shared/contracts/endpoints.ts';
import type { AnswersResult } from '#shared/contracts/today.ts';
import type { Outbox } from './outbox.ts';

/** Browsers let a page that is being left send 64 KiB; an answer is about 300 bytes. */
const MOST = 100;

/**
 * Sends what is unsent in a way that outlives the page. Whether an answer comes back or not, the letters stay in
 * the outbox until the server is known to have them.
 */
export function sendWhileLeaving(outbox: Outbox): void {
  const answers = outbox
    .letters()
    .flatMap((letter) => (letter.kind === 'answer' ? [letter.body] : []))
    .slice(-MOST);
  if (answers.length === 0) return;
  fetch(endpoints.answer.path, {
    method: endpoints.answer.method,
    keepalive: true,
    credentials: 'same-origin',
    headers: { 'Content-Type': 'application/json', Accept: 'application/json' },
    body: JSON.stringify({ answers }),
  })
    .then(async (res) => {
      // A refusal is looked into by the next ordinary flush, which asks whose answers these are.
      if (!res.ok) return;
      const result = (await res.json()) as AnswersResult;
      if (result.refused.length === 0) outbox.settle(result);
    })
    .catch(() => {
      // No network: the letters are kept.
    });
}
