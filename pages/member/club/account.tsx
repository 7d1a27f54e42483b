import { useSend } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { SignOutButton } from '#renderer/sign-out-button.tsx';
import { Button, LinkButton, Notice } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { memberText } from '#shared/text/member.ts';
import { useOutbox, useOutboxState } from '../today/use-outbox.ts';

const text = memberText.club;

/** Who is signed in here, the way to their other clubs, and out. */
export function Account() {
  const session = useSession();
  const { unsent } = useOutboxState(useOutbox());
  // A document load, so that nothing of the club before stays in memory.
  const change = useSend(endpoints.switchClub, { onDone: ({ next }) => window.location.assign(next) });
  const others = session.clubs.filter(({ clubId }) => clubId !== session.club?.clubId);
  return (
    <div className="flex flex-col items-start gap-4">
      <p>{text.signedInAs(session.nickname ?? '', session.club?.name ?? '')}</p>
      {session.role === 'captain' && (
        <LinkButton kind="outlined" href="/desk/squad">
          {text.toDesk}
        </LinkButton>
      )}
      {others.length > 0 && (
        <div>
          <p className="pb-1 text-[0.9375rem] text-ink-2">{text.switchTo}</p>
          <div className="flex flex-wrap gap-3">
            {others.map(({ clubId, name, role }) => (
              <Button
                key={clubId}
                kind="outlined"
                busy={change.isPending}
                onClick={() => change.mutate({ clubId })}
              >
                {text.switchKey(name, text.roles[role])}
              </Button>
            ))}
          </div>
          {change.isError && (
            <Notice tone="rose" live>
              <p>{change.error.message}</p>
            </Notice>
          )}
        </div>
      )}
      {unsent > 0 && (
        <Notice tone="ochre">
          <p>{text.unsent(unsent)}</p>
        </Notice>
      )}
      <SignOutButton />
    </div>
  );
}
