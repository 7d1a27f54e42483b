import { type FormEvent, useEffect, useState } from 'react';
import { type ApiError, useSend } from '#renderer/api.ts';
import { Button, ChoiceGroup, ErrorSummary, SelectField, TextField } from '#renderer/ui/index.ts';
import type { ProgrammeView } from '#shared/contracts/desk.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { deskText } from '#shared/text/desk.ts';
import {
  choosing,
  fieldOfPointer,
  type ProgrammeField,
  type ProgrammeValues,
  readValues,
} from './programme-form-values.ts';

const text = deskText.programme;

export interface ProgrammeFormProps {
  /** Makes the ids of its fields unique on the page. */
  readonly id: string;
  readonly start: ProgrammeValues;
  readonly editions: readonly number[];
  readonly members: ProgrammeView['members'];
  readonly saveLabel: string;
  onSaved(view: ProgrammeView): void;
  /** Someone else changed the set meanwhile: what was typed no longer fits what stands. */
  onStale(): void;
  onCancel?(): void;
}

/** How a set is trained: edition, limit, AUF, who answers. */
export function ProgrammeForm(props: ProgrammeFormProps) {
  const { id, start, editions, members, saveLabel, onSaved, onStale, onCancel } = props;
  const [values, setValues] = useState(start);
  const [wrong, setWrong] = useState<Partial<Record<ProgrammeField, string>>>({});
  const send = useSend(endpoints.assignSet, { onDone: onSaved });
  const change = (part: Partial<ProgrammeValues>) => setValues({ ...values, ...part });
  const fieldId = (field: ProgrammeField) => `${id}-${field === 'set' ? 'edition' : field}`;

  const errors = Object.entries(wrong).map(([field, message]) => ({
    fieldId: fieldId(field as ProgrammeField),
    message,
  }));
  // One error stands once, at its field, and the field takes the focus; several stand in a summary too.
  const only = errors.length === 1 ? errors[0]?.fieldId : undefined;
  useEffect(() => {
    const field = only === undefined || send.isPending ? null : document.getElementById(only);
    field?.scrollIntoView({ block: 'center' });
    field?.focus({ preventScroll: true });
  }, [only, send.isPending]);

  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (send.isPending) return;
    const read = readValues(values);
    setWrong(read.ok ? {} : read.wrong);
    if (!read.ok) return;
    send.mutate(read.input, {
      onError: (error: ApiError) => {
        if (error.status === 412) onStale();
        else setWrong(wrongOf(error));
      },
    });
  };

  return (
    <form onSubmit={submit} noValidate className="grid max-w-[38rem] gap-6">
      {errors.length > 1 && <ErrorSummary title={text.problemTitle} errors={errors} />}
      <div className="grid items-start gap-6 sm:grid-cols-2">
        <SelectField
          id={fieldId('edition')}
          label={text.editionField}
          error={wrong.edition ?? wrong.set}
          value={values.edition}
          onChange={(event) => change({ edition: event.currentTarget.value })}
          options={[
            { value: '', label: text.followNewest(editions[0] ?? null) },
            ...editions.map((edition) => ({ value: String(edition), label: text.pinTo(edition) })),
          ]}
        />
        <TextField
          id={fieldId('limit')}
          label={text.limitField}
          inputMode="decimal"
          autoComplete="off"
          error={wrong.limit}
          value={values.limit}
          onChange={(event) => change({ limit: event.currentTarget.value })}
        />
      </div>
      <p className="-mt-4 text-sm text-ink-2">{text.limitHint}</p>
      <div className="grid items-start gap-6 sm:grid-cols-2">
        <ChoiceGroup
          id={`${id}-auf`}
          name={`${id}-auf`}
          kind="one"
          legend={text.aufField}
          choices={[
            { value: 'yes', label: text.aufAsk, hint: text.aufHint },
            { value: 'no', label: text.aufNot },
          ]}
          value={[values.asksAuf ? 'yes' : 'no']}
          onChange={(event) => change({ asksAuf: event.currentTarget.value === 'yes' })}
        />
        <ChoiceGroup
          id={fieldId('who')}
          name={`${id}-who`}
          kind="one"
          legend={text.whoField}
          choices={[
            { value: 'all', label: text.whoEveryone },
            { value: 'some', label: text.whoChosen },
          ]}
          value={[values.forEveryone ? 'all' : 'some']}
          error={wrong.who}
          onChange={(event) => setValues(choosing(values, event.currentTarget.value === 'all', members))}
        />
      </div>
      {!values.forEveryone && (
        <div className="space-y-2">
          <ChoiceGroup
            id={fieldId('members')}
            name={`${id}-members`}
            kind="many"
            legend={text.whoMembers}
            error={wrong.members}
            choices={members.map(({ memberId, nickname }) => ({ value: memberId, label: nickname }))}
            value={values.memberIds}
            onChange={(event) => {
              const { checked, value } = event.currentTarget;
              const others = values.memberIds.filter((memberId) => memberId !== value);
              change({ memberIds: checked ? [...others, value] : others });
            }}
          />
          <div className="flex flex-wrap gap-3">
            <Button
              kind="plain"
              size="small"
              onClick={() => change({ memberIds: members.map(({ memberId }) => memberId) })}
            >
              {text.whoTickAll}
            </Button>
            <Button kind="plain" size="small" onClick={() => change({ memberIds: [] })}>
              {text.whoTickNone}
            </Button>
          </div>
        </div>
      )}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" busy={send.isPending}>
          {send.isPending ? text.saving : saveLabel}
        </Button>
        {onCancel && (
          <Button kind="outlined" onClick={onCancel}>
            {text.cancel}
          </Button>
        )}
      </div>
    </form>
  );
}

function wrongOf(error: ApiError): Partial<Record<ProgrammeField, string>> {
  const details = error.problem?.errors ?? [];
  if (details.length === 0) return { set: error.message };
  return Object.fromEntries(details.map(({ pointer, detail }) => [fieldOfPointer(pointer), detail]));
}
