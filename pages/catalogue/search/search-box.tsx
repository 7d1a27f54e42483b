import type { FormEvent } from 'react';
import { useNavigate } from 'react-router';
import { Button, TextField } from '#renderer/ui/index.ts';
import { catalogueSearchText } from '#shared/text/catalogue-search.ts';

const text = catalogueSearchText;

/** One box for names, numbers, algorithms and scrambles; a plain form before scripts are there. */
export function SearchBox({ q }: { q: string }) {
  const navigate = useNavigate();
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const words = String(new FormData(event.currentTarget).get('q') ?? '').trim();
    void navigate(words === '' ? '/catalogue' : `/catalogue?${new URLSearchParams({ q: words })}`);
  };
  return (
    <search className="screen-only block pb-6">
      <form
        key={q}
        action="/catalogue"
        method="get"
        onSubmit={submit}
        className="grid max-w-[46rem] grid-cols-[minmax(0,1fr)_auto] items-end gap-x-3"
      >
        <TextField
          id="catalogue-find"
          name="q"
          type="search"
          label={text.label}
          placeholder={text.hint}
          defaultValue={q}
          maxLength={300}
          autoComplete="off"
          autoCapitalize="off"
          spellCheck={false}
        />
        <Button type="submit">{text.find}</Button>
      </form>
    </search>
  );
}
