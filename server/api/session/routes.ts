import { Router } from 'express';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { signInInput, switchClubInput } from '#shared/contracts/session.ts';
import type { SessionCookies } from '../../auth/cookies.ts';
import type { SignInLimiter } from '../../auth/sign-in-limiter.ts';
import { readSession } from '../../services/session/read-session.ts';
import { refreshSession } from '../../services/session/refresh-session.ts';
import type { SessionCtx } from '../../services/session/session-context.ts';
import { signIn } from '../../services/session/sign-in.ts';
import { signInPage } from '../../services/session/sign-in-page.ts';
import { signOut } from '../../services/session/sign-out.ts';
import { switchClub } from '../../services/session/switch-club.ts';
import { validate } from '../define-row.ts';

export interface SessionRoutesNeeds {
  readonly cookies: SessionCookies;
  readonly limiter: SignInLimiter;
  readonly demo: boolean;
  ctxOf(res: object): SessionCtx;
}

/** The endpoints that read or write the session's cookies. */
export function sessionRoutes({ cookies, limiter, demo, ctxOf }: SessionRoutesNeeds): Router {
  const router = Router();

  router.get(endpoints.signInPage.path, (_req, res) => {
    res.json(signInPage(demo));
  });

  router.post(endpoints.signIn.path, async (req, res) => {
    const input = validate(signInInput, req.body);
    await limiter.mayTry(input.signIn, req.ip ?? '');
    const { tokens, signedIn } = await limiter.counting(input.signIn, req.ip ?? '', () =>
      signIn(ctxOf(res), input),
    );
    cookies.write(res, tokens);
    res.json(signedIn);
  });

  router.post(endpoints.refreshSession.path, async (req, res) => {
    const ctx = ctxOf(res);
    const { tokens, claims } = await refreshSession(ctx, cookies.read(req).refresh);
    cookies.write(res, tokens);
    res.json(await readSession({ ...ctx, claims }));
  });

  router.post(endpoints.switchClub.path, async (req, res) => {
    const { tokens, signedIn } = await switchClub(
      ctxOf(res),
      cookies.read(req).refresh,
      validate(switchClubInput, req.body),
    );
    cookies.write(res, tokens);
    res.json(signedIn);
  });

  router.delete(endpoints.signOut.path, async (_req, res) => {
    await signOut(ctxOf(res));
    cookies.clear(res);
    res.json({});
  });

  return router;
}
