import type { CookieOptions, Request, Response } from 'express';
import { ACCESS_SECONDS, REFRESH_SECONDS } from './tokens.ts';

/** Cookie names and attributes; `__Host-` and Secure when the product is served over https. */
export interface SessionCookies {
  read(req: Request): { access: string | undefined; refresh: string | undefined };
  write(res: Response, tokens: { access: string; refresh: string }): void;
  clear(res: Response): void;
}

export function sessionCookies(secure: boolean): SessionCookies {
  const prefix = secure ? '__Host-' : '';
  const accessName = `${prefix}sixteenfold-access`;
  const refreshName = `${prefix}sixteenfold-refresh`;
  const attributes: CookieOptions = { httpOnly: true, sameSite: 'lax', secure, path: '/' };
  return {
    read(req) {
      const jar = (req.cookies ?? {}) as Record<string, unknown>;
      const value = (name: string) => (typeof jar[name] === 'string' ? jar[name] : undefined);
      return { access: value(accessName), refresh: value(refreshName) };
    },
    write(res, tokens) {
      res.cookie(accessName, tokens.access, { ...attributes, maxAge: ACCESS_SECONDS * 1000 });
      res.cookie(refreshName, tokens.refresh, { ...attributes, maxAge: REFRESH_SECONDS * 1000 });
    },
    clear(res) {
      res.clearCookie(accessName, attributes);
      res.clearCookie(refreshName, attributes);
    },
  };
}
