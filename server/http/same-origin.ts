import type { RequestHandler } from 'express';
import { Problem } from './problem.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Unsafe methods must come from our own pages: Sec-Fetch-Site says same-origin or, from a browser too old to
 * send it, Origin names this host (OWASP, Cross-Site Request Forgery Prevention).
 */
export function sameOriginOnly(): RequestHandler {
  return (req, _res, next) => {
    if (SAFE.has(req.method)) return next();
    const site = req.get('Sec-Fetch-Site');
    if (site !== undefined ? site === 'same-origin' : originIsHost(req.get('Origin'), req.get('Host')))
      return next();
    throw new Problem('forbidden', 'This request did not come from a page of ours.');
  };
}

function originIsHost(origin: string | undefined, host: string | undefined): boolean {
  if (!origin || !host) return false;
  try {
    return new URL(origin).host === host;
  } catch {
    return false;
  }
}
