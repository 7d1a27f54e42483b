import { endpoints } from '#shared/contracts/endpoints.ts';
import { shellText } from '#shared/text/shell.ts';
import { useSend } from './api.ts';
import { useSession } from './session.tsx';

/** The way to a person's other clubs, and to the administration. Nothing for one who has no other place. */
export function ClubSwitch() {
  const { club, clubs, role, isAdministrator } = useSession();
  // A document load, so that nothing of the place before stays in memory.
  const change = useSend(endpoints.switchClub, { onDone: ({ next }) => window.location.assign(next) });
  const places = [
    ...clubs.filter((one) => one.clubId !== club?.clubId).map(({ clubId, name }) => ({ clubId, name })),
    ...(isAdministrator && role !== 'administrator'
      ? [{ clubId: null, name: shellText.administration }]
      : []),
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
          {shellText.switchTo(name)}
        </button>
      ))}
      {change.isError && (
        <span role="alert" className="text-rose">
          {shellText.switchFailed}
        </span>
      )}
    </>
  );
}
