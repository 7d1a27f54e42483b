import { type ReactNode, useEffect, useId, useRef } from 'react';
import { Button } from './button.tsx';

export interface ConfirmDialogProps {
  readonly open: boolean;
  readonly title: string;
  /** What will happen, and that it cannot be undone. */
  readonly children?: ReactNode;
  readonly confirmLabel: string;
  readonly cancelLabel: string;
  readonly tone?: 'ink' | 'rose';
  readonly busy?: boolean;
  readonly onConfirm: () => void;
  /** Also called for Escape. */
  readonly onCancel: () => void;
}

/** A question before what cannot be undone. Native modal dialog: focus stays inside and returns afterwards. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  const { open, title, children, confirmLabel, cancelLabel, tone = 'ink', busy, onConfirm, onCancel } = props;
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (!element || element.open === open) return;
    if (open) element.showModal();
    else element.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onCancel();
      }}
      className="frame opens m-auto w-[min(32rem,calc(100vw-2rem))] bg-paper p-6 text-ink"
    >
      <h2 id={titleId} className="text-xl font-bold">
        {title}
      </h2>
      {children && <div className="mt-3 space-y-2">{children}</div>}
      <div className="mt-6 flex flex-wrap justify-end gap-3">
        <Button kind="outlined" onClick={onCancel}>
          {cancelLabel}
        </Button>
        <Button tone={tone} busy={busy} onClick={onConfirm}>
          {confirmLabel}
        </Button>
      </div>
    </dialog>
  );
}
