import { useState, useSyncExternalStore } from 'react';
import { ApiError, send } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { SessionView } from '#shared/contracts/session.ts';
import { letterStore, type Person } from './letter-store.ts';
import { Outbox, type OutboxState } from './outbox.ts';

/** One per person and club for as long as the document lives: it goes on sending when Today is left. */
const outboxes = new Map<string, Outbox>();

const NOTHING: OutboxState = { unsent: 0, unsentAnswers: 0, trouble: null, refused: null };

function personOf(session: SessionView): Person | null {
  return session.club && session.nickname !== null
    ? { clubId: session.club.clubId, nickname: session.nickname }
    : null;
}

async function readPerson(): Promise<Person | null> {
  try {
    return personOf(await send(call(endpoints.readSession, {})));
  } catch (error) {
    if (error instanceof ApiError && error.status === 401) return null;
    throw error;
  }
}

/** A request that hangs longer is given up and tried again; ids make that safe. */
const PATIENCE_MS = 15_000;

function patiently<T>(request: Promise<T>): Promise<T> {
  return new Promise((resolve, reject) => {
    const timer = setTimeout(() => reject(new ApiError(0, null)), PATIENCE_MS);
    request.then(resolve, reject).finally(() => clearTimeout(timer));
  });
}

function outboxOf(person: Person): Outbox {
  const key = `${person.clubId} ${person.nickname}`;
  const known = outboxes.get(key);
  if (known) return known;
  const outbox = new Outbox({
    store: letterStore(window.localStorage, person),
    person,
    sendAnswers: (answers) => patiently(send(call(endpoints.answer, { answers: [...answers] }))),
    sendMisTap: (input) => patiently(send(call(endpoints.misTap, input))),
    readPerson,
    isOnline: () => navigator.onLine,
    later(ms, then) {
      const timer = setTimeout(then, ms);
      return () => clearTimeout(timer);
    },
  });
  window.addEventListener('online', () => void outbox.flush());
  outboxes.set(key, outbox);
  return outbox;
}

/** The outbox of whoever is signed in; null while rendered on the server. */
export function useOutbox(): Outbox | null {
  const person = personOf(useSession());
  const [outbox] = useState(() => (import.meta.env.SSR || !person ? null : outboxOf(person)));
  return outbox;
}

/** How the answers stand; nothing unsent, as far as the server's rendering knows. */
export function useOutboxState(outbox: Outbox | null): OutboxState {
  return useSyncExternalStore(
    (changed) => outbox?.watch(changed) ?? (() => {}),
    () => outbox?.state ?? NOTHING,
    () => NOTHING,
  );
}
