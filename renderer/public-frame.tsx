import type { ReactNode } from 'react';
import { shellText } from '#shared/text/shell.ts';
import { TopBar } from './ui/index.ts';

/** The frame of pages anyone may see. */
export function PublicFrame({ children, current }: { children: ReactNode; current?: 'signIn' }) {
  return (
    <>
      <TopBar
        product={shellText.product}
        homeHref="/"
        navigationLabel={shellText.navigation}
        skipLabel={shellText.skipToContent}
        items={[{ href: '/sign-in', label: shellText.signIn, current: current === 'signIn' }]}
      />
      <main id="content" className="mx-auto w-full max-w-6xl px-4 py-8 sm:px-8">
        {children}
      </main>
    </>
  );
}
