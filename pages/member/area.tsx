import type { ReactNode } from 'react';
import { useLocation } from 'react-router';
import type { Area } from '#renderer/area.tsx';
import { BottomNav } from '#renderer/ui/index.ts';
import { shellText } from '#shared/text/shell.ts';

const places = [
  { href: '/today', label: shellText.places.today },
  { href: '/cases', label: shellText.places.cases },
  { href: '/form', label: shellText.places.form },
  { href: '/club', label: shellText.places.club },
];

function Frame({ children }: { children: ReactNode }) {
  const { pathname } = useLocation();
  return (
    <div className="flex min-h-dvh flex-col">
      <main id="content" className="flex w-full flex-1 flex-col">
        {children}
      </main>
      <BottomNav
        label={shellText.navigation}
        items={places.map(({ href, label }) => ({
          href,
          label,
          current: pathname === href || pathname.startsWith(`${href}/`),
        }))}
      />
    </div>
  );
}

/** The member's screens: phone first. */
export const memberArea: Area = { Frame, routes: [] };
