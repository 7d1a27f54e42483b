// https://vike.dev/route-function: the string route '/ledger/*' would miss '/ledger'.
export function route(pageContext: { urlPathname: string }) {
  return /^\/ledger(\/|$)/.test(pageContext.urlPathname);
}
