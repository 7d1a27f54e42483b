import { AlgorithmText, AppLink, type Column, DataTable, FlatView } from '#renderer/ui/index.ts';
import type { MyCase } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { caseHref } from '../case-href.ts';
import { sayDate } from '../say-date.ts';
import { StateMark } from '../state-mark.tsx';
import type { Sort } from './filter-cases.ts';

const text = memberText.cases;

/** Cases where there is room for a table. */
export function CaseTable({
  cases,
  today,
  sort,
  onSort,
}: {
  cases: readonly MyCase[];
  today: string;
  sort: Sort;
  onSort: (sort: Sort) => void;
}) {
  const sorting = (by: Sort, direction: 'ascending' | 'descending') => ({
    direction: sort === by ? direction : ('none' as const),
    onSort: () => onSort(by),
  });
  const columns: Column<MyCase>[] = [
    {
      key: 'picture',
      header: text.columns.picture,
      cell: (c) => (
        <FlatView stickers={c.picture.stickers} colouring={c.picture.colouring} className="w-14" />
      ),
    },
    {
      key: 'name',
      header: text.columns.name,
      rowHeader: true,
      sort: sorting('name', 'ascending'),
      nowrap: true,
      cell: (c) => (
        <AppLink href={caseHref(c.key)} className="hover:underline">
          <span className="font-normal text-ink-2">{c.setName}</span> <b>{c.name}</b>
          {c.tradeName && <span className="ms-2 font-normal text-ink-2">{c.tradeName}</span>}
        </AppLink>
      ),
    },
    { key: 'group', header: text.columns.group, cell: (c) => c.group },
    {
      key: 'algorithm',
      header: text.columns.algorithm,
      cell: (c) => <AlgorithmText text={c.algorithm} />,
    },
    {
      key: 'prior',
      header: text.columns.prior,
      align: 'end',
      nowrap: true,
      sort: sorting('prior', 'descending'),
      cell: (c) => memberText.prior(c.prior.weight, c.prior.total),
    },
    {
      key: 'state',
      header: text.columns.state,
      sort: sorting('state', 'ascending'),
      cell: (c) => <StateMark state={c.state} />,
    },
    {
      key: 'recall',
      header: text.columns.recall,
      align: 'end',
      sort: sorting('recall', 'ascending'),
      cell: (c) => (c.recall === null ? memberText.none : memberText.percent(c.recall)),
    },
    {
      key: 'next',
      header: text.columns.next,
      nowrap: true,
      sort: sorting('next', 'ascending'),
      cell: (c) => (c.nextDate === null ? memberText.none : sayDate(c.nextDate, today)),
    },
  ];
  return (
    <DataTable
      caption={text.caption}
      captionHidden
      columns={columns}
      rows={cases}
      rowKey={(c) => c.key}
      density="tight"
    />
  );
}
