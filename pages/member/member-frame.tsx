import { type ReactNode, useEffect, useRef } from 'react';
import { useLocation } from 'react-router';
import { useSession } from '#renderer/session.tsx';
import { SignOutButton } from '#renderer/sign-out-button.tsx';
import { BottomNav, LinkProvider, TopBar } from '#renderer/ui/index.ts';
import { memberText } from '#shared/text/member.ts';
import { shellText } from '#shared/text/shell.ts';
import { RouterLink } from './router-link.tsx';

const PLACES = [
  { href: '/today', label: shellText.places.today },
  { href: '/cases', label: shellText.places.cases },
  { href: '/form', label: shellText.places.form },
  { href: '/club', label: shellText.places.club },
];

const DESK = { href: '/desk/squad', label: memberText.club.toDesk };

/** The member's places under the thumb on a phone, in a bar on top where there is room. */
export function MemberFrame({
  titleOf,
  children,
}: {
  titleOf: (pathname: string) => string;
  children: ReactNode;
}) {
  const { pathname } = useLocation();
  const session = useSession();
  const content = useRef<HTMLElement>(null);
  const shown = useRef(pathname);
  useEffect(() => {
    if (shown.current === pathname) return;
    // As after a document load: the new title, from the top, and the focus at the beginning of what is new.
    shown.current = pathname;
    document.title = `${titleOf(pathname)} · ${shellText.product}`;
    window.scrollTo(0, 0);
    if (!content.current?.contains(document.activeElement)) content.current?.focus({ preventScroll: true });
  }, [pathname, titleOf]);
  const items = PLACES.map(({ href, label }) => ({
    href,
    label,
    current: pathname === href || pathname.startsWith(`${href}/`),
  }));
  return (
    <LinkProvider link={RouterLink}>
      <div className="flex min-h-dvh flex-col">
        <div className="hidden lg:block">
          <TopBar
            product={shellText.product}
            homeHref="/today"
            navigationLabel={shellText.navigation}
            skipLabel={shellText.skipToContent}
            items={session.role === 'captain' ? [...items, DESK] : items}
            aside={
              <>
                <span>
                  {session.nickname}
                  {session.club ? `, ${session.club.name}` : ''}
                </span>
                <SignOutButton />
              </>
            }
          />
        </div>
        <main id="content" ref={content} tabIndex={-1} className="flex w-full flex-1 flex-col outline-none">
          {children}
        </main>
        <div className="sticky bottom-0 lg:hidden">
          <BottomNav label={shellText.navigation} items={items} />
        </div>
      </div>
    </LinkProvider>
  );
}
