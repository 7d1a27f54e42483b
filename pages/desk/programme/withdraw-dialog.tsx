import { useSend } from '#renderer/api.ts';
import { ConfirmDialog } from '#renderer/ui/index.ts';
import type { ProgrammeView } from '#shared/contracts/desk.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { deskText } from '#shared/text/desk.ts';
import type { ProgrammeRow } from './programme-table.tsx';

const text = deskText.programme;

/** Asks before a set is taken off the programme, and says what stays. */
export function WithdrawDialog({
  row,
  onDone,
  onStale,
  onCancel,
}: {
  row: ProgrammeRow | null;
  onDone(name: string, view: ProgrammeView): void;
  onStale(): void;
  onCancel(): void;
}) {
  const send = useSend(endpoints.withdrawSet, {
    onDone: (view) => onDone(row?.name ?? '', view),
  });
  const confirm = () => {
    if (!row || send.isPending) return;
    send.mutate(
      { setKey: row.setKey, version: row.version },
      { onError: (error) => (error.status === 412 || error.status === 404 ? onStale() : undefined) },
    );
  };
  return (
    <ConfirmDialog
      open={row !== null}
      title={text.withdrawTitle(row?.name ?? '')}
      confirmLabel={text.withdrawConfirm}
      cancelLabel={text.keep}
      busy={send.isPending}
      onConfirm={confirm}
      onCancel={() => {
        send.reset();
        onCancel();
      }}
    >
      <p>{text.withdrawBody}</p>
      <p>{text.withdrawKeeps}</p>
      {send.isError && (
        <p role="alert" className="font-bold text-rose">
          {send.error.message}
        </p>
      )}
    </ConfirmDialog>
  );
}
