// https://vike.dev/route-function: the string route '/desk/*' would miss '/desk'.
export function route(pageContext: { urlPathname: string }) {
  return /^\/desk(\/|$)/.test(pageContext.urlPathname);
}
