import type { ReactNode } from 'react';
import { Button } from './button.tsx';

/** Nothing here yet: says why, and what would bring something. */
export function EmptyState({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <div className="border-y border-line py-8">
      <p className="text-lg font-bold">{title}</p>
      {children && <div className="mt-2 max-w-[38rem] text-ink-2">{children}</div>}
    </div>
  );
}

export interface ErrorStateProps {
  readonly title: string;
  readonly children?: ReactNode;
  readonly retryLabel?: string;
  readonly onRetry?: () => void;
}

/** It did not load: what happened, and a key to try again. */
export function ErrorState({ title, children, retryLabel, onRetry }: ErrorStateProps) {
  return (
    <div role="alert" className="border-l-4 border-rose py-4 ps-4">
      <p className="text-lg font-bold">{title}</p>
      {children && <div className="mt-1 max-w-[38rem] text-ink-2">{children}</div>}
      {retryLabel && onRetry && (
        <div className="mt-4">
          <Button kind="outlined" onClick={onRetry}>
            {retryLabel}
          </Button>
        </div>
      )}
    </div>
  );
}

/** On its way. Shown only after 300 ms, so that quick answers show no flicker. */
export function LoadingState({ label }: { label: string }) {
  return (
    <p role="status" className="appear-late py-8 text-ink-2">
      {label}
    </p>
  );
}
