import type { ComponentType } from 'react';
import type { FrameProps } from '#renderer/area.tsx';
import { AreaLink } from '#renderer/area-link.tsx';
import type { AppLinkProps } from '#renderer/ui/index.ts';
import { WideFrame } from '#renderer/wide-frame.tsx';
import { shellText } from '#shared/text/shell.ts';

const PLACES = [
  { href: '/catalogue', label: shellText.places.catalogue },
  { href: '/admin/intake', label: shellText.places.intake },
  { href: '/ledger', label: shellText.places.ledger },
  { href: '/admin/pictures', label: shellText.places.pictures },
] as const;
const INSIDE = /^(\/admin(\/|\?|$)|\?)/;

function AdminLink(props: AppLinkProps) {
  return <AreaLink inside={INSIDE} {...props} />;
}

/** The administrator's bar and content; `link` where another area shows them. */
export function AdminFrame({
  link = AdminLink,
  ...props
}: FrameProps & { link?: ComponentType<AppLinkProps> }) {
  return <WideFrame home="/admin/intake" places={PLACES} link={link} {...props} />;
}
