import type { SigningKeys } from '../../auth/tokens.ts';
import type { Ctx } from '../context.ts';

/** Sessions are the only services that make tokens, so only they are handed the keys. */
export interface SessionCtx extends Ctx {
  readonly keys: SigningKeys;
}

export interface Tokens {
  readonly access: string;
  readonly refresh: string;
}
