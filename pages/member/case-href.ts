/** The address of a case's page. */
export function caseHref(key: string): string {
  return `/cases/${encodeURIComponent(key)}`;
}
