import type { ReactNode } from 'react';

export interface ScreenHeadProps {
  readonly title: string;
  /** What the screen is about just now, plain beside the title: a set's name. */
  readonly subject?: string;
  /** On the right: how far, how long. */
  readonly aside?: ReactNode;
}

/** The head of a phone screen: title, subject, a figure on the right, an ink rule below. */
export function ScreenHead({ title, subject, aside }: ScreenHeadProps) {
  return (
    <header className="rule-b flex flex-wrap items-baseline justify-between gap-x-4 pb-3 pt-4">
      <h1 className="text-xl font-bold">
        {title}
        {subject && <span className="ml-3 text-[1.0625rem] font-normal">{subject}</span>}
      </h1>
      {aside && <div className="text-[0.9375rem] text-ink-2">{aside}</div>}
    </header>
  );
}
