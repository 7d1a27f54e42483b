import type { ReactNode } from 'react';

/** More on demand, by the browser's own disclosure. */
export function Details({
  summary,
  children,
  open,
}: {
  summary: ReactNode;
  children: ReactNode;
  open?: boolean;
}) {
  return (
    <details open={open} className="group border-b border-hair">
      <summary className="flex min-h-12 list-none items-center gap-3 py-2 font-bold [&::-webkit-details-marker]:hidden">
        <span aria-hidden="true" className="w-3 text-center font-normal group-open:hidden">
          +
        </span>
        <span aria-hidden="true" className="hidden w-3 text-center font-normal group-open:inline">
          −
        </span>
        <span>{summary}</span>
      </summary>
      <div className="pb-4 ps-6">{children}</div>
    </details>
  );
}
