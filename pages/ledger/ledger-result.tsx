import { useState } from 'react';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { useVisitor } from '#renderer/session.tsx';
import { TextLink } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { LedgerInput, LedgerView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { BurnsideTable } from './burnside-table.tsx';
import { CountRow } from './count-row.tsx';
import { stepQuery } from './ledger-query.ts';
import type { MixFieldsProps } from './mix-fields.tsx';
import { MixPart } from './mix-part.tsx';
import { SymmetryTable } from './symmetry-table.tsx';
import { ThreeCounts } from './three-counts.tsx';
import { UpTo } from './up-to.tsx';

/** All that the server counted of a step. While the next answer is on its way the last one stays. */
export function LedgerResult({ input, ...fields }: { input: LedgerInput } & MixFieldsProps) {
  const query = useCall(endpoints.ledger, input);
  const [last, setLast] = useState(query.data);
  if (query.data !== undefined && query.data !== last) setLast(query.data);
  const view = query.data ?? (query.isPending ? last : undefined);
  return (
    <div className="min-w-0" aria-busy={query.isPending}>
      <p role="status" className="sr-only">
        {view && ledgerText.counted(view.cases)}
      </p>
      {view ? <Counted view={view} {...fields} /> : <Awaited query={query}>{() => null}</Awaited>}
    </div>
  );
}

function Counted({ view, ...fields }: { view: LedgerView } & MixFieldsProps) {
  return (
    <>
      <p className="hidden pb-4 print:block">{ledgerText.step(view.entry, view.aspects)}</p>
      <CountRow view={view} />
      <Reading view={view} />
      <div className="space-y-10">
        <SymmetryTable view={view} />
        <ThreeCounts view={view} />
        <div className="grid gap-x-12 gap-y-10 xl:grid-cols-2">
          <BurnsideTable view={view} />
          <UpTo view={view} />
        </div>
        <MixPart view={view} {...fields} />
      </div>
    </>
  );
}

/** What the trade calls the step, and what can be taken along. */
function Reading({ view }: { view: LedgerView }) {
  const visitor = useVisitor();
  const { trade } = view;
  return (
    <p className="flex flex-wrap items-baseline gap-x-6 gap-y-1 py-4 text-ink-2">
      <span>
        {trade ? (
          <>
            {ledgerText.tradeName}{' '}
            {visitor ? (
              <TextLink href={`/catalogue/${trade.key}`}>{trade.name}</TextLink>
            ) : (
              <b className="text-ink">{trade.name}</b>
            )}
          </>
        ) : (
          ledgerText.noTradeName
        )}
      </span>
      <a className="link screen-only" href={`/ledger.csv?${stepQuery(view)}`} download>
        {ledgerText.csv}
      </a>
    </p>
  );
}
