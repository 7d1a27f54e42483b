import { hash, verify } from '@node-rs/argon2';

/** OWASP Password Storage: argon2id (the library's default variant), 19 MiB, two passes, one lane. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** At most this many hashes at once: each holds 19 MiB and a worker thread. */
const AT_ONCE = 3;
let running = 0;
const waiting: (() => void)[] = [];

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) await new Promise<void>((go) => waiting.push(go));
  running += 1;
  try {
    return await work();
  } finally {
    running -= 1;
    waiting.shift()?.();
  }
}

/** PHC string of a password, for the tables. */
export function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password.normalize('NFC'), COST));
}

let decoy: Promise<string> | undefined;

/**
 * Whether the password belongs to the hash. With no hash (unknown person) the same work is done against a
 * decoy, so that the time taken says nothing.
 */
export async function verifyPassword(phc: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('no one signs in with this');
  const against = phc ?? (await decoy);
  const right = await inTurn(() => verify(against, password.normalize('NFC')));
  return phc !== null && right;
}

/** Whether a stored hash was made with another cost than today's and wants making again at sign-in. */
export function needsRehash(phc: string): boolean {
  return !phc.startsWith('$argon2id$v=19$m=19456,t=2,p=1$');
}
