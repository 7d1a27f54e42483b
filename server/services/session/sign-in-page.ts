import { z } from 'zod';
import demoAccounts from '#database/seed/demo-accounts.json' with { type: 'json' };
import { type DemoAccount, demoAccount, type SignInPage } from '#shared/contracts/session.ts';

const listed: DemoAccount[] = z.array(demoAccount).parse(demoAccounts);

/** What the sign-in page shows beside its form: the demo accounts, in demo mode only. */
export function signInPage(demo: boolean): SignInPage {
  return { demoAccounts: demo ? listed : [] };
}
