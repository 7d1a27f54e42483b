// https://vike.dev/route-function: the string route '/catalogue/*' would miss '/catalogue'.
export function route(pageContext: { urlPathname: string }) {
  return /^\/catalogue(\/|$)/.test(pageContext.urlPathname);
}
