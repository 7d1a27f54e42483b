import { useState } from 'react';
import { LedgerTable } from '#renderer/ledger-table.tsx';
import { Section } from '#renderer/ui/index.ts';
import type { LedgerView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { CaseStrip } from './case-strip.tsx';
import { Figure } from './figure.tsx';
import { shareOf } from './ledger-query.ts';
import { MixFields, type MixFieldsProps } from './mix-fields.tsx';

const text = ledgerText.mix;

/** What the priors are for one who arrives now with this done, now with that: exact, like the rest. */
export function MixPart({ view, ...fields }: { view: LedgerView } & MixFieldsProps) {
  const { entry } = view;
  const [typed, onType] = useState(fields.asked.share);
  const right = shareOf(typed) !== null;
  // Figures of a share that is no longer in the field would pass for those of what is.
  const mix = right ? view.mix : null;
  return (
    <Section title={text.title} className={mix ? undefined : 'screen-only'}>
      <p className="max-w-[46rem] text-ink-2">{text.lead}</p>
      <MixFields {...fields} typed={typed} right={right} onType={onType} />
      {mix && (
        <>
          <p className="mt-6 pb-2 font-bold">{text.says(mix.share, mix.with, entry)}</p>
          <LedgerTable
            caption={text.caption}
            rows={mix.classes}
            rowKey={({ first, second }) => `${ledgerText.fraction(first)} ${ledgerText.fraction(second)}`}
            stackedRow="grid-cols-2"
            columns={[
              {
                key: 'cases',
                header: text.columns.cases,
                rowHeader: true,
                cell: ({ cases }) => (
                  <Figure value={ledgerText.whole(cases)} narrow={ledgerText.symmetry.cases(cases)} />
                ),
                stacked: '',
                className: 'lg:w-16',
              },
              {
                key: 'pictures',
                header: text.columns.pictures,
                headerHidden: true,
                cell: ({ shown }) => <CaseStrip shown={shown} size="small" />,
                stacked: 'max-lg:col-span-2 max-lg:order-1 max-lg:py-3',
              },
              ...(['first', 'second'] as const).map((which) => {
                const header = text.columns.under(which === 'first' ? entry : mix.with);
                return {
                  key: which,
                  header,
                  cell: (row: (typeof mix.classes)[number]) => {
                    const value = ledgerText.fraction(row[which]);
                    return <Figure value={value} narrow={text.narrow(header, value)} />;
                  },
                  stacked: 'max-lg:col-span-2 max-lg:order-2',
                  className: 'lg:w-26',
                };
              }),
              {
                key: 'mixed',
                header: text.columns.mixed,
                cell: ({ mixed }) => {
                  const value = ledgerText.fraction(mixed);
                  return <Figure value={value} narrow={text.narrow(text.columns.mixed, value)} />;
                },
                stacked: 'max-lg:order-3 max-lg:col-span-2 font-bold',
                className: 'lg:w-26',
              },
              {
                key: 'dealt',
                header: text.columns.dealtOnceIn,
                cell: ({ dealtOnceIn }) => {
                  const value = ledgerText.symmetry.solves(dealtOnceIn);
                  return <Figure value={value} narrow={ledgerText.symmetry.dealtOnceIn(value)} />;
                },
                stacked: 'max-lg:order-4 max-lg:col-span-2',
                className: 'lg:w-32',
              },
            ]}
          />
        </>
      )}
    </Section>
  );
}
