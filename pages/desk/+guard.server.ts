import { redirect } from 'vike/abort';
import type { PageContextServer } from 'vike/types';
import { guardArea } from '#renderer/load-area.ts';

// https://vike.dev/guard
export async function guard(pageContext: PageContextServer) {
  await guardArea(pageContext, ['captain']);
  if (/^\/desk\/?$/.test(pageContext.urlPathname)) throw redirect('/desk/squad');
}
