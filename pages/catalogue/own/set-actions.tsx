import { useState } from 'react';
import { useNavigate } from 'react-router';
import { useSend, useStore } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { Button, ConfirmDialog, LinkButton } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { setMakingText } from '#shared/text/set-making.ts';

const text = setMakingText.retire;

/** What a captain or an administrator may do with a set: make another of its cases, and retire their own. */
export function SetActions({
  setKey,
  name,
  retirable,
}: {
  setKey: string;
  name: string;
  retirable: boolean;
}) {
  const { role } = useSession();
  if (role === 'member') return null;
  return (
    <>
      <LinkButton kind="outlined" href={`/catalogue/${setKey}/subset`}>
        {setMakingText.subset.link}
      </LinkButton>
      {retirable && <Retire setKey={setKey} name={name} />}
    </>
  );
}

/** Asks before a set is retired, and says what stays. */
function Retire({ setKey, name }: { setKey: string; name: string }) {
  const [asking, setAsking] = useState(false);
  const navigate = useNavigate();
  const store = useStore();
  const send = useSend(endpoints.retireSet, {
    onDone: () => {
      void store.refresh(endpoints.catalogue);
      void navigate('/catalogue');
    },
  });
  return (
    <>
      <Button kind="outlined" tone="rose" onClick={() => setAsking(true)}>
        {text.link}
      </Button>
      <ConfirmDialog
        open={asking}
        title={text.title(name)}
        confirmLabel={text.confirm}
        cancelLabel={text.cancel}
        tone="rose"
        busy={send.isPending}
        onConfirm={() => {
          if (!send.isPending) send.mutate({ setKey });
        }}
        onCancel={() => {
          send.reset();
          setAsking(false);
        }}
      >
        <p>{text.body}</p>
        <p>{text.keeps}</p>
        {send.isError && (
          <p role="alert" className="font-bold text-rose">
            {send.error.message}
          </p>
        )}
      </ConfirmDialog>
    </>
  );
}
