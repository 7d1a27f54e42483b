import type { PageContextServer } from 'vike/types';
import { homeOfSession } from '#renderer/home-of-session.ts';

// https://vike.dev/data
export async function data(pageContext: PageContextServer) {
  const session = (await pageContext.server?.readSession()) ?? null;
  return { home: session ? homeOfSession(session.role) : null };
}
