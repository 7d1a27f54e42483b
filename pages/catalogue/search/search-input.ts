import type { SearchInput } from '#shared/contracts/catalogue-search.ts';

/** What an address asks to be found; null where it asks nothing. */
export function searchInput(q: string | null | undefined): SearchInput | null {
  const words = q?.trim().slice(0, 300) ?? '';
  return words === '' ? null : { q: words };
}
