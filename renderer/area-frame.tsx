import type { ReactNode } from 'react';
import { useLocation } from 'react-router';
import { shellText } from '#shared/text/shell.ts';
import { useSession } from './session.tsx';
import { SignOutButton } from './sign-out-button.tsx';
import { TopBar } from './ui/index.ts';

export interface Place {
  readonly href: string;
  readonly label: string;
}

/** Bar, club and role, sign-out and the content of a desk or administrator screen. */
export function AreaFrame({
  home,
  places,
  children,
}: {
  home: string;
  places: readonly Place[];
  children: ReactNode;
}) {
  const { pathname } = useLocation();
  const session = useSession();
  const here = session.club
    ? shellText.clubAndRole(session.club.name, session.role)
    : shellText.administrator;
  return (
    <>
      <TopBar
        product={shellText.product}
        homeHref={home}
        navigationLabel={shellText.navigation}
        skipLabel={shellText.skipToContent}
        items={places.map(({ href, label }) => ({
          href,
          label,
          current: pathname === href || pathname.startsWith(`${href}/`),
        }))}
        aside={
          <>
            <span>{here}</span>
            <SignOutButton />
          </>
        }
      />
      <main id="content" className="mx-auto w-full max-w-7xl px-4 py-6 sm:px-8">
        {children}
      </main>
    </>
  );
}
