import type { FormEvent } from 'react';
import { useLocation, useNavigate, useSearchParams } from 'react-router';
import { queryHref } from '#renderer/query-href.ts';
import { Button, SelectField, TextField } from '#renderer/ui/index.ts';
import { useRestingText } from '#renderer/use-resting-text.ts';
import { useScripts } from '#renderer/use-scripts.ts';
import type { CatalogueSetView } from '#shared/contracts/catalogue.ts';
import { catalogueText } from '#shared/text/catalogue.ts';

const text = catalogueText.set;

/** What narrows the list. It all stands in the address, and works as a plain form before scripts are there. */
export function SetFilters({ view }: { view: CatalogueSetView }) {
  const [search] = useSearchParams();
  const { pathname } = useLocation();
  const navigate = useNavigate();
  const scripts = useScripts();
  const at = (name: string) => search.get(name) ?? '';
  const change = (part: Record<string, string>) => {
    const words = Object.entries(part).map(([name, value]) => [name, value.trim() === '' ? null : value]);
    const href = queryHref(search, pathname, { ...Object.fromEntries(words), after: null, before: null });
    void navigate(href, { replace: true, preventScrollReset: true });
  };
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const data = new FormData(event.currentTarget);
    change({ q: String(data.get('q') ?? '') });
  };
  return (
    <search className="screen-only block pb-4">
      <form
        action={pathname}
        method="get"
        onSubmit={submit}
        className="grid grid-cols-2 items-end gap-x-4 gap-y-3 lg:grid-cols-[minmax(0,2fr)_repeat(3,minmax(0,1fr))]"
      >
        {['sort', 'edition'].map((name) =>
          at(name) ? <input key={name} type="hidden" name={name} value={at(name)} /> : null,
        )}
        <div className="col-span-2 lg:col-span-1">
          <FindField inAddress={at('q')} onFind={(q) => change({ q })} />
        </div>
        <div className="col-span-2 lg:col-span-1">
          <SelectField
            id="set-group"
            name="group"
            label={text.group}
            value={at('group')}
            disabled={view.groups.length === 0}
            onChange={(event) => change({ group: event.target.value })}
            options={[
              { value: '', label: text.allGroups },
              ...view.groups.map(({ name, cases }) => ({ value: name, label: text.choice(name, cases) })),
            ]}
          />
        </div>
        <SelectField
          id="set-angles"
          name="angles"
          label={text.angles}
          value={at('angles')}
          onChange={(event) => change({ angles: event.target.value })}
          options={[
            { value: '', label: text.anyAngles },
            ...view.angles.map(({ angles, cases }) => ({
              value: String(angles),
              label: text.choice(String(angles), cases),
            })),
          ]}
        />
        <SelectField
          id="set-algorithms"
          name="algorithms"
          label={text.algorithms}
          value={at('algorithms')}
          onChange={(event) => change({ algorithms: event.target.value })}
          options={[
            { value: '', label: text.anyAlgorithms },
            { value: 'with', label: text.choice(text.with, view.withAlgorithm) },
            { value: 'without', label: text.choice(text.without, view.cases - view.withAlgorithm) },
          ]}
        />
        {!scripts && (
          <Button kind="outlined" type="submit">
            {text.show}
          </Button>
        )}
      </form>
    </search>
  );
}

function FindField({ inAddress, onFind }: { inAddress: string; onFind: (text: string) => void }) {
  const [letters, setLetters] = useRestingText(inAddress, onFind);
  return (
    <TextField
      id="set-find"
      name="q"
      type="search"
      label={text.find}
      placeholder={text.findHint}
      value={letters}
      maxLength={100}
      autoComplete="off"
      onChange={(event) => setLetters(event.target.value)}
    />
  );
}
