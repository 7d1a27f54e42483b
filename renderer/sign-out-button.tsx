import { endpoints } from '#shared/contracts/endpoints.ts';
import { shellText } from '#shared/text/shell.ts';
import { useSend } from './api.ts';

/** Ends the session and leaves for the first page: a document load, so nothing of this person stays in memory. */
export function SignOutButton({ className = '' }: { className?: string }) {
  const signOut = useSend(endpoints.signOut, { onDone: () => window.location.assign('/') });
  return (
    <button
      type="button"
      className={`min-h-12 cursor-pointer text-ink-2 underline underline-offset-4 ${className}`}
      disabled={signOut.isPending}
      onClick={() => signOut.mutate({})}
    >
      {shellText.signOut}
    </button>
  );
}
