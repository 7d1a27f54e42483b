import { useCallback, useId } from 'react';
import { useNavigate, useSearchParams } from 'react-router';
import { ErrorSummary, PageTitle } from '#renderer/ui/index.ts';
import { useScripts } from '#renderer/use-scripts.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { doneOn } from './done.ts';
import { type LedgerForm, ledgerHref, readLedgerQuery } from './ledger-query.ts';
import { LedgerResult } from './ledger-result.tsx';
import { StepForm } from './step-form.tsx';
import { TradeSets } from './trade-sets.tsx';

/** The counts of a step of the last layer, and why they are what they are. */
export function LedgerPage() {
  const [query] = useSearchParams();
  const navigate = useNavigate();
  const { asked, input, errors } = readLedgerQuery(query);
  const atOnce = useScripts();
  const form = useId();
  const show = useCallback(
    (next: LedgerForm) => navigate(ledgerHref(next), { preventScrollReset: true }),
    [navigate],
  );
  const fields = {
    asked,
    atOnce,
    errorOf: (fieldId: string) => errors.find((error) => error.fieldId === fieldId)?.message,
    onChange: show,
  };
  return (
    <>
      <PageTitle title={ledgerText.title} lead={ledgerText.lead} />
      <div className="pb-6 empty:hidden">
        <ErrorSummary title={ledgerText.form.problemTitle} errors={errors} />
      </div>
      <div className="grid gap-x-12 gap-y-8 lg:grid-cols-[17rem_minmax(0,1fr)] xl:grid-cols-[20rem_minmax(0,1fr)]">
        <StepForm id={form} done={doneOn(asked.entry)} {...fields}>
          {input && <TradeSets asked={asked} input={input} />}
        </StepForm>
        {input && <LedgerResult input={input} form={form} {...fields} />}
      </div>
    </>
  );
}
