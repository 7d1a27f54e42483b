import type { ReactNode } from 'react';
import { cx } from './cx.ts';

export type FindingTone = 'agrees' | 'decide' | 'cannot';

const TONES: Readonly<Record<FindingTone, { edge: string; title: string }>> = {
  agrees: { edge: 'ps-3.5', title: 'text-ink' },
  decide: { edge: 'border-l-4 border-ochre ps-2.5', title: 'text-ochre' },
  cannot: { edge: 'border-l-4 border-rose ps-2.5', title: 'text-rose' },
};

/** What was found about one line: a title, what follows from it, and what can be done. */
export function Finding({
  tone,
  title,
  children,
}: {
  tone: FindingTone;
  title: string;
  children?: ReactNode;
}) {
  return (
    <div className={TONES[tone].edge}>
      <p className={cx('font-bold', TONES[tone].title)}>{title}</p>
      {children && <div className="text-[0.9375rem] text-ink-2">{children}</div>}
    </div>
  );
}
