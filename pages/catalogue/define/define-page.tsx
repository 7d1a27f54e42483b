import { type FormEvent, useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router';
import { type ApiError, useCall, useSend, useStore } from '#renderer/api.ts';
import { useSession } from '#renderer/session.tsx';
import { Button, ErrorSummary, PageTitle, TextField, TextLink } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { setMakingText } from '#shared/text/set-making.ts';
import { AspectChoices } from './aspect-choices.tsx';
import { type Definition, readDefinition, sharesOf, writeDefinition } from './definition.ts';
import { EntryFields } from './entry-fields.tsx';
import { Preview } from './preview.tsx';
import { stillWrong, type Wrong, wrongShares } from './wrong.ts';

const text = setMakingText.define;

/** A set is defined: its entries, what is told apart and solved, with what that comes to beside. */
export function DefinePage() {
  const { role } = useSession();
  const [search, setSearch] = useSearchParams();
  const navigate = useNavigate();
  const store = useStore();
  const [name, setName] = useState('');
  const [definition, setDefinition] = useState(() => readDefinition(Object.fromEntries(search)));
  const [wrong, setWrong] = useState<readonly Wrong[]>([]);
  const preview = useCall(endpoints.previewSet, writeDefinition(definition), { keepWhileLoading: true });
  const send = useSend(endpoints.defineSet, {
    onDone: ({ setKey }) => {
      void store.refresh(endpoints.catalogue);
      void navigate(`/catalogue/${setKey}`);
    },
  });

  const change = (part: Partial<Definition>) => {
    const next = { ...definition, ...part };
    setDefinition(next);
    setWrong((all) => stillWrong(all, next));
    setSearch(writeDefinition(next), { replace: true, preventScrollReset: true });
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (send.isPending) return;
    const shares = wrongShares(definition);
    setWrong(shares);
    if (shares.length > 0) return;
    const { toldApart, solved } = definition;
    send.mutate(
      {
        kind: 'whole',
        name,
        entries: sharesOf(definition),
        toldApart: [...toldApart],
        solved: [...solved],
      },
      { onError: (error) => setWrong(wrongOf(error)) },
    );
  };
  const errorAt = (fieldId: string) => wrong.find((one) => one.fieldId === fieldId)?.message;

  return (
    <>
      <PageTitle
        title={text.title}
        lead={role === 'administrator' ? text.lead.administrator : text.lead.captain}
      >
        <TextLink href="/catalogue" className="inline-flex min-h-12 items-center">
          {text.back}
        </TextLink>
      </PageTitle>
      <div className="grid items-start gap-x-14 gap-y-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
        <form onSubmit={submit} noValidate className="grid gap-7">
          <ErrorSummary title={setMakingText.problemTitle} errors={wrong} />
          <TextField
            id="define-name"
            label={text.name}
            hint={text.nameHint}
            autoComplete="off"
            maxLength={40}
            error={errorAt('define-name')}
            value={name}
            onChange={(event) => {
              setName(event.currentTarget.value);
              setWrong((all) => all.filter(({ fieldId }) => fieldId !== 'define-name'));
            }}
          />
          <EntryFields
            entries={definition.entries}
            errorAt={(at) => errorAt(`define-parts-${at}`)}
            onChange={(entries) => change({ entries })}
          />
          <div className="grid items-start gap-6 sm:grid-cols-2">
            <AspectChoices
              id="define-told"
              legend={text.toldApart}
              hint={text.toldApartHint}
              error={errorAt('define-told')}
              value={definition.toldApart}
              onChange={(toldApart) => change({ toldApart })}
            />
            <AspectChoices
              id="define-solved"
              legend={text.solved}
              hint={text.solvedHint}
              value={definition.solved}
              onChange={(solved) => change({ solved })}
            />
          </div>
          <p>
            <Button type="submit" busy={send.isPending}>
              {send.isPending ? setMakingText.saving : text.make}
            </Button>
          </p>
        </form>
        <Preview query={preview} mixed={definition.entries.length > 1} />
      </div>
    </>
  );
}

const FIELDS: readonly (readonly [pointer: string, fieldId: string])[] = [
  ['/name', 'define-name'],
  ['/entries', 'define-entry-0'],
];

/** The server's refusals at the fields they speak of. */
function wrongOf(error: ApiError): Wrong[] {
  const details = error.problem?.errors ?? [{ pointer: '', detail: error.message }];
  return details.map(({ pointer, detail }) => ({
    fieldId: FIELDS.find(([start]) => pointer.startsWith(start))?.[1] ?? 'define-told',
    message: detail,
  }));
}
