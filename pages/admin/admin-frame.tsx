import { type ReactNode, useEffect, useRef } from 'react';
import { useLocation } from 'react-router';
import { SignOutButton } from '#renderer/sign-out-button.tsx';
import { LinkProvider, TopBar } from '#renderer/ui/index.ts';
import { shellText } from '#shared/text/shell.ts';
import { AdminLink } from './admin-link.tsx';
import { ClubSwitch } from './club-switch.tsx';

const PLACES = [
  { href: '/admin/catalogue', label: shellText.places.catalogue },
  { href: '/admin/intake', label: shellText.places.intake },
] as const;

/** The administrator's bar and content; moving inside it is announced as a document load would be. */
export function AdminFrame({
  titleOf,
  children,
}: {
  titleOf: (pathname: string) => string;
  children: ReactNode;
}) {
  const { pathname } = useLocation();
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
    <LinkProvider link={AdminLink}>
      <TopBar
        product={shellText.product}
        homeHref="/admin/intake"
        navigationLabel={shellText.navigation}
        skipLabel={shellText.skipToContent}
        items={PLACES.map(({ href, label }) => ({
          href,
          label,
          current: pathname === href || pathname.startsWith(`${href}/`),
        }))}
        aside={
          <>
            <ClubSwitch />
            <span>{shellText.administrator}</span>
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
