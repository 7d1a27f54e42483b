import type { ReactNode } from 'react';
import type { FrameProps } from '#renderer/area.tsx';
import { AreaLink } from '#renderer/area-link.tsx';
import { PublicFrame } from '#renderer/public-frame.tsx';
import { useVisitor } from '#renderer/session.tsx';
import { type AppLinkProps, LinkProvider } from '#renderer/ui/index.ts';
import { useMoved } from '#renderer/use-moved.ts';
import { AdminFrame } from '../admin/admin-frame.tsx';
import { DeskFrame } from '../desk/desk-frame.tsx';
import { MemberFrame } from '../member/member-frame.tsx';

const INSIDE = /^\/ledger(\/|\?|$)/;

function LedgerLink(props: AppLinkProps) {
  return <AreaLink inside={INSIDE} {...props} />;
}

/** The bars of whoever is here; for one who is not signed in, those of the public pages. */
export function LedgerFrame(props: FrameProps) {
  const role = useVisitor()?.role;
  if (role === 'administrator') return <AdminFrame link={LedgerLink} {...props} />;
  if (role === 'captain') return <DeskFrame link={LedgerLink} {...props} />;
  if (role === 'member') {
    return (
      <MemberFrame link={LedgerLink} {...props}>
        <div className="mx-auto w-full max-w-[84rem] px-4 pb-16 sm:px-8">{props.children}</div>
      </MemberFrame>
    );
  }
  return <StrangersFrame {...props} />;
}

function StrangersFrame({ titleOf, children }: { titleOf: FrameProps['titleOf']; children: ReactNode }) {
  const content = useMoved(titleOf);
  return (
    <LinkProvider link={LedgerLink}>
      <PublicFrame current="ledger" wide content={content}>
        {children}
      </PublicFrame>
    </LinkProvider>
  );
}
