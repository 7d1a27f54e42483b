import type { ReactNode } from 'react';
import { cx } from './cx.ts';

export type NumberTone = 'ink' | 'quiet' | 'rose' | 'ochre';

const TONES: Readonly<Record<NumberTone, string>> = {
  ink: 'text-ink',
  quiet: 'text-ink-2',
  rose: 'text-rose',
  ochre: 'text-ochre',
};

/** A number that is the point, with what it counts under it. Belongs inside {@link BigNumbers}. */
export function BigNumber({
  value,
  label,
  tone = 'ink',
}: {
  value: string;
  label: ReactNode;
  tone?: NumberTone;
}) {
  return (
    <div className="flex flex-col-reverse justify-end">
      <dt className="text-[0.9375rem] text-ink-2">{label}</dt>
      <dd className={cx('text-[2.125rem] font-bold leading-tight', TONES[tone])}>{value}</dd>
    </div>
  );
}

/** A row of big numbers. */
export function BigNumbers({ children }: { children: ReactNode }) {
  return <dl className="flex flex-wrap gap-x-11 gap-y-4">{children}</dl>;
}
