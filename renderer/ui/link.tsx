import {
  type AnchorHTMLAttributes,
  type ComponentType,
  createContext,
  type ReactNode,
  useContext,
} from 'react';

export type AppLinkProps = AnchorHTMLAttributes<HTMLAnchorElement> & { href: string };

function PlainLink(props: AppLinkProps) {
  return <a {...props}>{props.children}</a>;
}

const LinkContext = createContext<ComponentType<AppLinkProps>>(PlainLink);

/** Inside it, every {@link AppLink} is rendered by `link`: an area's router moves without a document load. */
export function LinkProvider({ link, children }: { link: ComponentType<AppLinkProps>; children: ReactNode }) {
  return <LinkContext value={link}>{children}</LinkContext>;
}

/** A link as the area renders it; a plain anchor outside any area. Carries no style of its own. */
export function AppLink(props: AppLinkProps) {
  const Link = useContext(LinkContext);
  return <Link {...props} />;
}

/** A link within text. */
export function TextLink({ className, ...props }: AppLinkProps) {
  return <AppLink {...props} className={className ? `link ${className}` : 'link'} />;
}
