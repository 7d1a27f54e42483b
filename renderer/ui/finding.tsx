import type { ReactNode } from 'react';
import { cx } from './cx.ts';

export type FindingTone = 'agrees' | 'decide' | 'cannot';

const TONES: Readonly<Record<FindingTone, { edge: string; title: string }>> = {
  agrees: { edge: 'border-transparent', title: 'text-ink' },
  decide: { edge: 'border-ochre', title: 'text-ochre' },
  cannot: { edge: 'border-rose', title: 'text-rose' },
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
    <div className={cx('border-l-4 ps-2.5', TONES[tone].edge)}>
      <p className={cx('font-bold', TONES[tone].title)}>{title}</p>
      {children && <div className="text-[0.9375rem] text-ink-2">{children}</div>}
    </div>
  );
}
