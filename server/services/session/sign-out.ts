import { sql } from 'drizzle-orm';
import type { Ctx } from '../context.ts';

/** Ends this device's session; its tokens stop working with the next request. Signed out already: nothing to do. */
export async function signOut(ctx: Ctx): Promise<Record<string, never>> {
  const family = ctx.claims?.familyId;
  if (family) await ctx.db.execute(sql`select end_session(${family}::uuid, ${new Date(ctx.clock.now())})`);
  return {};
}
