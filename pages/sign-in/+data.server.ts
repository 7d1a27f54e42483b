import { redirect } from 'vike/abort';
import type { PageContextServer } from 'vike/types';
import { homeOfSession } from '#renderer/home-of-session.ts';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { SignInPage } from '#shared/contracts/session.ts';
import { frontText } from '#shared/text/front.ts';

/** Only a path of ours: an address elsewhere would make the sign-in page a springboard. */
function ownPath(next: string | undefined): string | null {
  return next && /^\/(?![/\\])/.test(next) && !next.startsWith('/sign-in') ? next : null;
}

// https://vike.dev/data
export async function data({ server, urlParsed }: PageContextServer) {
  if (!server) throw new Error('Runs on the server.');
  const next = ownPath(urlParsed.search.next);
  const session = await server.readSession();
  if (session) throw redirect((next ?? homeOfSession(session.role)) as `/${string}`);
  const answer = await server.run(call(endpoints.signInPage, {}));
  const page = answer.ok ? (answer.data as SignInPage) : { demoAccounts: [] };
  return { title: frontText.signIn.title, next, ...page };
}
