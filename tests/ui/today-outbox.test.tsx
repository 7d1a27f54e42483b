import { describe, expect, it } from 'vitest';
import { type Letter, letterStore, type Person } from '#pages/member/today/letter-store.ts';
import { misTapId, Outbox, type OutboxNeeds } from '#pages/member/today/outbox.ts';
import { ApiError } from '#renderer/api.ts';
import type { AnswerInput, AnswersResult } from '#shared/contracts/today.ts';
import { someAnswer, someVerdict, someView, uuidOf } from './today-support.ts';

const ANA: Person = { clubId: uuidOf(7), nickname: 'Ana' };

/** The browser's storage, as far as letters use it. */
class MemoryStorage implements Storage {
  readonly #items = new Map<string, string>();
  full = false;
  get length() {
    return this.#items.size;
  }
  key = (index: number) => [...this.#items.keys()][index] ?? null;
  getItem = (name: string) => this.#items.get(name) ?? null;
  removeItem = (name: string) => void this.#items.delete(name);
  clear = () => this.#items.clear();
  setItem = (name: string, value: string) => {
    if (this.full) throw new DOMException('full', 'QuotaExceededError');
    this.#items.set(name, value);
  };
}

/** A server that takes each id once. `fail` is thrown before anything is stored, `lose` after. */
class Server {
  readonly stored = new Map<string, AnswerInput>();
  readonly bodies = new Map<string, string>();
  fail: ApiError | null = null;
  lose = false;
  requests = 0;
  refuse: ReadonlySet<string> = new Set();

  async take(answers: readonly AnswerInput[]): Promise<AnswersResult> {
    this.requests += 1;
    if (this.fail) throw this.fail;
    const refused = answers.filter(({ id }) => this.refuse.has(id));
    const taken = answers.filter(({ id }) => !this.refuse.has(id));
    for (const answer of taken) {
      const body = JSON.stringify(answer);
      expect(this.bodies.get(answer.id) ?? body).toBe(body);
      this.bodies.set(answer.id, body);
      this.stored.set(answer.id, answer);
    }
    if (this.lose) throw new ApiError(0, null);
    return {
      verdicts: taken.map(({ id }) => ({ ...someVerdict(1, 'held'), id })),
      refused: refused.map(({ id }) => ({ id, detail: 'Not issued to you.' })),
      today: someView([]),
    };
  }
}

function setUp(more: Partial<OutboxNeeds> = {}) {
  const storage = new MemoryStorage();
  const server = new Server();
  const waits: { ms: number; then: () => void }[] = [];
  const notTaken: string[] = [];
  const results: AnswersResult[] = [];
  const needs: OutboxNeeds = {
    store: letterStore(storage, ANA),
    person: ANA,
    sendAnswers: (answers) => server.take(answers),
    sendMisTap: async () => someView([]),
    readPerson: async () => ANA,
    isOnline: () => true,
    later(ms, then) {
      waits.push({ ms, then });
      return () => {};
    },
    ...more,
  };
  const outbox = new Outbox(needs);
  outbox.listen({
    result: (result) => results.push(result),
    today: () => {},
    notTaken: (ids) => notTaken.push(...ids),
  });
  return { storage, server, outbox, waits, notTaken, results, needs };
}

const letter = (k: number, more: Partial<AnswerInput> = {}): Letter => {
  const body = someAnswer(k, more);
  return { kind: 'answer', id: body.id, at: body.answeredAt, body };
};

describe('the outbox', () => {
  it('keeps an answer until the server has it', async () => {
    const { outbox, server, results } = setUp();
    outbox.put(letter(1));
    expect(outbox.state).toMatchObject({ unsent: 1, unsentAnswers: 1 });
    await outbox.flush();
    expect(outbox.state).toMatchObject({ unsent: 0, trouble: null });
    expect([...server.stored.keys()]).toEqual([uuidOf(1_001)]);
    expect(results).toHaveLength(1);
  });

  it('sends the same id and body again when the reply was lost, so that it counts once', async () => {
    const { outbox, server, waits } = setUp();
    server.lose = true;
    outbox.put(letter(1));
    await outbox.flush();
    expect(outbox.state).toMatchObject({ unsent: 1, trouble: 'waiting' });
    server.lose = false;
    waits[0]?.then();
    await outbox.flush();
    expect(server.requests).toBeGreaterThanOrEqual(2);
    expect(server.stored.size).toBe(1);
    expect(outbox.state).toMatchObject({ unsent: 0, trouble: null });
  });

  it('survives a reload, and keeps each person’s and club’s letters apart', async () => {
    const { outbox, storage } = setUp();
    outbox.put(letter(2));
    outbox.put(letter(1));
    expect(
      letterStore(storage, ANA)
        .read()
        .map((l) => l.id),
    ).toEqual([uuidOf(1_001), uuidOf(1_002)]);
    expect(letterStore(storage, { ...ANA, clubId: uuidOf(8) }).read()).toEqual([]);
    expect(letterStore(storage, { ...ANA, nickname: 'An' }).read()).toEqual([]);
    expect(letterStore(storage, { ...ANA, nickname: 'Ana/x' }).read()).toEqual([]);
  });

  it('passes over what it cannot read', () => {
    const { storage } = setUp();
    storage.setItem(`sixteenfold/answers/${ANA.clubId}/Ana/x`, '{"id":');
    expect(letterStore(storage, ANA).read()).toEqual([]);
  });

  it('goes on without storage', async () => {
    const { outbox, storage, server } = setUp();
    storage.full = true;
    outbox.put(letter(1));
    expect(outbox.state.unsent).toBe(1);
    await outbox.flush();
    expect(server.stored.size).toBe(1);
    expect(outbox.state.unsent).toBe(0);
  });

  it('says offline, tells those who wait, and tries again less and less often', async () => {
    const { outbox, server, waits, notTaken } = setUp({ isOnline: () => false });
    server.fail = new ApiError(0, null);
    outbox.put(letter(1));
    for (let k = 0; k < 6; k++) await outbox.flush();
    expect(outbox.state.trouble).toBe('offline');
    expect(notTaken).toContain(uuidOf(1_001));
    expect(waits.map(({ ms }) => ms)).toEqual([2_000, 4_000, 8_000, 16_000, 30_000, 30_000]);
  });

  it.each([429, 500, 503])('keeps answers at status %i', async (status) => {
    const { outbox, server } = setUp();
    server.fail = new ApiError(status, null);
    outbox.put(letter(1));
    await outbox.flush();
    expect(outbox.state).toMatchObject({ unsent: 1, trouble: 'waiting' });
  });

  it('keeps answers when the session has ended, and does not knock again by itself', async () => {
    const { outbox, server, waits } = setUp();
    server.fail = new ApiError(401, null);
    outbox.put(letter(1));
    await outbox.flush();
    expect(outbox.state).toMatchObject({ unsent: 1, trouble: 'signed-out' });
    expect(waits).toHaveLength(0);
  });

  it('drops what is refused for good, and says so', async () => {
    const { outbox, server, notTaken } = setUp();
    server.refuse = new Set([uuidOf(1_001)]);
    outbox.put(letter(1));
    outbox.put(letter(2));
    await outbox.flush();
    expect(outbox.state).toMatchObject({ unsent: 0, refused: { count: 1, detail: 'Not issued to you.' } });
    expect(notTaken).toEqual([uuidOf(1_001)]);
    expect([...server.stored.keys()]).toEqual([uuidOf(1_002)]);
    outbox.dismissRefused();
    expect(outbox.state.refused).toBeNull();
  });

  it('sends one by one what a request could not be taken for, so that one does not hold up the others', async () => {
    const server = new Server();
    const { outbox } = setUp({
      sendAnswers(answers) {
        if (answers.some(({ id }) => id === uuidOf(1_002))) throw new ApiError(400, null);
        return server.take(answers);
      },
    });
    for (const k of [1, 2, 3]) outbox.put(letter(k));
    await outbox.flush();
    expect([...server.stored.keys()]).toEqual([uuidOf(1_001), uuidOf(1_003)]);
    expect(outbox.state).toMatchObject({ unsent: 0, refused: { count: 1 } });
  });

  it.each([
    ['another club', { ...ANA, clubId: uuidOf(8) }, 'other-person'],
    ['another person', { ...ANA, nickname: 'Bo' }, 'other-person'],
    ['nobody', null, 'signed-out'],
  ] as const)('keeps refused answers when %s is signed in here now', async (_who, now, trouble) => {
    const { outbox, server } = setUp({ readPerson: async () => now });
    server.refuse = new Set([uuidOf(1_001)]);
    outbox.put(letter(1));
    await outbox.flush();
    expect(outbox.state).toMatchObject({ unsent: 1, trouble, refused: null });
  });

  it('sends in batches, oldest first, and mis-taps after the answers they speak of', async () => {
    const order: string[] = [];
    const { outbox } = setUp({
      async sendAnswers(answers) {
        order.push(`${answers.length} from ${answers[0]?.answeredAt}`);
        return new Server().take(answers);
      },
      async sendMisTap({ reviewId }) {
        order.push(reviewId);
        return someView([]);
      },
    });
    const tap = { reviewId: uuidOf(1_001), at: 0 };
    outbox.put({ kind: 'mis-tap', id: misTapId(tap), at: 0, body: tap });
    for (let k = 120; k >= 1; k--) outbox.put(letter(k));
    await outbox.flush();
    expect(order).toEqual(['50 from 1000', '50 from 51000', '20 from 101000', uuidOf(1_001)]);
    expect(outbox.state.unsent).toBe(0);
  });

  it('counts pictures that were left as letters, not as progress', () => {
    const { outbox } = setUp();
    outbox.put(letter(1, { named: 'left' }));
    expect(outbox.state).toMatchObject({ unsent: 1, unsentAnswers: 0 });
  });
});
