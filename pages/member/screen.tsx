import type { ReactNode } from 'react';
import { ScreenHead } from '#renderer/ui/index.ts';

/** A member's screen: head and content, in a column as wide as its content needs. */
export function MemberScreen({
  title,
  aside,
  wide = false,
  children,
}: {
  title: string;
  aside?: ReactNode;
  wide?: boolean;
  children: ReactNode;
}) {
  return (
    <div className={`mx-auto w-full flex-1 px-[18px] pb-10 ${wide ? 'max-w-6xl' : 'max-w-3xl'}`}>
      <ScreenHead title={title} aside={aside} />
      {children}
    </div>
  );
}
