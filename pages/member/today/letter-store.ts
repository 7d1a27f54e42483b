import type { AnswerInput, MisTapInput } from '#shared/contracts/today.ts';

/** Whose letters they are: a nickname is unique within its club. */
export interface Person {
  readonly clubId: string;
  readonly nickname: string;
}

export type Letter =
  | { readonly kind: 'answer'; readonly id: string; readonly at: number; readonly body: AnswerInput }
  | { readonly kind: 'mis-tap'; readonly id: string; readonly at: number; readonly body: MisTapInput };

export interface LetterStore {
  /** Oldest first. */
  read(): Letter[];
  write(letter: Letter): void;
  remove(id: string): void;
}

const ROOT = 'sixteenfold/answers/';

/**
 * Letters in the browser's storage, one item each, so that two tabs never overwrite each other's. Written in
 * the same tick, so an answer given while the page is being left is kept.
 */
export function letterStore(storage: Storage, person: Person): LetterStore {
  const prefix = `${ROOT}${person.clubId}/${encodeURIComponent(person.nickname)}/`;
  // Where the browser refuses to store (private windows, a full disk), letters live as long as the page.
  const unstored = new Map<string, Letter>();
  return {
    read() {
      const letters = new Map(unstored);
      for (let k = 0; k < storage.length; k++) {
        const name = storage.key(k);
        if (!name?.startsWith(prefix)) continue;
        const letter = parse(storage.getItem(name));
        if (letter) letters.set(letter.id, letter);
      }
      return [...letters.values()].sort((a, b) => a.at - b.at || (a.id < b.id ? -1 : 1));
    },
    write(letter) {
      try {
        storage.setItem(prefix + letter.id, JSON.stringify(letter));
      } catch {
        unstored.set(letter.id, letter);
      }
    },
    remove(id) {
      unstored.delete(id);
      storage.removeItem(prefix + id);
    },
  };
}

function parse(text: string | null): Letter | null {
  if (text === null) return null;
  try {
    const letter = JSON.parse(text) as Letter;
    return typeof letter.id === 'string' && typeof letter.body === 'object' ? letter : null;
  } catch {
    return null;
  }
}

export function samePerson(a: Person, b: Person): boolean {
  return a.clubId === b.clubId && a.nickname === b.nickname;
}
