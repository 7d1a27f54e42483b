import type { FrameProps } from '#renderer/area.tsx';
import { AreaLink } from '#renderer/area-link.tsx';
import type { AppLinkProps } from '#renderer/ui/index.ts';
import { WideFrame } from '#renderer/wide-frame.tsx';
import { shellText } from '#shared/text/shell.ts';

const PLACES = [
  { href: '/admin/catalogue', label: shellText.places.catalogue },
  { href: '/admin/intake', label: shellText.places.intake },
] as const;
const INSIDE = /^(\/admin(\/|\?|$)|\?)/;

function AdminLink(props: AppLinkProps) {
  return <AreaLink inside={INSIDE} {...props} />;
}

/** The administrator's bar and content. */
export function AdminFrame(props: FrameProps) {
  return <WideFrame home="/admin/intake" places={PLACES} link={AdminLink} {...props} />;
}
