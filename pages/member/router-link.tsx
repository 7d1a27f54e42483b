import { Link } from 'react-router';
import type { AppLinkProps } from '#renderer/ui/index.ts';

const INSIDE = /^\/(today|cases|form|club)(\/|\?|$)/;

/** A link that moves inside the member's places without a document load; any other is a plain one. */
export function RouterLink({ href, ...rest }: AppLinkProps) {
  return INSIDE.test(href) ? <Link to={href} {...rest} /> : <a href={href} {...rest} />;
}
