import { useSend } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { adminText } from '#shared/text/admin.ts';

/** The way to the clubs an administrator is in as well. Nothing for one who is in none. */
export function ClubSwitch() {
  const { clubs } = useSession();
  // A document load, so that nothing of the place before stays in memory.
  const change = useSend(endpoints.switchClub, { onDone: ({ next }) => window.location.assign(next) });
  if (clubs.length === 0) return null;
  return (
    <span className="flex flex-wrap items-center gap-x-3">
      <span>{adminText.workIn}</span>
      {clubs.map(({ clubId, name }) => (
        <button
          key={clubId}
          type="button"
          disabled={change.isPending}
          onClick={() => change.mutate({ clubId })}
          className="min-h-12 underline underline-offset-4 hover:text-ink"
        >
          {adminText.switchTo(name)}
        </button>
      ))}
      {change.isError && (
        <span role="alert" className="text-rose">
          {adminText.switchFailed}
        </span>
      )}
    </span>
  );
}
