import type { ReactNode } from 'react';
import type { MyCase } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';

type State = MyCase['state'];

/** A case's state: a mark that differs in shape, and its word. */
export function StateMark({ state }: { state: State }) {
  return (
    <span className="inline-flex items-center gap-2 whitespace-nowrap">
      <svg viewBox="0 0 16 16" aria-hidden="true" focusable="false" className="size-3.5 shrink-0">
        {MARKS[state]}
      </svg>
      {memberText.states[state]}
    </span>
  );
}

const edge = { fill: 'none', strokeWidth: 1.5, className: 'stroke-ink' } as const;

const MARKS: Readonly<Record<State, ReactNode>> = {
  unmet: <rect x="2" y="2" width="12" height="12" {...edge} strokeDasharray="2.5 2" />,
  settling: (
    <>
      <rect x="2" y="2" width="12" height="12" {...edge} />
      <rect x="2" y="8" width="12" height="6" className="fill-ink" />
    </>
  ),
  holding: <rect x="1.25" y="1.25" width="13.5" height="13.5" className="fill-ink" />,
  slipping: <path d="M1.5 2.5h13L8 14z" className="fill-rose" />,
};
