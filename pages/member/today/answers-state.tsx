import { Button, TextLink } from '#renderer/ui/index.ts';
import { todayText } from '#shared/text/today.ts';
import type { Outbox, OutboxState } from './outbox.ts';

/** How the answers stand: a quiet line while they wait, plain words where the person has to do something. */
export function AnswersState({ outbox, state }: { outbox: Outbox | null; state: OutboxState }) {
  const { answers } = todayText;
  const { unsent, trouble, refused } = state;
  return (
    <div role="status" className="pt-3 text-[0.9375rem] text-ink-2 empty:hidden">
      {trouble === 'signed-out' && (
        <p className="border-s-4 border-ochre ps-3 text-ink">
          {answers.signedOut(unsent)}{' '}
          <a className="link" href="/sign-in?next=%2Ftoday">
            {answers.signIn}
          </a>
        </p>
      )}
      {trouble === 'other-person' && (
        <p className="border-s-4 border-ochre ps-3 text-ink">
          {answers.otherPerson}{' '}
          <a className="link" href="/today">
            {answers.reload}
          </a>
        </p>
      )}
      {trouble === 'offline' && <p>{answers.offline(unsent)}</p>}
      {trouble === 'waiting' && <p>{answers.waiting(unsent)}</p>}
      {refused && (
        <p className="flex flex-wrap items-baseline justify-between gap-x-4 border-s-4 border-rose ps-3 text-ink">
          <span>{answers.refused(refused.count, refused.detail)}</span>
          <Button kind="plain" size="small" onClick={() => outbox?.dismissRefused()}>
            {answers.dismiss}
          </Button>
        </p>
      )}
    </div>
  );
}

/** Nothing left on the device, and answers that have not reached the club. */
export function RunOutScreen({ outbox }: { outbox: Outbox | null }) {
  return (
    <div className="flex flex-1 flex-col items-start justify-center gap-3 py-8">
      <h2 className="text-xl font-bold">{todayText.runOut.title}</h2>
      <p className="text-ink-2">{todayText.runOut.detail}</p>
      <Button kind="outlined" onClick={() => void outbox?.flush()}>
        {todayText.answers.retry}
      </Button>
      <p>
        <TextLink href="/cases">{todayText.toCases}</TextLink>
      </p>
    </div>
  );
}
