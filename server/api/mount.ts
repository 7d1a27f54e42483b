import { Router } from 'express';
import { Problem } from '../http/problem.ts';
import type { SessionCtx } from '../services/session/session-context.ts';
import type { AnyRow } from './row.ts';

/** Mounts every row at its method and path: the input is the path's places, then the query or the body. */
export function mountRows(rows: Iterable<AnyRow>, ctxOf: (res: object) => SessionCtx): Router {
  const router = Router();
  for (const row of rows) {
    const { method, path } = row.endpoint;
    const register = {
      GET: router.get,
      POST: router.post,
      PUT: router.put,
      PATCH: router.patch,
      DELETE: router.delete,
    }[method].bind(router);
    register(path, async (req, res) => {
      const params = numbersIn(req.params);
      const input = method === 'GET' ? { ...req.query, ...params } : { ...bodyOf(req.body), ...params };
      const output = await row.run(ctxOf(res), input);
      // Only now: an error is never kept.
      if (row.keptSeconds !== null) res.set('Cache-Control', `public, max-age=${row.keptSeconds}`);
      res.json(output);
    });
  }
  return router;
}

function bodyOf(body: unknown): Record<string, unknown> {
  if (body === undefined || body === null) return {};
  if (typeof body !== 'object' || Array.isArray(body))
    throw new Problem('invalid', 'The body must be a JSON object.');
  return body as Record<string, unknown>;
}

/** Path places that are whole numbers (a line, an edition) arrive as text; their schemas want numbers. */
function numbersIn(params: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(
    Object.entries(params).map(([name, value]) => [
      name,
      (name === 'line' || name === 'number') && typeof value === 'string' && /^\d{1,9}$/.test(value)
        ? Number(value)
        : value,
    ]),
  );
}

/** 405 with Allow for a known path under another method. */
export function refuseOtherMethods(rows: Iterable<{ endpoint: { method: string; path: string } }>): Router {
  const router = Router();
  const methods = new Map<string, Set<string>>();
  for (const { endpoint } of rows) {
    const known = methods.get(endpoint.path) ?? new Set<string>();
    methods.set(endpoint.path, known.add(endpoint.method));
  }
  for (const [path, known] of methods) {
    router.all(path, (req, res) => {
      res.set('Allow', [...known].join(', '));
      throw new Problem('wrong-method', `${req.method} is not known here.`);
    });
  }
  return router;
}
