import { useState } from 'react';
import { Section, SelectField } from '#renderer/ui/index.ts';
import type { ProgrammeView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';
import { ProgrammeForm } from './programme-form.tsx';
import { valuesOfNew } from './programme-form-values.ts';

const text = deskText.programme;

/** Assigns one of the sets that have an edition and are not on the programme. */
export function AssignSet({
  view,
  onSaved,
  onStale,
}: {
  view: ProgrammeView;
  onSaved(name: string, view: ProgrammeView): void;
  onStale(): void;
}) {
  const [chosen, choose] = useState('');
  const set = view.available.find(({ setKey }) => setKey === chosen) ?? view.available[0];
  return (
    <Section title={text.assignTitle} ruled className="mt-12">
      {set === undefined ? (
        <p className="py-3 text-ink-2">{text.noneLeft}</p>
      ) : (
        <div className="grid gap-6 pt-4">
          <div className="max-w-[18rem]">
            <SelectField
              id="assign-set"
              label={text.set}
              hint={text.assignLead}
              value={set.setKey}
              onChange={(event) => choose(event.currentTarget.value)}
              options={view.available.map(({ setKey, name, cases }) => ({
                value: setKey,
                label: text.setOption(name, cases),
              }))}
            />
          </div>
          <ProgrammeForm
            key={set.setKey}
            id="assign"
            start={valuesOfNew(set)}
            editions={set.editions}
            members={view.members}
            saveLabel={text.assignOf(set.name)}
            onSaved={(next) => onSaved(set.name, next)}
            onStale={onStale}
          />
        </div>
      )}
    </Section>
  );
}
