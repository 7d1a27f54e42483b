import { type FormEvent, useState } from 'react';
import { useSend, useStore } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { Button, Details, TextField } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { setMakingText } from '#shared/text/set-making.ts';

const text = setMakingText.alias;

/** A captain gives a case the name their club has for it, changes it or takes it away. */
export function AliasForm(props: { setKey: string; caseKey: string; alias: string | null }) {
  const { role } = useSession();
  return role === 'captain' ? <Form key={props.caseKey} {...props} /> : null;
}

function Form({ setKey, caseKey, alias }: { setKey: string; caseKey: string; alias: string | null }) {
  const store = useStore();
  const [typed, setTyped] = useState(alias ?? '');
  const [said, setSaid] = useState('');
  const done = (words: string) => {
    setSaid(words);
    // Wherever the catalogue shows the case, it shows its name.
    for (const endpoint of [endpoints.catalogueCase, endpoints.catalogueSet]) void store.refresh(endpoint);
  };
  const save = useSend(endpoints.setAlias, { onDone: () => done(text.saved) });
  const clear = useSend(endpoints.clearAlias, {
    onDone: () => {
      setTyped('');
      save.reset();
      done(text.cleared);
    },
  });
  const busy = save.isPending || clear.isPending;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (busy) return;
    setSaid('');
    save.mutate({ setKey, key: caseKey, alias: typed });
  };
  return (
    <div className="screen-only max-w-[30rem]">
      <Details summary={text.open(alias !== null)}>
        <form onSubmit={submit} noValidate className="grid gap-4 pt-2">
          <TextField
            id="alias"
            label={text.label}
            hint={text.hint}
            autoComplete="off"
            maxLength={24}
            error={save.error?.message ?? clear.error?.message}
            value={typed}
            onChange={(event) => setTyped(event.currentTarget.value)}
          />
          <div className="flex flex-wrap items-center gap-3">
            <Button type="submit" busy={save.isPending}>
              {save.isPending ? text.saving : text.save}
            </Button>
            {alias !== null && (
              <Button
                kind="outlined"
                busy={clear.isPending}
                onClick={() => {
                  setSaid('');
                  clear.mutate({ setKey, key: caseKey });
                }}
              >
                {text.clear}
              </Button>
            )}
            <p role="status">{said}</p>
          </div>
        </form>
      </Details>
    </div>
  );
}
