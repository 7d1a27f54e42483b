import { endpoints } from '#shared/contracts/endpoints.ts';
import { ledgerCasesInput, ledgerCasesView, ledgerInput, ledgerView } from '#shared/contracts/ledger.ts';
import { listLedgerCases } from '../../services/ledger/list-ledger-cases.ts';
import { readLedger } from '../../services/ledger/read-ledger.ts';
import { defineRow } from '../define-row.ts';

/** What may be kept of an answer that is the same for everyone, in seconds. */
const KEPT_SECONDS = 300;

/** The Ledger: arithmetic, open to all. */
export const ledgerRows = {
  ledger: defineRow({
    endpoint: endpoints.ledger,
    who: 'anyone',
    input: ledgerInput,
    output: ledgerView,
    service: readLedger,
    keptSeconds: KEPT_SECONDS,
  }),
  ledgerCases: defineRow({
    endpoint: endpoints.ledgerCases,
    who: 'anyone',
    input: ledgerCasesInput,
    output: ledgerCasesView,
    service: listLedgerCases,
    keptSeconds: KEPT_SECONDS,
  }),
};
