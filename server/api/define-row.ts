import type { z } from 'zod';
import { type FieldError, forbidden, Problem, signedOut } from '../http/problem.ts';
import type { Ctx } from '../services/context.ts';
import type { AnyRow, Row, Who } from './row.ts';

/** First wall: the token's role. The service asks again, against the tables. */
function checkRole(ctx: Ctx, who: Who): void {
  if (who === 'anyone') return;
  if (!ctx.claims) throw signedOut();
  const { role } = ctx.claims;
  if (who === 'administrator' && role !== 'administrator')
    throw forbidden('Only an administrator can do this.');
  if (who === 'captain' && role !== 'captain') throw forbidden('Only a captain of the club can do this.');
  if (who === 'definer' && role === 'member')
    throw forbidden('Only a captain or an administrator can do this.');
  if (who === 'member' && role === 'administrator') {
    throw forbidden('This place belongs to a club. Switch to one first.');
  }
}

export function fieldErrors(error: z.ZodError): FieldError[] {
  return error.issues.map((issue) => ({
    pointer: `/${issue.path.map(String).join('/')}`,
    detail: issue.code === 'unrecognized_keys' ? `Not known here: ${issue.keys.join(', ')}.` : issue.message,
  }));
}

/**
 * Input as its schema says. @throws Problem invalid, naming every field that is wrong.
 */
export function validate<T>(schema: z.ZodType<T>, input: unknown): T {
  const parsed = schema.safeParse(input);
  if (parsed.success) return parsed.data;
  const errors = fieldErrors(parsed.error);
  throw new Problem('invalid', errors.map((e) => e.detail).join(' '), { errors });
}

export function defineRow<Input, Output>(row: Row<Input, Output>): AnyRow {
  return {
    endpoint: row.endpoint as AnyRow['endpoint'],
    who: row.who,
    keptSeconds: row.keptSeconds ?? null,
    async run(ctx, input) {
      checkRole(ctx, row.who);
      return row.output.parse(await row.service(ctx, validate(row.input, input)));
    },
  };
}
