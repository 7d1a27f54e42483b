/** What the server's clock is ahead of this device's, in milliseconds; null until an answer of its has come. */
let offset: number | null = null;

/** Notes the server's time, as it was when this device's clock showed `receivedAt`. */
export function noteServerTime(serverNow: number, receivedAt = Date.now()): void {
  offset = serverNow - receivedAt;
}

/** The first note: the view came with the document or was fetched; later answers are nearer to the truth. */
export function noteFirstView(serverNow: number, fetchedAt: number): void {
  if (offset === null) noteServerTime(serverNow, documentTime() ?? fetchedAt);
}

/** Milliseconds since 1970 on the server's clock, as nearly as this device can tell. */
export function serverTime(): number {
  return Math.round(Date.now() + (offset ?? 0));
}

/** When this document arrived, if it is the one that brought Today; by the device's clock. */
function documentTime(): number | null {
  const [entry] = performance.getEntriesByType('navigation') as PerformanceNavigationTiming[];
  if (!entry || entry.responseStart <= 0) return null;
  return new URL(entry.name).pathname === '/today' ? performance.timeOrigin + entry.responseStart : null;
}
