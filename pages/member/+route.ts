// https://vike.dev/route-function: the string route '/cases/*' would miss '/cases'.
const PLACES = /^\/(today|cases|form|club)(\/|$)/;

export function route(pageContext: { urlPathname: string }) {
  return PLACES.test(pageContext.urlPathname);
}
