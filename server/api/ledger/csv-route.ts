import { Router } from 'express';
import { ledgerStepInput } from '#shared/contracts/ledger.ts';
import { ledgerCsv } from '../../services/ledger/ledger-csv.ts';
import { validate } from '../define-row.ts';

/**
 * The Ledger's cases as a file, by a plain link. It comes before sessions are read: what anyone may keep must not
 * carry anybody's cookie.
 */
export function ledgerCsvRoute(): Router {
  const router = Router();
  router.get('/ledger.csv', (req, res) => {
    const { name, content } = ledgerCsv(validate(ledgerStepInput, req.query));
    res
      .attachment(name)
      .type('text/csv; charset=utf-8')
      .set('Cache-Control', 'public, max-age=300')
      // The mark at the start tells spreadsheets that it is UTF-8.
      .send(`\uFEFF${content}`);
  });
  return router;
}
