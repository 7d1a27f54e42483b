import { useEffect, useState } from 'react';
import { Button, SelectField, TextField } from '#renderer/ui/index.ts';
import type { Entry } from '#shared/lastlayer/index.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { FIELDS, type LedgerForm } from './ledger-query.ts';

const text = ledgerText.mix;
const ENTRIES = Object.entries(ledgerText.entries) as [Entry, string][];

export interface MixFieldsProps {
  readonly asked: LedgerForm;
  readonly errorOf: (fieldId: string) => string | undefined;
  /** The form that the fields belong to: it stands elsewhere on the page. */
  readonly form: string;
  /** Scripts are at work: a choice counts at once and no key is needed. */
  readonly atOnce: boolean;
  readonly onChange: (next: LedgerForm) => void;
}

/** The share as somebody is typing it. */
export interface TypedShare {
  readonly typed: string;
  /** What stands in the field is a share. */
  readonly right: boolean;
  readonly onType: (typed: string) => void;
}

/** Longest that is taken: enough to see what was meant. */
const MOST_TYPED = 12;
/** How long after the last keystroke a share counts. */
const TYPED_MS = 400;

/** The second way to arrive, and how many solves do. */
export function MixFields({
  asked,
  errorOf,
  form,
  atOnce,
  onChange,
  typed,
  right,
  onType,
}: MixFieldsProps & TypedShare) {
  const [left, setLeft] = useState(false);
  const noMix = asked.with === null;

  useEffect(() => {
    if (noMix || !right || typed.trim() === asked.share) return;
    const later = setTimeout(() => onChange({ ...asked, share: typed.trim() }), TYPED_MS);
    return () => clearTimeout(later);
  }, [noMix, typed, right, asked, onChange]);

  const shareError = atOnce
    ? // An empty field is on its way to a number until it is left.
      !noMix && !right && (left || typed.trim() !== '')
      ? ledgerText.problems.share
      : undefined
    : errorOf(FIELDS.share);
  return (
    <div className="screen-only mt-4 grid max-w-[46rem] items-end gap-4 sm:grid-cols-[minmax(0,1fr)_17rem_auto]">
      <SelectField
        id={FIELDS.with}
        name="with"
        form={form}
        label={text.with}
        error={errorOf(FIELDS.with)}
        options={[
          { value: '', label: text.nobody },
          ...ENTRIES.filter(([entry]) => entry !== asked.entry || entry === asked.with).map(
            ([value, label]) => ({ value, label }),
          ),
        ]}
        value={asked.with ?? ''}
        onChange={({ target }) =>
          onChange({
            ...asked,
            with: (target.value || null) as Entry | null,
            share: right ? typed.trim() : asked.share,
          })
        }
      />
      <TextField
        id={FIELDS.share}
        name="share"
        form={form}
        label={text.share}
        error={shareError}
        inputMode="numeric"
        autoComplete="off"
        maxLength={MOST_TYPED}
        // Without scripts nothing would wake it when a mix is chosen.
        disabled={atOnce && noMix}
        value={typed}
        onChange={(event) => {
          onType(event.target.value);
          setLeft(false);
        }}
        onBlur={() => setLeft(true)}
      />
      {!atOnce && (
        <Button type="submit" form={form} kind="outlined">
          {text.go}
        </Button>
      )}
    </div>
  );
}
