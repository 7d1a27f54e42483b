// https://vike.dev/route-function: the string route '/admin/*' would miss '/admin'.
export function route(pageContext: { urlPathname: string }) {
  return /^\/admin(\/|$)/.test(pageContext.urlPathname);
}
