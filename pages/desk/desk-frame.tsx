import type { ComponentType } from 'react';
import type { FrameProps } from '#renderer/area.tsx';
import { AreaLink } from '#renderer/area-link.tsx';
import type { AppLinkProps } from '#renderer/ui/index.ts';
import { WideFrame } from '#renderer/wide-frame.tsx';
import { shellText } from '#shared/text/shell.ts';

const PLACES = [
  { href: '/desk/squad', label: shellText.places.squad },
  { href: '/desk/standings', label: shellText.places.standings },
  { href: '/desk/programme', label: shellText.places.programme },
  { href: '/catalogue', label: shellText.places.catalogue },
  { href: '/ledger', label: shellText.places.ledger },
  { href: '/today', label: shellText.places.training },
] as const;
const INSIDE = /^\/desk(\/|\?|$)/;

function DeskLink(props: AppLinkProps) {
  return <AreaLink inside={INSIDE} {...props} />;
}

/** The desk's bar and content; `link` where another area shows them. */
export function DeskFrame({
  link = DeskLink,
  ...props
}: FrameProps & { link?: ComponentType<AppLinkProps> }) {
  return <WideFrame home="/desk/squad" places={PLACES} link={link} {...props} />;
}
