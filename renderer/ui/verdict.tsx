import type { ReactNode } from 'react';
import { cx } from './cx.ts';

export interface VerdictProps {
  /** Ink for what it was, rose for what it was taken for. */
  readonly tone: 'ink' | 'rose';
  /** The word over the name, so that the colour is never alone. */
  readonly word: string;
  readonly name: string;
  /** The name is struck through: it was wrong. */
  readonly struck?: boolean;
  readonly picture: ReactNode;
  readonly children?: ReactNode;
}

/** A picture in the frame of its verdict, with the word and the name beside it. */
export function Verdict({ tone, word, name, struck = false, picture, children }: VerdictProps) {
  return (
    <figure
      className={cx(
        'flex items-center gap-6 border-[3px] bg-sheet p-3',
        tone === 'rose' ? 'border-rose' : 'border-ink',
      )}
    >
      <div className="w-44 shrink-0">{picture}</div>
      <figcaption className="min-w-0">
        <span className="block text-[0.9375rem] text-ink-2">{word}</span>
        <span
          className={cx('block text-2xl font-bold leading-tight', tone === 'rose' ? 'text-rose' : 'text-ink')}
        >
          {struck ? <s className="decoration-[3px]">{name}</s> : name}
        </span>
        {children}
      </figcaption>
    </figure>
  );
}
