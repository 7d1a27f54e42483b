import { randomUUID } from 'node:crypto';
import type { Request, RequestHandler, Response } from 'express';
import type { SessionCookies } from '../auth/cookies.ts';
import { readAccessToken, type SigningKeys } from '../auth/tokens.ts';
import type { Deps } from '../services/context.ts';
import { refreshSession } from '../services/session/refresh-session.ts';
import type { SessionCtx } from '../services/session/session-context.ts';
import { Problem } from './problem.ts';

interface Locals {
  ctx?: SessionCtx;
}

/** The context that the session middleware made for this response. */
export function ctxOf(res: object): SessionCtx {
  const { ctx } = (res as Response<unknown, Locals>).locals;
  if (!ctx) throw new Error('The session middleware has not run.');
  return ctx;
}

/**
 * Reads who is asking. A document request whose access token has run out may change the refresh token for new
 * ones on the way; the API answers 401 and the browser asks for the change itself.
 */
export function withSession(deps: Deps, keys: SigningKeys, cookies: SessionCookies): RequestHandler {
  return async (req, res, next) => {
    const { access, refresh } = cookies.read(req);
    let claims = access ? await readAccessToken(keys, access, deps.clock.now()) : null;
    const bare: SessionCtx = { ...deps, keys, claims, requestId: randomUUID() };
    res.set('X-Request-Id', bare.requestId);
    if (!claims && refresh && isDocument(req)) {
      try {
        const renewed = await refreshSession(bare, refresh);
        cookies.write(res, renewed.tokens);
        claims = renewed.claims;
      } catch (error) {
        if (!(error instanceof Problem && error.kind === 'signed-out')) throw error;
        cookies.clear(res);
      }
    }
    res.locals.ctx = { ...bare, claims };
    next();
  };
}

function isDocument(req: Request): boolean {
  return req.method === 'GET' && !req.path.startsWith('/api/') && req.accepts(['json', 'html']) === 'html';
}
