import { type ReactNode, useEffect, useRef } from 'react';
import { useLocation } from 'react-router';
import { useSession } from '#renderer/session.tsx';
import { SignOutButton } from '#renderer/sign-out-button.tsx';
import { LinkProvider, TopBar } from '#renderer/ui/index.ts';
import { shellText } from '#shared/text/shell.ts';
import { ClubSwitch } from './club-switch.tsx';
import { DeskLink } from './desk-link.tsx';

const PLACES = [
  { href: '/desk/squad', label: shellText.places.squad },
  { href: '/desk/standings', label: shellText.places.standings },
  { href: '/desk/programme', label: shellText.places.programme },
  { href: '/today', label: shellText.places.training },
] as const;

/** The desk's bar and content; moving inside it is announced as a document load would be. */
export function DeskFrame({
  titleOf,
  children,
}: {
  titleOf: (pathname: string) => string;
  children: ReactNode;
}) {
  const { pathname } = useLocation();
  const { club, role } = useSession();
  const content = useRef<HTMLElement>(null);
  const shown = useRef(pathname);
  useEffect(() => {
    if (shown.current === pathname) return;
    shown.current = pathname;
    document.title = `${titleOf(pathname)} · ${shellText.product}`;
    window.scrollTo(0, 0);
    if (!content.current?.contains(document.activeElement)) content.current?.focus({ preventScroll: true });
  }, [pathname, titleOf]);
  return (
    <LinkProvider link={DeskLink}>
      <TopBar
        product={shellText.product}
        homeHref="/desk/squad"
        navigationLabel={shellText.navigation}
        skipLabel={shellText.skipToContent}
        items={PLACES.map(({ href, label }) => ({
          href,
          label,
          current: pathname === href || pathname.startsWith(`${href}/`),
        }))}
        aside={
          <>
            {club && <span>{shellText.clubAndRole(club.name, role)}</span>}
            <ClubSwitch />
            <SignOutButton />
          </>
        }
      />
      <main
        id="content"
        ref={content}
        tabIndex={-1}
        className="mx-auto w-full max-w-[84rem] px-4 pb-16 outline-none sm:px-8"
      >
        {children}
      </main>
    </LinkProvider>
  );
}
