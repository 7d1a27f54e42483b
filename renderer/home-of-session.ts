import type { SessionView } from '#shared/contracts/session.ts';

/** The first place of a role. */
export function homeOfSession(role: SessionView['role']): string {
  return role === 'administrator' ? '/admin/intake' : role === 'captain' ? '/desk/squad' : '/today';
}
