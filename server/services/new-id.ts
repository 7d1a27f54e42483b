import { v7 } from 'uuid';
import type { Deps } from './context.ts';

/** A UUIDv7 (RFC 9562) of this moment, its random bits from the context: a simulation gets the same ids again. */
export function newId({ clock, random }: Pick<Deps, 'clock' | 'random'>): string {
  const bytes = Uint8Array.from({ length: 16 }, () => Math.floor(random() * 256));
  return v7({ msecs: clock.now(), random: bytes });
}
