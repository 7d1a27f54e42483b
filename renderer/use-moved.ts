import { type RefObject, useEffect, useRef } from 'react';
import { useLocation } from 'react-router';
import { shellText } from '#shared/text/shell.ts';

/**
 * Makes a move inside an area like a document load: the new title, from the top, and the focus at the beginning of
 * what is new. Give the ref to the element that holds the content.
 */
export function useMoved(titleOf: (pathname: string) => string): RefObject<HTMLElement | null> {
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
  return content;
}
