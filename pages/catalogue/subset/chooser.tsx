import { type FormEvent, useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router';
import { type ApiError, useSend, useStore } from '#renderer/api.ts';
import { Button, ErrorSummary, SelectField, TextField } from '#renderer/ui/index.ts';
import type { CaseChoices } from '#shared/contracts/case-sets.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { setMakingText } from '#shared/text/set-making.ts';
import { dealtShare, groupCases, groupingsOf, withCases } from './choosing.ts';
import { GroupOfCases } from './group-of-cases.tsx';

const text = setMakingText.subset;
const { define } = setMakingText;

interface Wrong {
  readonly fieldId: string;
  readonly message: string;
}

/** The cases in groups to choose from, and the name under which the choice is kept. */
export function Chooser({ view }: { view: CaseChoices }) {
  const [search, setSearch] = useSearchParams();
  const navigate = useNavigate();
  const store = useStore();
  const [name, setName] = useState('');
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set());
  const [wrong, setWrong] = useState<readonly Wrong[]>([]);
  const send = useSend(endpoints.defineSet, {
    onDone: ({ setKey }) => {
      void store.refresh(endpoints.catalogue);
      void navigate(`/catalogue/${setKey}`);
    },
  });
  const groupings = groupingsOf(view.cases);
  const by = groupings.find((one) => one === search.get('by')) ?? groupings[0] ?? null;
  const groups = groupCases(view.cases, by);
  const known = view.cases.filter((c) => c.known);

  /** What is chosen anew; what was wrong with the choice before is gone with it. */
  const choose = (next: ReadonlySet<string>) => {
    setChosen(next);
    setWrong((all) => all.filter(({ fieldId }) => fieldId !== 'subset-all'));
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (send.isPending) return;
    if (chosen.size === 0) {
      setWrong([{ fieldId: 'subset-all', message: text.nothing }]);
      return;
    }
    setWrong([]);
    send.mutate(
      { kind: 'subset', name, parentKey: view.setKey, caseKeys: [...chosen] },
      { onError: (error) => setWrong(wrongOf(error)) },
    );
  };
  return (
    <form
      onSubmit={submit}
      noValidate
      className="grid items-start gap-x-14 gap-y-8 lg:grid-cols-[minmax(0,1fr)_20rem]"
    >
      <div className="min-w-0">
        <div className="flex flex-wrap items-end gap-x-4 gap-y-3 pb-5">
          {by !== null && (
            <div className="w-full sm:w-64">
              <SelectField
                id="subset-by"
                label={text.by}
                value={by}
                onChange={({ currentTarget: { value } }) =>
                  setSearch({ by: value }, { replace: true, preventScrollReset: true })
                }
                options={groupings.map((one) => ({ value: one, label: text.byWords[one] }))}
              />
            </div>
          )}
          <Button id="subset-all" kind="outlined" onClick={() => choose(withCases(chosen, view.cases, true))}>
            {text.all}
          </Button>
          <Button kind="outlined" onClick={() => choose(new Set())}>
            {text.none}
          </Button>
          {known.length > 0 && known.length < view.cases.length && (
            <Button kind="outlined" onClick={() => choose(withCases(new Set(), known, true))}>
              {text.known}
            </Button>
          )}
        </div>
        <ul className="rule-t">
          {groups.map((group) => (
            <GroupOfCases
              key={`${by} ${group.name}`}
              group={group}
              alone={groups.length === 1}
              chosen={chosen}
              onTake={(cases, take) => choose(withCases(chosen, cases, take))}
            />
          ))}
        </ul>
      </div>
      <div className="grid gap-5 lg:sticky lg:top-6">
        <ErrorSummary title={setMakingText.problemTitle} errors={wrong} />
        <p role="status" className="leading-snug">
          <b className="block text-xl">{text.chosen(chosen.size, view.cases.length)}</b>
          <span className="text-ink-2">{text.dealt(dealtShare(view, chosen))}</span>
        </p>
        <TextField
          id="subset-name"
          label={define.name}
          hint={define.nameHint}
          autoComplete="off"
          maxLength={40}
          error={wrong.find(({ fieldId }) => fieldId === 'subset-name')?.message}
          value={name}
          onChange={(event) => {
            setName(event.currentTarget.value);
            setWrong((all) => all.filter(({ fieldId }) => fieldId !== 'subset-name'));
          }}
        />
        <p>
          <Button type="submit" busy={send.isPending}>
            {send.isPending ? setMakingText.saving : text.make}
          </Button>
        </p>
      </div>
    </form>
  );
}

/** The server's refusals at the fields they speak of. */
function wrongOf(error: ApiError): Wrong[] {
  const details = error.problem?.errors ?? [{ pointer: '', detail: error.message }];
  return details.map(({ pointer, detail }) => ({
    fieldId: pointer === '/name' ? 'subset-name' : 'subset-all',
    message: detail,
  }));
}
