import { type ReactNode, useEffect, useRef } from 'react';
import { useLocation } from 'react-router';
import { AreaFrame, type Place } from '#renderer/area-frame.tsx';
import { LinkProvider } from '#renderer/ui/index.ts';
import { shellText } from '#shared/text/shell.ts';
import { DeskLink } from './desk-link.tsx';

const PLACES: readonly Place[] = [
  { href: '/desk/squad', label: shellText.places.squad },
  { href: '/desk/standings', label: shellText.places.standings },
  { href: '/desk/programme', label: shellText.places.programme },
  { href: '/today', label: shellText.places.training },
];

/** The desk's bar and content; moving inside it is announced as a document load would be. */
export function DeskFrame({
  titleOf,
  children,
}: {
  titleOf: (pathname: string) => string;
  children: ReactNode;
}) {
  const { pathname } = useLocation();
  const content = useRef<HTMLDivElement>(null);
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
      <AreaFrame home="/desk/squad" places={PLACES}>
        <div ref={content} tabIndex={-1} className="outline-none">
          {children}
        </div>
      </AreaFrame>
    </LinkProvider>
  );
}
