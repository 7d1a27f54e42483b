import { LedgerTable } from '#renderer/ledger-table.tsx';
import { useVisitor } from '#renderer/session.tsx';
import { FlatView, TextLink } from '#renderer/ui/index.ts';
import type { LedgerCasesInput, LedgerCasesView, ListedCase } from '#shared/contracts/ledger.ts';
import type { LedgerSort } from '#shared/contracts/ledger-lists.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { Figure } from '../figure.tsx';
import type { Step } from '../ledger-query.ts';
import { casesHref } from './cases-query.ts';

const text = ledgerText.list;
const { symmetry } = ledgerText;

export interface CaseListProps {
  readonly view: LedgerCasesView;
  readonly step: Step;
  /** Filter and order as they stand. */
  readonly chosen: Omit<LedgerCasesInput, keyof Step | 'page'>;
}

/** One page of a step's cases; where somebody is signed in and the trade has the set, each leads to its own page. */
export function CaseList({ view, step, chosen }: CaseListProps) {
  const visitor = useVisitor();
  const { trade } = view;
  const hrefOf = (one: ListedCase) =>
    visitor && trade && !one.skip ? `/catalogue/${trade.key}/cases/${encodeURIComponent(one.key)}` : null;
  const sort = (by: LedgerSort) => {
    const now = (chosen.sort ?? 'number') === by ? (chosen.order ?? 'ascending') : null;
    const order = now === 'ascending' ? ('descending' as const) : undefined;
    return { direction: now ?? ('none' as const), href: casesHref(step, { ...chosen, sort: by, order }) };
  };
  return (
    <LedgerTable
      caption={text.caption}
      rows={view.cases}
      rowKey={({ number }) => String(number)}
      stackedRow="grid-cols-[4.5rem_1fr_auto] items-baseline"
      empty={text.empty}
      columns={[
        {
          key: 'picture',
          header: text.columns.picture,
          headerHidden: true,
          cell: ({ picture }) => (
            <FlatView stickers={picture.stickers} colouring={picture.colouring} className="w-14" />
          ),
          stacked: 'max-lg:row-span-3 max-lg:self-center',
          className: 'lg:w-20',
        },
        {
          key: 'number',
          header: text.columns.number,
          sort: sort('number'),
          cell: ({ number }) => <Figure value={String(number)} narrow={text.number(number)} />,
          stacked: 'max-lg:order-2 max-lg:not-print:text-end max-lg:text-ink-2',
          className: 'lg:w-24',
        },
        {
          key: 'name',
          header: text.columns.name,
          rowHeader: true,
          sort: sort('name'),
          cell: (one) => {
            const href = hrefOf(one);
            return href ? <TextLink href={href}>{one.name}</TextLink> : one.name;
          },
          stacked: 'max-lg:order-1',
          className: 'lg:w-32',
        },
        {
          key: 'group',
          header: text.columns.group,
          sort: sort('group'),
          cell: ({ group }) => group,
          stacked: 'max-lg:order-3',
        },
        {
          key: 'angles',
          header: text.columns.angles,
          cell: ({ angles }) => <Figure value={String(angles)} narrow={symmetry.angles(angles)} />,
          stacked: 'max-lg:order-4 max-lg:not-print:text-end',
          className: 'lg:w-24',
        },
        {
          key: 'prior',
          header: text.columns.prior,
          sort: sort('prior'),
          cell: ({ prior }) => {
            const value = ledgerText.fraction(prior);
            return <Figure value={value} narrow={symmetry.prior(value)} />;
          },
          stacked: 'max-lg:order-5',
          className: 'lg:w-28',
        },
        {
          key: 'dealt',
          header: text.columns.dealtOnceIn,
          cell: ({ dealtOnceIn }) => (
            <Figure value={symmetry.solves(dealtOnceIn)} narrow={text.onceIn(symmetry.solves(dealtOnceIn))} />
          ),
          stacked: 'max-lg:order-6 max-lg:not-print:text-end',
          className: 'lg:w-40',
        },
      ]}
    />
  );
}
