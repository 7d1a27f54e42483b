import { existsSync } from 'node:fs';
import { fileURLToPath, pathToFileURL } from 'node:url';
import express, { type Express } from 'express';
import { renderPage } from 'vike/server';
import type { Call } from '#shared/contracts/endpoint.ts';
import type { SessionView } from '#shared/contracts/session.ts';
import { contract } from './api/contract.ts';
import type { AnyRow } from './api/row.ts';
import { Problem } from './http/problem.ts';
import { ctxOf } from './http/session-middleware.ts';
import { translateError } from './http/translate-error.ts';
import { readSession } from './services/session/read-session.ts';
import type { SessionCtx } from './services/session/session-context.ts';
import { signInPage } from './services/session/sign-in-page.ts';

const root = fileURLToPath(new URL('..', import.meta.url));

/** Serves the built pages: hashed assets for ever, the rest for a while. */
export async function builtPages(demo: boolean): Promise<(app: Express) => void> {
  const entry = `${root}dist/server/entry.mjs`;
  if (!existsSync(entry)) throw new Error('The pages are not built. Run npm start, which builds them.');
  await import(pathToFileURL(entry).href);
  return (app) => {
    app.use(
      '/assets',
      express.static(`${root}dist/client/assets`, { immutable: true, maxAge: '1y', index: false }),
    );
    app.use(express.static(`${root}dist/client`, { maxAge: '1h', index: false }));
    mountPages(app, demo);
  };
}

/** Serves the pages from their sources, with reload. */
export async function livePages(demo: boolean): Promise<(app: Express) => void> {
  const { createDevMiddleware } = await import('vike/server');
  const { devMiddleware } = await createDevMiddleware({ root });
  return (app) => {
    app.use(devMiddleware);
    mountPages(app, demo);
  };
}

function mountPages(app: Express, demo: boolean): void {
  app.get('/{*path}', async (req, res) => {
    const ctx = ctxOf(res);
    const { httpResponse } = await renderPage({
      urlOriginal: req.originalUrl,
      headersOriginal: req.headers,
      cspNonce: res.locals.nonce as string,
      server: pageServer(ctx, demo),
    });
    res.status(httpResponse.statusCode);
    for (const [name, value] of httpResponse.headers) {
      // Helmet owns the policy; Vike's would be a second, weaker one.
      if (name.toLowerCase() !== 'content-security-policy') res.setHeader(name, value);
    }
    // Personal pages are never stored, by the browser or anything between.
    res.setHeader('Cache-Control', 'no-store');
    res.send(httpResponse.body);
  });
}

/** What a page may ask of the server while it is rendered: the same rows that the API mounts. */
function pageServer(ctx: SessionCtx, demo: boolean) {
  let session: Promise<SessionView | null> | undefined;
  return {
    readSession(): Promise<SessionView | null> {
      session ??= (ctx.claims ? readSession(ctx) : Promise.resolve(null)).catch((error: unknown) => {
        if (error instanceof Problem && error.kind === 'signed-out') return null;
        throw error;
      });
      return session;
    },
    async run(
      call: Call<unknown, unknown>,
    ): Promise<{ ok: true; data: unknown } | { ok: false; status: number; detail: string }> {
      try {
        if (call.endpoint.name === 'signInPage') return { ok: true, data: signInPage(demo) };
        const row = (contract as Partial<Record<string, AnyRow>>)[call.endpoint.name];
        if (!row) throw new Error(`No row for ${call.endpoint.name}.`);
        return { ok: true, data: await row.run(ctx, call.input) };
      } catch (error) {
        const problem = translateError(error);
        if (problem.kind === 'our-fault') throw error;
        return { ok: false, status: problem.status, detail: problem.detail };
      }
    },
  };
}
