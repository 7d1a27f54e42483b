import { redirect } from 'vike/abort';
import type { PageContextServer } from 'vike/types';
import { guardArea } from '#renderer/load-area.ts';
import { movedTo } from './moved.ts';

// https://vike.dev/guard
export async function guard(pageContext: PageContextServer) {
  const moved = movedTo(pageContext.urlPathname);
  if (moved) throw redirect(moved, 301);
  await guardArea(pageContext, ['administrator']);
}
