import type { BrowserContext } from 'playwright-core';
import { v7 } from 'uuid';
import { expect } from 'vitest';
import type { AnswersResult, TodayView } from '#shared/contracts/today.ts';
import { realShowing } from './showing.ts';
import type { Site } from './site.ts';

/**
 * Sends right answers of whoever is signed in, each given in time: so many, or (null) until nothing is left of the
 * day's queue. Says what was shown, in order.
 */
export async function answerInTime(
  site: Site,
  context: BrowserContext,
  count: number | null,
): Promise<{ setName: string; name: string }[]> {
  const answered: { setName: string; name: string }[] = [];
  let today = (await (await context.request.get('/api/today')).json()) as TodayView;
  while (answered.length !== count) {
    const [showing] = today.showings;
    if (!showing) {
      if (count === null) break;
      throw new Error(`The queue ended after ${answered.length} answers.`);
    }
    const real = await realShowing(site.sql, showing.id);
    const now = Date.now();
    const answer = {
      id: v7({ msecs: now }),
      showingId: showing.id,
      named: real.caseKey,
      aufBefore: real.rightAufs[0] ?? 0,
      recognitionMs: 400,
      namingMs: 300,
      answeredAt: now,
    };
    const response = await context.request.post('/api/today/answers', {
      data: { answers: [answer] },
      headers: { Origin: site.url },
    });
    expect(response.status()).toBe(200);
    const result = (await response.json()) as AnswersResult;
    expect(result.verdicts[0]?.outcome).toBe('held');
    today = result.today;
    answered.push({
      setName: today.sets.find((s) => s.setKey === showing.setKey)?.name ?? '',
      name: real.name,
    });
  }
  return answered;
}
