import type { EndpointName } from '#shared/contracts/endpoints.ts';
import { adminRows } from './admin/rows.ts';
import { caseSetRows } from './case-sets/rows.ts';
import { catalogueRows } from './catalogue/rows.ts';
import { catalogueSearchRows } from './catalogue/search-rows.ts';
import { deskRows } from './desk/rows.ts';
import { ledgerRows } from './ledger/rows.ts';
import { memberRows } from './member/rows.ts';
import type { AnyRow } from './row.ts';
import { sessionRows } from './session/rows.ts';
import { todayRows } from './today/rows.ts';

/** Endpoints that read or write the session's cookies: session/routes.ts has them. */
export type CookieEndpoint = 'signInPage' | 'signIn' | 'refreshSession' | 'switchClub' | 'signOut';

/** The whole API but for those; a missing row does not compile. Pages rendered on the server call the same rows. */
export const contract: Record<Exclude<EndpointName, CookieEndpoint>, AnyRow> = {
  ...sessionRows,
  ...deskRows,
  ...todayRows,
  ...memberRows,
  ...adminRows,
  ...catalogueRows,
  ...catalogueSearchRows,
  ...caseSetRows,
  ...ledgerRows,
};
