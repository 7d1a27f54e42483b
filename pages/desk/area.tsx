import type { ReactNode } from 'react';
import type { Area } from '#renderer/area.tsx';
import { AreaFrame, type Place } from '#renderer/area-frame.tsx';
import { shellText } from '#shared/text/shell.ts';

const places: readonly Place[] = [
  { href: '/desk/squad', label: shellText.places.squad },
  { href: '/desk/standings', label: shellText.places.standings },
  { href: '/desk/programme', label: shellText.places.programme },
  { href: '/today', label: shellText.places.training },
];

function Frame({ children }: { children: ReactNode }) {
  return (
    <AreaFrame home="/desk/squad" places={places}>
      {children}
    </AreaFrame>
  );
}

/** The captain's screens. */
export const deskArea: Area = { Frame, routes: [] };
