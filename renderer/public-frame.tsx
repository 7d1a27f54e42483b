import type { ReactNode, Ref } from 'react';
import { shellText } from '#shared/text/shell.ts';
import { TopBar } from './ui/index.ts';

/** The frame of pages anyone may see. */
export function PublicFrame({
  children,
  current,
  home = null,
  wide = false,
  content,
}: {
  children: ReactNode;
  current?: 'signIn' | 'ledger';
  /** The first place of whoever is signed in. */
  home?: string | null;
  /** For pages of tables. */
  wide?: boolean;
  /** The element that holds the content, where it takes the focus after a move. */
  content?: Ref<HTMLElement>;
}) {
  return (
    <>
      <TopBar
        product={shellText.product}
        homeHref="/"
        navigationLabel={shellText.navigation}
        skipLabel={shellText.skipToContent}
        items={[
          { href: '/ledger', label: shellText.places.ledger, current: current === 'ledger' },
          home
            ? { href: home, label: shellText.openPlaces, current: false }
            : { href: '/sign-in', label: shellText.signIn, current: current === 'signIn' },
        ]}
      />
      <main
        id="content"
        ref={content}
        tabIndex={content ? -1 : undefined}
        className={`mx-auto w-full px-4 outline-none sm:px-8 ${wide ? 'max-w-[84rem] pb-16' : 'max-w-6xl py-8'}`}
      >
        {children}
      </main>
    </>
  );
}
