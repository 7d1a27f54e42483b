import type { ReactNode } from 'react';
import type { Area } from '#renderer/area.tsx';
import { AreaFrame, type Place } from '#renderer/area-frame.tsx';
import { shellText } from '#shared/text/shell.ts';

const places: readonly Place[] = [
  { href: '/admin/catalogue', label: shellText.places.catalogue },
  { href: '/admin/intake', label: shellText.places.intake },
];

function Frame({ children }: { children: ReactNode }) {
  return (
    <AreaFrame home="/admin/intake" places={places}>
      {children}
    </AreaFrame>
  );
}

/** The administrator's screens. */
export const adminArea: Area = { Frame, routes: [] };
