import { LedgerTable } from '#renderer/ledger-table.tsx';
import { Section, TextLink } from '#renderer/ui/index.ts';
import type { LedgerClass, LedgerView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { CaseStrip } from './case-strip.tsx';
import { casesHref } from './cases/cases-query.ts';
import { Figure } from './figure.tsx';

const text = ledgerText.symmetry;

/** The classes of cases by their angles: how many, what they look like, and how often a solve deals each of them. */
export function SymmetryTable({ view }: { view: LedgerView }) {
  const { classes, of } = view;
  return (
    <Section
      title={text.title}
      aside={
        <TextLink href={casesHref(view)} className="screen-only">
          {text.list}
        </TextLink>
      }
    >
      <LedgerTable
        caption={text.caption}
        rows={classes}
        rowKey={({ angles, prior }) => `${angles} ${prior.numerator}/${prior.denominator}`}
        stackedRow="grid-cols-2"
        columns={[
          {
            key: 'angles',
            header: text.columns.angles,
            rowHeader: true,
            cell: ({ angles }) => <Figure value={String(angles)} narrow={text.angles(angles)} />,
            stacked: '',
            className: 'lg:w-16',
          },
          {
            key: 'cases',
            header: text.columns.cases,
            cell: (row) => <CasesOfClass view={view} row={row} />,
            stacked: 'max-lg:not-print:text-end',
            className: 'lg:w-16',
          },
          {
            key: 'pictures',
            header: text.columns.pictures,
            headerHidden: true,
            cell: ({ shown }) => <CaseStrip shown={shown} />,
            stacked: 'max-lg:col-span-2 max-lg:py-3',
          },
          {
            key: 'weight',
            header: text.columns.weight(of),
            cell: ({ prior }) => {
              const weight = ledgerText.whole((prior.numerator * of) / prior.denominator);
              return <Figure value={weight} narrow={text.weight(weight, of)} />;
            },
            stacked: '',
            className: 'lg:w-28',
          },
          {
            key: 'prior',
            header: text.columns.prior,
            cell: ({ prior }) => {
              const value = ledgerText.fraction(prior);
              return <Figure value={value} narrow={text.prior(value)} />;
            },
            stacked: 'max-lg:not-print:text-end',
            className: 'lg:w-20',
          },
          {
            key: 'dealt',
            header: text.columns.dealtOnceIn,
            cell: ({ dealtOnceIn }) => {
              const value = text.solves(dealtOnceIn);
              return <Figure value={value} narrow={text.dealtOnceIn(value)} />;
            },
            stacked: 'max-lg:col-span-2',
            className: 'lg:w-28',
          },
        ]}
      />
      <p className="mt-3 max-w-[46rem] text-[0.9375rem] text-ink-2">{text.note}</p>
    </Section>
  );
}

/** How many; where more than are shown, the way to all of them. */
function CasesOfClass({ view, row: { cases, angles, shown } }: { view: LedgerView; row: LedgerClass }) {
  const number = <Figure value={ledgerText.whole(cases)} narrow={text.cases(cases)} />;
  if (cases === shown.length) return number;
  return (
    <TextLink
      href={casesHref(view, { angles })}
      aria-label={text.everyLong(cases, angles)}
      className="max-lg:not-print:inline-flex max-lg:not-print:min-h-12 max-lg:not-print:items-center"
    >
      {number}
    </TextLink>
  );
}
