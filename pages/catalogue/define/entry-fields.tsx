import { Button, SelectField, TextField } from '#renderer/ui/index.ts';
import { ENTRIES } from '#shared/contracts/entries.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { setMakingText } from '#shared/text/set-making.ts';
import { type Definition, wholeOf } from './definition.ts';

const text = setMakingText.define;
const { entry: inWords } = catalogueText.sets;
type Entries = Definition['entries'];

/** How solves arrive at the step: one way, or several with the share of each. */
export function EntryFields({
  entries,
  errorAt,
  onChange,
}: {
  entries: Entries;
  errorAt(at: number): string | undefined;
  onChange(entries: Entries): void;
}) {
  const mixed = entries.length > 1;
  const all = wholeOf(entries);
  const taken = new Set(entries.map(({ entry }) => entry));
  const free = ENTRIES.find((entry) => !taken.has(entry));
  const replace = (at: number, part: Partial<Entries[number]>) =>
    onChange(entries.map((one, k) => (k === at ? { ...one, ...part } : one)));
  return (
    <fieldset className="min-w-0">
      <legend className="pb-2 text-lg font-bold">{text.arrive}</legend>
      {mixed && <p className="pb-3 text-sm text-ink-2">{text.partsHint}</p>}
      <ol className="grid gap-5">
        {entries.map(({ entry, parts }, at) => (
          <li
            key={entry}
            className="grid items-end gap-x-4 gap-y-2 sm:grid-cols-[minmax(0,1fr)_11rem_auto] has-[p.text-rose]:items-start"
          >
            <SelectField
              id={`define-entry-${at}`}
              label={text.entry(mixed ? at + 1 : null)}
              value={entry}
              onChange={({ currentTarget: { value } }) => {
                const chosen = ENTRIES.find((one) => one === value);
                if (chosen) replace(at, { entry: chosen });
              }}
              options={ENTRIES.map((one) => ({
                value: one,
                label: inWords(one),
                disabled: one !== entry && taken.has(one),
              }))}
            />
            {mixed && (
              <TextField
                id={`define-parts-${at}`}
                label={text.parts(at + 1)}
                hint={all === null ? undefined : text.share(Number(parts) / all)}
                error={errorAt(at)}
                inputMode="numeric"
                autoComplete="off"
                value={parts}
                onChange={(event) => replace(at, { parts: event.currentTarget.value.trim() })}
              />
            )}
            {mixed && (
              <Button
                kind="plain"
                aria-label={text.removeEntry(inWords(entry))}
                onClick={() => onChange(entries.filter((_, k) => k !== at))}
              >
                {text.remove}
              </Button>
            )}
          </li>
        ))}
      </ol>
      {free && (
        <p className="pt-3">
          <Button
            kind="outlined"
            size="small"
            onClick={() => onChange([...entries, { entry: free, parts: '1' }])}
          >
            {text.addEntry}
          </Button>
        </p>
      )}
    </fieldset>
  );
}
