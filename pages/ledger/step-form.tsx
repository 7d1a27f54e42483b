import type { ReactNode } from 'react';
import { Button, ChoiceGroup, Details } from '#renderer/ui/index.ts';
import type { Aspect, Entry } from '#shared/lastlayer/index.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { FIELDS, type LedgerForm } from './ledger-query.ts';

const text = ledgerText.form;
const ENTRIES = (Object.entries(ledgerText.entries) as [Entry, string][]).map(([value, label]) => ({
  value,
  label,
}));
/** The six that have sets with trade names come first. */
const [USUAL, MORE] = [ENTRIES.slice(0, 6), ENTRIES.slice(6)];
const ASPECTS = Object.entries(ledgerText.aspects) as [Aspect, string][];

export interface StepFormProps {
  readonly id: string;
  readonly asked: LedgerForm;
  /** What the entry condition has done already: telling it apart changes nothing. */
  readonly done: readonly Aspect[];
  readonly errorOf: (fieldId: string) => string | undefined;
  /** Scripts are at work: a choice counts at once and no key is needed. */
  readonly atOnce: boolean;
  readonly onChange: (next: LedgerForm) => void;
  /** Under the aspects: where to go on from here. */
  readonly children?: ReactNode;
}

/** The step to be counted. A plain form: without scripts its key asks for the page again. */
export function StepForm({ id, asked, done, errorOf, atOnce, onChange, children }: StepFormProps) {
  const entry = {
    name: 'entry',
    kind: 'one',
    paired: true,
    value: [asked.entry],
    onChange: ({ target }: { target: HTMLInputElement }) => {
      const next = target.value as Entry;
      onChange({ ...asked, entry: next, with: asked.with === next ? null : asked.with });
    },
  } as const;
  return (
    <form
      id={id}
      method="get"
      action="/ledger"
      className="screen-only flex flex-col gap-5"
      onSubmit={(event) => event.preventDefault()}
    >
      <div>
        <ChoiceGroup
          {...entry}
          id={FIELDS.entry}
          legend={text.entry}
          error={errorOf(FIELDS.entry)}
          choices={USUAL}
        />
        <Details summary={text.moreEntries} open={MORE.some(({ value }) => value === asked.entry)}>
          <ChoiceGroup {...entry} id="entry-more" legend={text.moreEntriesLegend} choices={MORE} />
        </Details>
      </div>
      <ChoiceGroup
        id={FIELDS.aspects}
        name="aspects"
        legend={text.aspects}
        kind="many"
        paired
        error={errorOf(FIELDS.aspects)}
        choices={ASPECTS.map(([value, label]) => ({
          value,
          label,
          hint: done.includes(value) ? text.done : undefined,
        }))}
        value={asked.aspects}
        onChange={({ target }) =>
          onChange({
            ...asked,
            aspects: ASPECTS.map(([aspect]) => aspect).filter((aspect) =>
              aspect === target.value ? target.checked : asked.aspects.includes(aspect),
            ),
          })
        }
      />
      {children}
      {!atOnce && <Button type="submit">{text.go}</Button>}
    </form>
  );
}
