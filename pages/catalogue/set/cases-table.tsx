import { useLocation, useSearchParams } from 'react-router';
import { type LedgerColumn, LedgerTable } from '#renderer/ledger-table.tsx';
import { queryHref } from '#renderer/query-href.ts';
import { AlgorithmText, AppLink, FlatView, TextLink } from '#renderer/ui/index.ts';
import type { CaseSort } from '#shared/contracts/case-sorts.ts';
import type { CatalogueSetView } from '#shared/contracts/catalogue.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { numberText } from '#shared/text/numbers.ts';
import { caseHref } from '../case-href.ts';

type Row = CatalogueSetView['rows'][number];
const text = catalogueText.set;

/** A page of cases, each leading to its own page. */
export function CasesTable({ view }: { view: CatalogueSetView }) {
  const [search] = useSearchParams();
  const { pathname } = useLocation();
  const order = search.get('sort') ?? 'name';
  const href = (change: Record<string, string | null>) =>
    queryHref(search, pathname, { after: null, before: null, ...change });
  const sort = (by: CaseSort) => ({
    direction:
      order === by
        ? ('ascending' as const)
        : order === `-${by}`
          ? ('descending' as const)
          : ('none' as const),
    href: href({ sort: nextOrder(order, by) }),
  });
  const last = view.from + view.rows.length - 1;
  return (
    <>
      <p role="status" className="pb-2 text-ink-2">
        {text.shown(view.from, last, view.found, view.cases)}
      </p>
      <LedgerTable
        caption={text.caption}
        columns={columnsOf(view, sort)}
        rows={view.rows}
        rowKey={({ key }) => key}
        stackedRow="grid-cols-[3.5rem_minmax(0,1fr)_auto]"
        empty={
          <>
            {text.none}{' '}
            <TextLink href={pathname} className="max-lg:inline-flex max-lg:min-h-12 max-lg:items-center">
              {text.showAll}
            </TextLink>
          </>
        }
      />
      {(view.previous !== null || view.next !== null) && (
        <nav aria-label={text.pages} className="screen-only flex flex-wrap gap-x-6 py-4">
          {view.previous !== null && (
            <TextLink href={href({ before: view.previous })} className="inline-flex min-h-12 items-center">
              {text.previous}
            </TextLink>
          )}
          {view.next !== null && (
            <TextLink href={href({ after: view.next })} className="inline-flex min-h-12 items-center">
              {text.next}
            </TextLink>
          )}
        </nav>
      )}
    </>
  );
}

/** What is most of comes first where one looks for that: what is dealt often, what has many algorithms. */
const MOST_FIRST: readonly CaseSort[] = ['prior', 'algorithms'];

/** The order a press on a header brings; null for the usual one. */
function nextOrder(order: string, by: CaseSort): string | null {
  const usual = MOST_FIRST.includes(by) ? `-${by}` : by;
  const turned = usual.startsWith('-') ? by : `-${by}`;
  const next = order === usual ? turned : usual;
  return next === 'name' ? null : next;
}

function columnsOf(
  { setKey, rows }: CatalogueSetView,
  sort: (by: CaseSort) => LedgerColumn<Row>['sort'],
): readonly LedgerColumn<Row>[] {
  const columns: readonly LedgerColumn<Row>[] = [
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
      className: 'lg:w-32',
      stacked: 'col-start-2 row-start-1',
      cell: ({ key, name, alias }) => (
        <>
          <AppLink href={caseHref(setKey, key)} className="link inline-flex min-h-12 items-center lg:min-h-8">
            {alias ?? name}
          </AppLink>
          {alias !== null && <span className="block font-normal text-ink-2">{name}</span>}
        </>
      ),
    },
    {
      key: 'number',
      header: text.columns.number,
      sort: sort('number'),
      className: 'lg:w-20 text-ink-2',
      stacked: 'sr-only lg:not-sr-only',
      cell: ({ number }) => numberText.whole(number),
    },
    {
      key: 'group',
      header: text.columns.group,
      sort: sort('group'),
      className: 'lg:w-44',
      stacked: 'col-start-3 row-start-1 self-center text-end lg:text-start',
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
      className: 'lg:w-20 whitespace-nowrap',
      stacked: 'col-start-3 row-start-2 text-end text-ink-2 lg:text-start lg:text-ink',
      cell: ({ angles }) => (
        <>
          <span className="lg:hidden">{catalogueText.edition.angles(angles)}</span>
          <span className="hidden lg:inline">{angles}</span>
        </>
      ),
    },
    {
      key: 'algorithms',
      header: text.columns.algorithm,
      sort: sort('algorithms'),
      stacked: 'col-span-2 col-start-2 row-start-3 mt-1 min-w-0 lg:mt-0',
      cell: ({ algorithm, algorithms }) =>
        algorithm === null ? (
          <span className="text-ink-2">{text.noAlgorithm}</span>
        ) : (
          <>
            <AlgorithmText text={algorithm} className="break-words" />
            {algorithms > 1 && (
              <span className="ps-3 text-sm whitespace-nowrap text-ink-2">{text.more(algorithms - 1)}</span>
            )}
          </>
        ),
    },
  ];
  // Where cases have no names but their numbers, the numbers are said once.
  return rows.every(({ name }) => name.startsWith('#'))
    ? columns.filter(({ key }) => key !== 'number')
    : columns;
}
