import { type ReactNode, useId } from 'react';

export interface SectionProps {
  readonly title: string;
  readonly children: ReactNode;
  /** On the right of the title: a link, a small key. */
  readonly aside?: ReactNode;
  /** An ink rule under the title, for lists that bring no head of their own. */
  readonly ruled?: boolean;
  readonly className?: string;
}

/** A part of a page under its own heading. */
export function Section({ title, children, aside, ruled = false, className }: SectionProps) {
  const id = useId();
  return (
    <section aria-labelledby={id} className={className}>
      <div className={`flex flex-wrap items-baseline justify-between gap-x-4 pb-2 ${ruled ? 'rule-b' : ''}`}>
        <h2 id={id} className="text-lg font-bold">
          {title}
        </h2>
        {aside && <div className="text-sm text-ink-2">{aside}</div>}
      </div>
      {children}
    </section>
  );
}
