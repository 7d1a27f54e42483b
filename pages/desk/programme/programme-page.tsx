import { useEffect, useRef, useState } from 'react';
import { useCall, useStore } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { Notice, PageTitle, Section } from '#renderer/ui/index.ts';
import type { ProgrammeView } from '#shared/contracts/desk.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { deskText } from '#shared/text/desk.ts';
import { AssignSet } from './assign-set.tsx';
import { ProgrammeForm } from './programme-form.tsx';
import { valuesOf } from './programme-form-values.ts';
import { type ProgrammeRow, ProgrammeTable } from './programme-table.tsx';
import { WithdrawDialog } from './withdraw-dialog.tsx';

const text = deskText.programme;

interface Said {
  readonly tone: 'ink' | 'ochre';
  readonly title?: string;
  readonly words: string;
}

export function ProgrammePage() {
  const query = useCall(endpoints.programme, {});
  return <Awaited query={query}>{(view) => <Programme view={view} />}</Awaited>;
}

function Programme({ view }: { view: ProgrammeView }) {
  const store = useStore();
  const [editing, edit] = useState<ProgrammeRow | null>(null);
  const [withdrawing, withdraw] = useState<ProgrammeRow | null>(null);
  const [said, say] = useState<Said | null>(null);
  const notice = useRef<HTMLDivElement>(null);
  const form = useRef<HTMLDivElement>(null);
  // The key that was pressed is gone by then: go on from what came of it.
  useEffect(() => {
    if (said) notice.current?.focus();
  }, [said]);
  useEffect(() => {
    if (editing) form.current?.focus();
  }, [editing]);

  const finish = (words: string, next: ProgrammeView) => {
    store.put(endpoints.programme, {}, next);
    void store.refresh(endpoints.squad);
    void store.refresh(endpoints.standings);
    void store.refresh(endpoints.memberPage);
    edit(null);
    withdraw(null);
    say({ tone: 'ink', words });
  };
  const stale = () => {
    void store.refresh(endpoints.programme);
    edit(null);
    withdraw(null);
    say({ tone: 'ochre', title: text.staleTitle, words: text.staleLead });
  };

  return (
    <>
      <PageTitle title={text.title} lead={text.lead} />
      {said && (
        <div ref={notice} tabIndex={-1} className="mb-6 outline-none">
          <Notice live tone={said.tone} {...(said.title ? { title: said.title } : {})}>
            <p>{said.words}</p>
          </Notice>
        </div>
      )}
      <ProgrammeTable view={view} onEdit={edit} onWithdraw={withdraw} />
      {editing ? (
        <div ref={form} tabIndex={-1} className="outline-none">
          <Section title={text.editTitle(editing.name)} ruled className="mt-10">
            <div className="pt-4">
              <ProgrammeForm
                key={`${editing.setKey} ${editing.version}`}
                id="edit"
                start={valuesOf(editing)}
                editions={view.editions[editing.setKey] ?? []}
                members={view.members}
                saveLabel={text.save}
                onSaved={(next) => finish(text.changed(editing.name), next)}
                onStale={stale}
                onCancel={() => edit(null)}
              />
            </div>
          </Section>
        </div>
      ) : (
        <AssignSet view={view} onSaved={(name, next) => finish(text.assigned(name), next)} onStale={stale} />
      )}
      <WithdrawDialog
        row={withdrawing}
        onDone={(name, next) => finish(text.withdrawn(name), next)}
        onStale={stale}
        onCancel={() => withdraw(null)}
      />
    </>
  );
}
