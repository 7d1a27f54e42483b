import type { ComponentType, ReactNode } from 'react';
import { useLocation } from 'react-router';
import { shellText } from '#shared/text/shell.ts';
import { ClubSwitch } from './club-switch.tsx';
import { markCurrent, type Place } from './places.ts';
import { useSession } from './session.tsx';
import { SignOutButton } from './sign-out-button.tsx';
import { type AppLinkProps, LinkProvider, TopBar } from './ui/index.ts';
import { useMoved } from './use-moved.ts';

export interface WideFrameProps {
  readonly home: string;
  readonly places: readonly Place[];
  readonly link: ComponentType<AppLinkProps>;
  readonly titleOf: (pathname: string) => string;
  readonly children: ReactNode;
}

/** Bar and content of the desk's and the administrator's screens: where one is, as what, and the way out. */
export function WideFrame({ home, places, link, titleOf, children }: WideFrameProps) {
  const { pathname } = useLocation();
  const { club, role } = useSession();
  const content = useMoved(titleOf);
  return (
    <LinkProvider link={link}>
      <TopBar
        product={shellText.product}
        homeHref={home}
        navigationLabel={shellText.navigation}
        skipLabel={shellText.skipToContent}
        items={markCurrent(places, pathname)}
        aside={
          <>
            <span>{club ? shellText.clubAndRole(club.name, role) : shellText.administrator}</span>
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
