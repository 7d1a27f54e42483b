import type { Area, AreaRoute } from '#renderer/area.tsx';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { CasesPage } from './cases/cases-page.tsx';
import { casesInputOf } from './cases/cases-query.ts';
import { LedgerFrame } from './ledger-frame.tsx';
import { LedgerPage } from './ledger-page.tsx';
import { readLedgerQuery } from './ledger-query.ts';

const routes: readonly AreaRoute[] = [
  {
    path: '/ledger',
    title: ledgerText.title,
    Page: LedgerPage,
    calls: (_params, _search, query) => {
      const { input } = readLedgerQuery(query);
      return input ? [call(endpoints.ledger, input)] : [];
    },
  },
  {
    path: '/ledger/cases',
    title: ledgerText.list.pageTitle,
    Page: CasesPage,
    calls: (_params, _search, query) => {
      const input = casesInputOf(query);
      return input ? [call(endpoints.ledgerCases, input)] : [];
    },
  },
];

/** What the counts of a step are: for anyone, signed in or not. */
export const ledgerArea: Area = { Frame: LedgerFrame, routes, open: true };
