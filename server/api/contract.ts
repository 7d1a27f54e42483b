import type { EndpointName } from '#shared/contracts/endpoints.ts';
import { adminRows } from './admin/rows.ts';
import { deskRows } from './desk/rows.ts';
import { memberRows } from './member/rows.ts';
import type { AnyRow } from './row.ts';
import { sessionRows } from './session/rows.ts';
import { todayRows } from './today/rows.ts';

/** The whole API. Pages rendered on the server call the same rows in process. */
export const contract: Partial<Record<EndpointName, AnyRow>> = {
  ...sessionRows,
  ...deskRows,
  ...todayRows,
  ...memberRows,
  ...adminRows,
};
