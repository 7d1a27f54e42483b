import type { FrameProps } from '#renderer/area.tsx';
import { AreaLink } from '#renderer/area-link.tsx';
import { useSession } from '#renderer/session.tsx';
import type { AppLinkProps } from '#renderer/ui/index.ts';
import { AdminFrame } from '../admin/admin-frame.tsx';
import { DeskFrame } from '../desk/desk-frame.tsx';
import { MemberFrame } from '../member/member-frame.tsx';

const INSIDE = /^(\/catalogue(\/|\?|$)|\?)/;

function CatalogueLink(props: AppLinkProps) {
  return <AreaLink inside={INSIDE} {...props} />;
}

/** The bars of whoever is here: one catalogue for all, each with their own places around it. */
export function CatalogueFrame(props: FrameProps) {
  const { role } = useSession();
  if (role === 'administrator') return <AdminFrame link={CatalogueLink} {...props} />;
  if (role === 'captain') return <DeskFrame link={CatalogueLink} {...props} />;
  return (
    <MemberFrame link={CatalogueLink} {...props}>
      <div className="mx-auto w-full max-w-[84rem] px-4 pb-16 sm:px-8">{props.children}</div>
    </MemberFrame>
  );
}
