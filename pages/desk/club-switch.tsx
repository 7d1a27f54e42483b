import { useSend } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { deskText } from '#shared/text/desk.ts';

const text = deskText.elsewhere;

/** The way to a captain's other clubs, and to the administration. Nothing for one who has no other place. */
export function ClubSwitch() {
  const { club, clubs, isAdministrator } = useSession();
  // A document load, so that nothing of this club stays in memory.
  const change = useSend(endpoints.switchClub, { onDone: ({ next }) => window.location.assign(next) });
  const places = [
    ...clubs.filter((one) => one.clubId !== club?.clubId).map(({ clubId, name }) => ({ clubId, name })),
    ...(isAdministrator ? [{ clubId: null, name: text.administration }] : []),
  ];
  if (places.length === 0) return null;
  return (
    <>
      {places.map(({ clubId, name }) => (
        <button
          key={clubId ?? 'administration'}
          type="button"
          disabled={change.isPending}
          onClick={() => change.mutate({ clubId })}
          className="min-h-12 underline underline-offset-4 hover:text-ink"
        >
          {text.switchTo(name)}
        </button>
      ))}
      {change.isError && (
        <span role="alert" className="text-rose">
          {text.failed}
        </span>
      )}
    </>
  );
}
