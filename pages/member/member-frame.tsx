import type { ComponentType } from 'react';
import { useLocation } from 'react-router';
import type { FrameProps } from '#renderer/area.tsx';
import { AreaLink } from '#renderer/area-link.tsx';
import { markCurrent } from '#renderer/places.ts';
import { useSession } from '#renderer/session.tsx';
import { SignOutButton } from '#renderer/sign-out-button.tsx';
import { type AppLinkProps, BottomNav, LinkProvider, TopBar } from '#renderer/ui/index.ts';
import { useMoved } from '#renderer/use-moved.ts';
import { memberText } from '#shared/text/member.ts';
import { shellText } from '#shared/text/shell.ts';

const PLACES = [
  { href: '/today', label: shellText.places.today },
  { href: '/cases', label: shellText.places.cases },
  { href: '/form', label: shellText.places.form },
  { href: '/club', label: shellText.places.club },
];

const INSIDE = /^\/(today|cases|form|club)(\/|\?|$)/;
/** In the bar only: the thumb's places are the daily ones. */
const ALSO = [
  { href: '/catalogue', label: shellText.places.catalogue },
  { href: '/ledger', label: shellText.places.ledger },
];
const DESK = { href: '/desk/squad', label: memberText.club.toDesk };

function MemberLink(props: AppLinkProps) {
  return <AreaLink inside={INSIDE} {...props} />;
}

/** The member's places under the thumb on a phone, in a bar on top where there is room. */
export function MemberFrame({
  titleOf,
  children,
  link = MemberLink,
}: FrameProps & {
  /** Where another area shows the bars. */
  link?: ComponentType<AppLinkProps>;
}) {
  const { pathname } = useLocation();
  const session = useSession();
  const content = useMoved(titleOf);
  const items = markCurrent(PLACES, pathname);
  const inBar = [...items, ...markCurrent(ALSO, pathname), ...(session.role === 'captain' ? [DESK] : [])];
  return (
    <LinkProvider link={link}>
      <div className="flex min-h-dvh flex-col">
        <div className="hidden lg:block">
          <TopBar
            product={shellText.product}
            homeHref="/today"
            navigationLabel={shellText.navigation}
            skipLabel={shellText.skipToContent}
            items={inBar}
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
