import type { ReactNode } from 'react';
import { cx } from './cx.ts';

export type NoticeTone = 'ink' | 'ochre' | 'rose';

const TONES: Readonly<Record<NoticeTone, string>> = {
  ink: 'border-ink bg-sheet',
  ochre: 'border-ochre bg-ochre-weak',
  rose: 'border-rose bg-rose-weak',
};

export interface NoticeProps {
  readonly tone?: NoticeTone;
  readonly title?: string;
  readonly children?: ReactNode;
  /** Read out when it appears; wrong for notices that are there from the start. */
  readonly live?: boolean;
}

/** Something to know: done, to decide, or wrong. The words say which; the rule's colour goes with them. */
export function Notice({ tone = 'ink', title, children, live = false }: NoticeProps) {
  return (
    <div
      {...(live ? { role: tone === 'rose' ? 'alert' : 'status' } : {})}
      className={cx('border-l-4 px-4 py-3', TONES[tone])}
    >
      {title && <p className="font-bold">{title}</p>}
      {children}
    </div>
  );
}
