import { useState } from 'react';
import { useNavigate } from 'react-router';
import { useSend, useStore } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { Button, ConfirmDialog, LinkButton, Notice } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { setMakingText } from '#shared/text/set-making.ts';

const text = setMakingText.retire;

/** What a captain or an administrator may do with a set: make another of its cases, and retire their own. */
export function SetActions({
  setKey,
  name,
  retired,
  retirable,
  inUse,
}: {
  setKey: string;
  name: string;
  retired: boolean;
  retirable: boolean;
  /** What it is in use for, in a sentence. */
  inUse: string | null;
}) {
  const { role } = useSession();
  if (role === 'member' || retired) return null;
  return (
    <>
      <LinkButton kind="outlined" href={`/catalogue/${setKey}/subset`}>
        {setMakingText.subset.link}
      </LinkButton>
      {retirable && <Retire setKey={setKey} name={name} inUse={inUse} />}
    </>
  );
}

/** Says what stands in the way of retiring a set; where nothing does, asks first and says what stays. */
function Retire({ setKey, name, inUse }: { setKey: string; name: string; inUse: string | null }) {
  const [asking, setAsking] = useState(false);
  const navigate = useNavigate();
  const store = useStore();
  const send = useSend(endpoints.retireSet, {
    onDone: () => {
      void store.refresh(endpoints.catalogue);
      void store.refresh(endpoints.catalogueSet);
      void navigate('/catalogue', { state: { retired: name } });
    },
  });
  const ask = () => {
    setAsking(true);
    // It may have been withdrawn since the page was read.
    if (inUse !== null) void store.refresh(endpoints.catalogueSet);
  };
  return (
    <>
      <Button kind="outlined" tone="rose" onClick={ask}>
        {text.link}
      </Button>
      {asking && inUse !== null && (
        <Notice tone="ochre" title={text.cannot} live>
          <p>{inUse}</p>
        </Notice>
      )}
      <ConfirmDialog
        open={asking && inUse === null}
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
