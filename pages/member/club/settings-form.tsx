import { type FormEvent, useState } from 'react';
import { useSend, useStore } from '#renderer/api.ts';
import { Button, ChoiceGroup, Notice, SelectField, TextField } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { MemberSettings } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';

const text = memberText.club;

type Crosses = MemberSettings['crossColours'];
const CROSSES = Object.entries(text.crosses) as [Crosses, string][];

/** Brings a field and the words over it into view, and the focus to it. */
function showField(id: string): void {
  const field = document.getElementById(id);
  field?.scrollIntoView({ block: 'center' });
  field?.focus({ preventScroll: true });
}

/** What a member sets for themselves. One form, one save. */
export function SettingsForm({ settings }: { settings: MemberSettings }) {
  const store = useStore();
  const [form, setForm] = useState(settings);
  const [minutes, setMinutes] = useState(String(settings.minutesPerDay));
  const [wrong, setWrong] = useState(false);
  const save = useSend(endpoints.changeSettings, {
    onDone: () => {
      void store.refresh(endpoints.club);
      void store.refresh(endpoints.today);
    },
  });
  const change = (part: Partial<MemberSettings>) => {
    save.reset();
    setForm((before) => ({ ...before, ...part }));
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const count = /^\d{1,3}$/.test(minutes.trim()) ? Number(minutes.trim()) : 0;
    const valid = count >= 1 && count <= 120;
    setWrong(!valid);
    if (valid) save.mutate({ ...form, minutesPerDay: count });
    else showField('minutes');
  };
  return (
    <form noValidate onSubmit={submit} className="flex max-w-[34rem] flex-col gap-6">
      <TextField
        id="minutes"
        name="minutesPerDay"
        label={text.minutes}
        hint={text.minutesHint}
        error={wrong ? text.minutesError : undefined}
        inputMode="numeric"
        autoComplete="off"
        value={minutes}
        onChange={(event) => {
          save.reset();
          setMinutes(event.target.value);
        }}
      />
      <ChoiceGroup
        id="on-boards"
        name="onBoards"
        kind="many"
        legend={text.onBoards}
        choices={[{ value: 'on', label: text.onBoardsLabel, hint: text.onBoardsHint }]}
        value={form.onBoards ? ['on'] : []}
        onChange={(event) => change({ onBoards: event.target.checked })}
      />
      <ChoiceGroup
        id="holding"
        name="holding"
        kind="one"
        legend={text.holding}
        choices={(['right', 'left'] as const).map((value) => ({ value, ...text.holdings[value] }))}
        value={[form.holding]}
        onChange={(event) => change({ holding: event.target.value === 'left' ? 'left' : 'right' })}
      />
      <SelectField
        id="cross-colours"
        name="crossColours"
        label={text.cross}
        hint={text.crossHint}
        value={form.crossColours}
        onChange={(event) =>
          change({ crossColours: CROSSES.find(([value]) => value === event.target.value)?.[0] ?? 'white' })
        }
        options={CROSSES.map(([value, label]) => ({ value, label }))}
      />
      {save.isError && (
        <Notice tone="rose" title={text.notSaved} live>
          <p>{save.error.message}</p>
        </Notice>
      )}
      {save.isSuccess && (
        <Notice live>
          <p>{text.saved}</p>
        </Notice>
      )}
      <div>
        <Button type="submit" busy={save.isPending}>
          {save.isPending ? text.saving : text.save}
        </Button>
      </div>
    </form>
  );
}
