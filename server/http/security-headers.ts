import { randomBytes } from 'node:crypto';
import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** A fresh nonce for every response, kept at res.locals.nonce, and the headers around it. */
export function securityHeaders({
  secure,
  development,
}: {
  secure: boolean;
  development: boolean;
}): RequestHandler[] {
  const withNonce: RequestHandler = (_req, res, next) => {
    res.locals.nonce = randomBytes(16).toString('base64url');
    next();
  };
  const nonce = (_req: unknown, res: unknown) =>
    `'nonce-${(res as { locals: { nonce: string } }).locals.nonce}'`;
  const headers = helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: [nonce, "'strict-dynamic'"],
        // The development server injects its styles by script; the built pages only link theirs.
        styleSrc: development ? ["'self'", "'unsafe-inline'"] : ["'self'", nonce],
        imgSrc: ["'self'", 'data:'],
        fontSrc: ["'self'", ...(development ? ['data:'] : [])],
        connectSrc: ["'self'", ...(development ? ['ws:'] : [])],
        manifestSrc: ["'self'"],
        workerSrc: ["'self'"],
        formAction: ["'self'"],
        baseUri: ["'none'"],
        objectSrc: ["'none'"],
        frameAncestors: ["'none'"],
      },
    },
    strictTransportSecurity: secure ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'same-origin' },
    crossOriginOpenerPolicy: { policy: 'same-origin' },
  });
  return [withNonce, headers];
}
