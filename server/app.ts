import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type ErrorRequestHandler, type Express } from 'express';
import type pg from 'pg';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { contract } from './api/contract.ts';
import { ledgerCsvRoute } from './api/ledger/csv-route.ts';
import { mountRows, refuseOtherMethods } from './api/mount.ts';
import { sessionRoutes } from './api/session/routes.ts';
import { sessionCookies } from './auth/cookies.ts';
import { signInLimiter } from './auth/sign-in-limiter.ts';
import type { SigningKeys } from './auth/tokens.ts';
import { Problem, problemBody } from './http/problem.ts';
import { sameOriginOnly } from './http/same-origin.ts';
import { securityHeaders } from './http/security-headers.ts';
import { ctxOf, withSession } from './http/session-middleware.ts';
import { translateError } from './http/translate-error.ts';
import type { Deps } from './services/context.ts';

export interface AppNeeds {
  readonly deps: Deps;
  readonly pool: pg.Pool;
  readonly keys: SigningKeys;
  readonly log: Logger;
  readonly demo: boolean;
  readonly secure: boolean;
  readonly development: boolean;
  /** Mounts the pages (built, or through the development server); absent in API tests. */
  readonly mountPages?: (app: Express) => void;
}

/** The whole HTTP side: health, then walls, then API, then pages, then one place that answers errors. */
export function createApp(needs: AppNeeds): Express {
  const { deps, pool, keys, log, demo, secure, development } = needs;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', 'loopback');

  app.get('/healthz', (_req, res) => void res.type('text').send('ok'));
  app.get('/readyz', async (_req, res) => {
    if (app.locals.stopping === true) throw new Problem('unavailable', 'Stopping.');
    await pool.query('select 1');
    res.type('text').send('ready');
  });

  app.use(
    pinoHttp({
      logger: log,
      // Cookies carry sessions, addresses carry invitations: neither belongs in a log.
      serializers: {
        req: (req: { id: unknown; method: string; url: string }) => ({
          id: req.id,
          method: req.method,
          path: req.url.split('?')[0],
        }),
        res: (res: { statusCode: number }) => ({ status: res.statusCode }),
      },
      customLogLevel: (_req, res, error) =>
        error || res.statusCode >= 500 ? 'error' : res.statusCode >= 400 ? 'info' : 'debug',
    }),
  );
  const cookies = sessionCookies(secure);
  app.use(securityHeaders({ secure, development }), compression(), cookieParser());

  app.use(ledgerCsvRoute());
  app.use('/api', sameOriginOnly());
  app.use('/api', (_req, res, next) => {
    res.set('Cache-Control', 'no-store');
    next();
  });
  app.use('/api/admin/intake', express.json({ limit: '7mb' }));
  app.use('/api', express.json({ limit: '256kb' }));
  app.use(withSession(deps, keys, cookies));

  app.use(sessionRoutes({ cookies, limiter: signInLimiter(pool), demo, ctxOf }));
  app.use(mountRows(Object.values(contract), ctxOf));
  app.use(refuseOtherMethods(Object.values(endpoints).map((endpoint) => ({ endpoint }))));
  app.use('/api', () => {
    throw new Problem('not-found', 'There is no such endpoint.');
  });

  needs.mountPages?.(app);

  const answerError: ErrorRequestHandler = (thrown, req, res, next) => {
    if (res.headersSent) return next(thrown);
    const problem = translateError(thrown);
    if (problem.kind === 'our-fault') req.log.error({ err: thrown }, 'unexpected');
    if (problem.retryAfter !== undefined) res.set('Retry-After', String(problem.retryAfter));
    res
      .status(problem.status)
      .type('application/problem+json')
      .send(JSON.stringify(problemBody(problem, res.locals.ctx?.requestId)));
  };
  app.use(answerError);
  return app;
}
