/** Where an address of the catalogue's earlier place is now; null for any other address. */
export function movedTo(pathname: string): `/${string}` | null {
  const edition = /^\/admin\/catalogue\/([^/]+)\/([^/]+)\/?$/.exec(pathname);
  if (edition) return `/catalogue/${edition[1]}/editions/${edition[2]}`;
  return /^\/admin\/catalogue(\/|$)/.test(pathname) ? '/catalogue' : null;
}
