import { type LedgerColumn, LedgerTable } from '#renderer/ledger-table.tsx';
import { AlgorithmText, AppLink, FlatView } from '#renderer/ui/index.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { numberText } from '#shared/text/numbers.ts';
import { caseHref } from '../case-href.ts';
import type { CaseRow, Sort, SortOrder } from './sort-cases.ts';

const text = catalogueText.edition;

/** The cases of an edition with all their algorithms, the one shown first on top. */
export function CaseTable({
  setKey,
  cases,
  order,
  sortHref,
  empty,
}: {
  setKey: string;
  cases: readonly CaseRow[];
  order: SortOrder;
  sortHref: (order: SortOrder) => string;
  empty: string;
}) {
  const sort = (by: Sort) => ({
    direction:
      order.by !== by
        ? ('none' as const)
        : order.descending
          ? ('descending' as const)
          : ('ascending' as const),
    href: sortHref({ by, descending: order.by === by && !order.descending }),
  });
  const columns: readonly LedgerColumn<CaseRow>[] = [
    {
      key: 'picture',
      header: text.columns.picture,
      headerHidden: true,
      className: 'lg:w-24 lg:py-2!',
      stacked: 'col-start-1 row-start-1 row-span-3',
      cell: ({ picture }) => (
        <FlatView stickers={picture.stickers} colouring={picture.colouring} className="w-14 lg:w-15" />
      ),
    },
    {
      key: 'name',
      header: text.columns.name,
      rowHeader: true,
      sort: sort('name'),
      className: 'lg:w-24',
      stacked: 'col-start-2 row-start-1',
      cell: ({ key, name }) => (
        <AppLink href={caseHref(setKey, key)} className="link inline-flex min-h-12 items-center lg:min-h-8">
          {name}
        </AppLink>
      ),
    },
    {
      key: 'group',
      header: text.columns.group,
      sort: sort('group'),
      className: 'lg:w-44',
      stacked: 'col-start-3 row-start-1 text-end lg:text-start',
      cell: ({ group }) => group || text.noGroup,
    },
    {
      key: 'prior',
      header: text.columns.prior,
      sort: sort('prior'),
      className: 'lg:w-28 whitespace-nowrap',
      stacked: 'col-start-2 row-start-2 text-ink-2 lg:text-ink',
      cell: ({ prior }) => numberText.fraction(prior),
    },
    {
      key: 'angles',
      header: text.columns.angles,
      sort: sort('angles'),
      className: 'lg:w-24 whitespace-nowrap',
      stacked: 'col-start-3 row-start-2 text-end text-ink-2 lg:text-start lg:text-ink',
      cell: ({ angles }) => (
        <>
          <span className="lg:hidden">{text.angles(angles)}</span>
          <span className="hidden lg:inline">{angles}</span>
        </>
      ),
    },
    {
      key: 'algorithms',
      header: text.columns.algorithms,
      sort: sort('algorithms'),
      stacked: 'col-span-2 col-start-2 row-start-3 mt-1 min-w-0 lg:mt-0',
      cell: ({ algorithms }) => (
        <ol className="space-y-1">
          {algorithms.map(({ algorithm, note }) => (
            <li key={algorithm} className="text-ink-2 first:text-ink">
              <AlgorithmText text={algorithm} className="break-words" />
              {note && <span className="block break-words text-sm text-ink-2">{note}</span>}
            </li>
          ))}
        </ol>
      ),
    },
  ];
  return (
    <LedgerTable
      caption={text.caption}
      columns={columns}
      rows={cases}
      rowKey={({ key }) => key}
      stackedRow="grid-cols-[3.5rem_minmax(0,1fr)_auto]"
      empty={empty}
    />
  );
}
