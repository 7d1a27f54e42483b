import {
  type DehydratedState,
  HydrationBoundary,
  QueryClient,
  QueryClientProvider,
} from '@tanstack/react-query';
import { type ComponentType, type ReactNode, useCallback, useState } from 'react';
import { BrowserRouter, matchPath, Route, Routes, StaticRouter } from 'react-router';
import type { Call } from '#shared/contracts/endpoint.ts';
import type { SessionView } from '#shared/contracts/session.ts';
import { usePageContext } from './page-context-provider.tsx';
import { PersonPicturesProvider } from './person-pictures.tsx';
import { SessionProvider } from './session.tsx';

/** One screen of an area: its path, its title, what it reads, and its component. */
export interface AreaRoute {
  readonly path: string;
  readonly title: string;
  readonly Page: ComponentType;
  /** The calls whose answers the screen shows; the server makes them before it renders. */
  calls(
    params: Readonly<Record<string, string>>,
    search: Readonly<Record<string, string>>,
    /** The query as it stands, for names that may be there more than once. */
    query: URLSearchParams,
  ): readonly Call<unknown, unknown>[];
}

export interface FrameProps {
  readonly titleOf: (pathname: string) => string;
  readonly children: ReactNode;
}

export interface Area {
  readonly routes: readonly AreaRoute[];
  /** Bars and navigation around every screen of the area. */
  readonly Frame: ComponentType<FrameProps>;
  /** Anyone may see it, signed in or not. */
  readonly open?: boolean;
}

export interface AreaData {
  readonly title: string;
  /** Path and query as asked for: what the router starts from on the server. */
  readonly location: string;
  /** Null only where the area is open and nobody is signed in. */
  readonly session: SessionView | null;
  readonly queries: DehydratedState;
}

/** The route of a path, or null. */
export function routeOf(
  area: Area,
  pathname: string,
): { route: AreaRoute; params: Record<string, string> } | null {
  for (const route of area.routes) {
    const match = matchPath({ path: route.path, end: true }, pathname);
    if (match) {
      const params: Record<string, string> = {};
      for (const [name, value] of Object.entries(match.params)) if (value !== undefined) params[name] = value;
      return { route, params };
    }
  }
  return null;
}

/** The React tree of an area: queries as the server left them, a router inside, the frame around. */
export function AreaPage({ area }: { area: Area }) {
  const pageContext = usePageContext();
  const data = pageContext.data as AreaData;
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: {
          queries: { staleTime: 30_000, retry: 1, refetchOnWindowFocus: false, networkMode: 'always' },
          // Without a connection a call fails and the screen says so, instead of waiting for ever.
          mutations: { networkMode: 'always' },
        },
      }),
  );
  const { Frame } = area;
  const titleOf = useCallback((pathname: string) => routeOf(area, pathname)?.route.title ?? '', [area]);
  const screens = (
    <Frame titleOf={titleOf}>
      <Routes>
        {area.routes.map(({ path, Page }) => (
          <Route key={path} path={path} element={<Page />} />
        ))}
      </Routes>
    </Frame>
  );
  return (
    <QueryClientProvider client={client}>
      <HydrationBoundary state={data.queries}>
        <SessionProvider value={data.session}>
          <PersonPicturesProvider settings={data.session?.pictures ?? null}>
            {import.meta.env.SSR ? (
              <StaticRouter location={data.location}>{screens}</StaticRouter>
            ) : (
              <BrowserRouter>{screens}</BrowserRouter>
            )}
          </PersonPicturesProvider>
        </SessionProvider>
      </HydrationBoundary>
    </QueryClientProvider>
  );
}
