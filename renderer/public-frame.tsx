import type { ReactNode } from 'react';
import { shellText } from '#shared/text/shell.ts';
import { TopBar } from './ui/index.ts';

/** The frame of pages anyone may see. */
export function PublicFrame({
  children,
  current,
  home = null,
}: {
  children: ReactNode;
  current?: 'signIn';
  /** The first place of whoever is signed in. */
  home?: string | null;
}) {
  return (
    <>
      <TopBar
        product={shellText.product}
        homeHref="/"
        navigationLabel={shellText.navigation}
        skipLabel={shellText.skipToContent}
        items={[
          home
            ? { href: home, label: shellText.openPlaces, current: false }
            : { href: '/sign-in', label: shellText.signIn, current: current === 'signIn' },
        ]}
      />
      <main id="content" className="mx-auto w-full max-w-6xl px-4 py-8 sm:px-8">
        {children}
      </main>
    </>
  );
}
