import { v7 } from 'uuid';
import { expect } from 'vitest';
import type { Claims } from '#server/services/context.ts';
import type { TestApi } from '#tests/support/api.ts';
import type { ClubOfTest, Person } from '#tests/support/factories.ts';

export const uuid = () => v7();

/** A member of a (new) club with these sets on its programme for everyone. */
export async function member(
  api: TestApi,
  setKeys: readonly string[],
  club?: ClubOfTest,
): Promise<Person & { club: ClubOfTest }> {
  const here = club ?? (await api.factory.club());
  const person = await api.factory.person({ club: here });
  for (const setKey of setKeys) await api.factory.assign(here, setKey);
  return { ...person, club: here };
}

/** Answers the member's next showings alike, through the API; gives the answers' ids in order. */
export async function answerAll(
  api: TestApi,
  claims: Claims,
  { count, named, recognitionMs = 1_200 }: { count: number; named: string; recognitionMs?: number },
): Promise<string[]> {
  const { body: today } = await api.as(claims).get('/api/today');
  // Time passes between the picture and the answer, or the server would not believe the stopwatch.
  api.clock.advance(5_000);
  const answers = today.showings.slice(0, count).map((showing: { id: string }) => ({
    id: v7({ msecs: api.clock.now() }),
    showingId: showing.id,
    named,
    aufBefore: null,
    recognitionMs,
    namingMs: null,
    answeredAt: api.clock.now(),
  }));
  expect(answers).toHaveLength(count);
  const res = await api.as(claims).post('/api/today/answers', { answers });
  expect(res.status).toBe(200);
  return answers.map((answer: { id: string }) => answer.id);
}
