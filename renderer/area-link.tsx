import { Link } from 'react-router';
import type { AppLinkProps } from './ui/index.ts';

/** A link that moves inside an area without a document load, by the addresses that are inside; any other is plain. */
export function AreaLink({ inside, href, ...rest }: AppLinkProps & { inside: RegExp }) {
  return inside.test(href) ? <Link to={href} {...rest} /> : <a href={href} {...rest} />;
}
