/** The same screen with some of its address's query changed; null takes a name away. */
export function queryHref(
  now: URLSearchParams,
  pathname: string,
  change: Readonly<Record<string, string | null>>,
): string {
  const next = new URLSearchParams(now);
  for (const [name, value] of Object.entries(change)) {
    if (value === null) next.delete(name);
    else next.set(name, value);
  }
  return next.size === 0 ? pathname : `${pathname}?${next}`;
}
