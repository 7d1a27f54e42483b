import { Link } from 'react-router';
import type { AppLinkProps } from '#renderer/ui/index.ts';

const INSIDE = /^(\/admin(\/|\?|$)|\?)/;

/** A link that moves inside the administrator's places without a document load; any other is a plain one. */
export function AdminLink({ href, ...rest }: AppLinkProps) {
  return INSIDE.test(href) ? <Link to={href} {...rest} /> : <a href={href} {...rest} />;
}
