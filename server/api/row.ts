import type { z } from 'zod';
import type { Endpoint } from '#shared/contracts/endpoint.ts';
import type { Ctx } from '../services/context.ts';

/** `definer`: whoever may define a case set, a captain or an administrator. */
export type Who = 'anyone' | 'signed-in' | 'member' | 'captain' | 'administrator' | 'definer';

/** One endpoint as the server sees it: who may call, what goes in, what comes out, and the one service. */
export interface Row<Input, Output> {
  readonly endpoint: Endpoint<Input, Output>;
  readonly who: Who;
  readonly input: z.ZodType<Input>;
  readonly output: z.ZodType<Output>;
  readonly service: (ctx: Ctx, input: Input) => Promise<Output>;
  /** Answers are the same for everyone and may be kept by anyone so long, in seconds. */
  readonly keptSeconds?: number;
}

/** A row as the table holds it: input is checked by its schema before the service sees it. */
export interface AnyRow {
  readonly endpoint: Endpoint<never, unknown>;
  readonly who: Who;
  readonly keptSeconds: number | null;
  /** Validates, calls, and lets out only what the output schema names. */
  run(ctx: Ctx, input: unknown): Promise<unknown>;
}
