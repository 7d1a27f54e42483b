import { Link } from 'react-router';
import type { AppLinkProps } from '#renderer/ui/index.ts';

const INSIDE = /^\/desk(\/|\?|$)/;

/** A link that moves inside the desk without a document load; any other is a plain one. */
export function DeskLink({ href, ...rest }: AppLinkProps) {
  return INSIDE.test(href) ? <Link to={href} {...rest} /> : <a href={href} {...rest} />;
}
