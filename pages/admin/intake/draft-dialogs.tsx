import { useState } from 'react';
import { ConfirmDialog, TextAreaField } from '#renderer/ui/index.ts';
import type { DraftView } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';

const text = intakeText.draft;

interface DialogProps {
  readonly view: DraftView;
  readonly open: boolean;
  readonly busy: boolean;
  readonly onCancel: () => void;
}

/** What publishing does, and a note to go with the edition. */
export function PublishDialog({
  view,
  open,
  busy,
  onCancel,
  onPublish,
}: DialogProps & { onPublish: (note: string) => void }) {
  const [note, setNote] = useState('');
  const { draft, newestEdition, effect } = view;
  return (
    <ConfirmDialog
      open={open}
      title={text.publishDialog.title(draft.setName, (newestEdition ?? 0) + 1)}
      confirmLabel={text.publishDialog.confirm}
      cancelLabel={text.publishDialog.cancel}
      busy={busy}
      onCancel={onCancel}
      onConfirm={() => onPublish(note)}
    >
      <ul className="space-y-1">
        {text.publishDialog.effects(effect, newestEdition).map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
      <p>{text.publishDialog.final}</p>
      <TextAreaField
        id="publish-note"
        label={text.publishDialog.note}
        hint={text.publishDialog.noteHint}
        maxLength={500}
        rows={2}
        value={note}
        onChange={(event) => setNote(event.target.value)}
      />
    </ConfirmDialog>
  );
}

/** Asks before a draft is closed without publishing it. */
export function DiscardDialog({
  view,
  open,
  busy,
  onCancel,
  onDiscard,
}: DialogProps & { onDiscard: () => void }) {
  return (
    <ConfirmDialog
      open={open}
      tone="rose"
      title={text.discardDialog.title(view.draft.fileName)}
      confirmLabel={text.discardDialog.confirm}
      cancelLabel={text.discardDialog.cancel}
      busy={busy}
      onCancel={onCancel}
      onConfirm={onDiscard}
    >
      <p>{text.discardDialog.detail}</p>
    </ConfirmDialog>
  );
}
