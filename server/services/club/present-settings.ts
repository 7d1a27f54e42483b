import type { tables } from '#database/client.ts';
import type { MemberSettings } from '#shared/contracts/member.ts';

type MembershipRow = typeof tables.membership.$inferSelect;

/** What a member may set for themselves. */
export function presentSettings({
  minutesPerDay,
  onBoards,
  holding,
  crossColours,
}: Pick<MembershipRow, keyof MemberSettings>): MemberSettings {
  return { minutesPerDay, onBoards, holding, crossColours };
}
