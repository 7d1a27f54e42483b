import type { ReactNode } from 'react';

export interface PageTitleProps {
  readonly title: string;
  /** One or two sentences on what the page shows. */
  readonly lead?: ReactNode;
  /** Keys on the right. */
  readonly children?: ReactNode;
}

/** The title of a desk page. */
export function PageTitle({ title, lead, children }: PageTitleProps) {
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4 pb-5 pt-6">
      <div className="min-w-0">
        <h1 className="text-[1.75rem] sm:text-[2rem] font-bold tracking-[-0.01em]">{title}</h1>
        {lead && <p className="mt-2 max-w-[46rem] text-ink-2">{lead}</p>}
      </div>
      {children && <div className="flex flex-wrap gap-3">{children}</div>}
    </div>
  );
}
