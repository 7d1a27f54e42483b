import type { PageContextServer } from 'vike/types';
import { homeOfSession } from '#renderer/home-of-session.ts';

// https://vike.dev/data: the way home of whoever is signed in. Where even that cannot be read, the page still shows.
export async function data(pageContext: PageContextServer) {
  const session = await pageContext.server?.readSession().catch(() => null);
  return { home: session ? homeOfSession(session.role) : null };
}
