import { Router } from 'express';
import { ledgerStepInput } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { ledgerCsv } from '../../services/ledger/ledger-csv.ts';
import { fieldErrors } from '../define-row.ts';

/**
 * The Ledger's cases as a file, by a plain link. It comes before sessions are read: what anyone may keep must not
 * carry anybody's cookie. Whoever follows a broken link is a person, so what is wrong is said in plain sentences.
 */
export function ledgerCsvRoute(): Router {
  const router = Router();
  router.get('/ledger.csv', (req, res) => {
    const step = ledgerStepInput.safeParse(req.query);
    if (!step.success) {
      const sentences = fieldErrors(step.error).map(({ detail }) => detail);
      res
        .status(400)
        .type('text/plain; charset=utf-8')
        .set('Cache-Control', 'no-store')
        .send([ledgerText.csvFile.broken, ...sentences, ''].join('\n'));
      return;
    }
    const { name, content } = ledgerCsv(step.data);
    res
      .attachment(name)
      .type('text/csv; charset=utf-8')
      .set('Cache-Control', 'public, max-age=300')
      // The mark at the start tells spreadsheets that it is UTF-8.
      .send(`\uFEFF${content}`);
  });
  return router;
}
