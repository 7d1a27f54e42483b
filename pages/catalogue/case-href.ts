/** The catalogue's page of a case. */
export function caseHref(setKey: string, caseKey: string): string {
  return `/catalogue/${encodeURIComponent(setKey)}/cases/${encodeURIComponent(caseKey)}`;
}
