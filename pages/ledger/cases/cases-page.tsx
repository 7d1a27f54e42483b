import { useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { PageLinks } from '#renderer/page-links.tsx';
import { EmptyState, PageTitle, TextLink } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { LedgerCasesInput, LedgerCasesView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { readStep, stepQuery } from '../ledger-query.ts';
import { CaseList } from './case-list.tsx';
import { casesHref, casesInputOf } from './cases-query.ts';
import { ListFilters } from './list-filters.tsx';

const text = ledgerText.list;

/** The cases of a step one by one. */
export function CasesPage() {
  const [query] = useSearchParams();
  const input = casesInputOf(query);
  if (input) return <Listed input={input} />;
  return (
    <>
      <PageTitle title={text.title(null)} />
      <EmptyState title={ledgerText.form.problemTitle}>
        <ul>
          {readStep(query).errors.map(({ message }) => (
            <li key={message}>{message}</li>
          ))}
        </ul>
        <p className="pt-2">
          <TextLink href="/ledger">{text.back}</TextLink>
        </p>
      </EmptyState>
    </>
  );
}

function Listed({ input }: { input: LedgerCasesInput }) {
  const answer = useCall(endpoints.ledgerCases, input);
  return <Awaited query={answer}>{(view) => <Cases view={view} input={input} />}</Awaited>;
}

function Cases({ view, input }: { view: LedgerCasesView; input: LedgerCasesInput }) {
  const step = { entry: view.entry, aspects: view.aspects };
  const { entry: _entry, aspects: _aspects, page: _page, ...chosen } = input;
  return (
    <>
      <p className="screen-only pt-4">
        <TextLink href={`/ledger?${stepQuery(step)}`} className="inline-flex min-h-12 items-center">
          {text.back}
        </TextLink>
      </p>
      <PageTitle
        title={text.title(view.trade?.name ?? null)}
        lead={
          <>
            {ledgerText.step(view.entry, view.aspects)} {text.found(view.found, view.all)}
            {view.pages > 1 && `, ${text.part(view.from, view.from + view.cases.length - 1, view.found)}`}.
          </>
        }
      />
      <ListFilters view={view} input={input} />
      <CaseList view={view} step={step} chosen={chosen} />
      {input.size === 'most' ? (
        <p className="screen-only pt-2">
          <TextLink
            href={casesHref(step, { ...chosen, size: undefined })}
            className="inline-flex min-h-12 items-center"
          >
            {text.pages}
          </TextLink>
        </p>
      ) : null}
      <PageLinks page={view.page} of={view.pages} hrefOf={(page) => casesHref(step, { ...chosen, page })} />
    </>
  );
}
