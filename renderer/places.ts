export interface Place {
  readonly href: string;
  readonly label: string;
}

/** Places as a navigation shows them: the one that is open, or holds what is open, is current. */
export function markCurrent(places: readonly Place[], pathname: string) {
  return places.map(({ href, label }) => ({
    href,
    label,
    current: pathname === href || pathname.startsWith(`${href}/`),
  }));
}
