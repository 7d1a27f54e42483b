import { dehydrate, QueryClient } from '@tanstack/react-query';
import { redirect, render } from 'vike/abort';
import type { PageContextServer } from 'vike/types';
import { type Call, callKey } from '#shared/contracts/endpoint.ts';
import type { SessionView } from '#shared/contracts/session.ts';
import { type Area, type AreaData, routeOf } from './area.tsx';

/** Lets only these roles into an area; the signed-out go to the sign-in page and come back afterwards. */
export async function guardArea(
  pageContext: PageContextServer,
  roles: readonly SessionView['role'][],
): Promise<void> {
  const session = await pageContext.server?.readSession();
  if (!session) throw redirect(signInPath(pageContext));
  if (!roles.includes(session.role)) throw render(403);
}

/**
 * Makes the calls of the screen at this URL and hands over their answers. Ends the request with 404, 403 or the
 * sign-in page where the server says so.
 */
export async function loadArea(area: Area, pageContext: PageContextServer): Promise<AreaData> {
  const { server, urlParsed } = pageContext;
  if (!server) throw new Error('loadArea runs on the server.');
  const session = await server.readSession();
  if (!session && !area.open) throw redirect(signInPath(pageContext));
  const found = routeOf(area, urlParsed.pathname);
  if (!found) throw render(404);
  const client = new QueryClient();
  const query = new URLSearchParams(urlParsed.searchOriginal ?? '');
  for (const call of found.route.calls(found.params, urlParsed.search, query)) {
    const answer = await server.run(call as Call<unknown, unknown>);
    if (!answer.ok) {
      if (answer.status === 401) throw redirect(signInPath(pageContext));
      // The input comes from the address alone: one that cannot be right names nothing.
      const status = answer.status === 400 ? 404 : answer.status;
      throw render(status === 403 || status === 404 || status === 503 ? status : 500, answer.detail);
    }
    client.setQueryData(callKey(call as Call<unknown, unknown>), answer.data);
  }
  return { title: found.route.title, location: locationOf(pageContext), session, queries: dehydrate(client) };
}

/** The sign-in page, coming back here afterwards. */
function signInPath(pageContext: PageContextServer): string {
  return `/sign-in?next=${encodeURIComponent(locationOf(pageContext))}`;
}

function locationOf({ urlParsed }: PageContextServer): string {
  return `${urlParsed.pathnameOriginal}${urlParsed.searchOriginal ?? ''}`;
}
