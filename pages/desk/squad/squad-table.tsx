import { useSearchParams } from 'react-router';
import { AppLink, type Column, DataTable, FigureBar, VisuallyHidden } from '#renderer/ui/index.ts';
import type { SquadRow, SquadView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';
import { printFigure, sayFigure, sayPastDate } from '../say-figure.ts';
import { meanOf, notBegun } from './squad-mean.ts';
import { firstDirection, type Sort, type SortKey } from './squad-sort.ts';

const text = deskText.squad;

/** Keeps the names in view while the figures scroll under them. */
const STICKY = 'sticky left-0 z-10 bg-paper';

/** Columns of groups are many: they stand closer than others. */
const CLOSE = '!pe-3 [&>div]:min-w-13';

/** The grid of members and figures; every column sorts by a link of its own. */
export function SquadTable({ view, rows, sort }: { view: SquadView; rows: readonly SquadRow[]; sort: Sort }) {
  const sorting = useSorting(sort);
  const byGroup = view.setKey !== null;
  const figures = view.columns.flatMap((column, index): Column<SquadRow>[] => {
    const whole = column.dealt === null;
    const change: Column<SquadRow> = {
      key: `d.${column.key}`,
      header: (
        <>
          <VisuallyHidden>{text.changeOf(column.name)}</VisuallyHidden>
          {text.change}
        </>
      ),
      cell: (row) => <Change change={row.cells[index]?.change ?? null} />,
      align: 'end',
      className: 'w-18 min-w-18',
      sort: sorting(`d.${column.key}`),
    };
    return [
      {
        key: `r.${column.key}`,
        header: <FigureHead column={column} mean={meanOf(view, index)} notBegun={notBegun(view, index)} />,
        cell: (row) => <FigureCell row={row} index={index} strong={byGroup && whole} />,
        className: whole ? (byGroup ? 'w-28 min-w-22' : 'w-40 min-w-26') : CLOSE,
        sort: sorting(`r.${column.key}`),
      },
      ...(whole ? [change] : []),
    ];
  });
  return (
    <DataTable
      caption={
        byGroup ? text.titleOfGroups(view.sets.find((s) => s.setKey === view.setKey)?.name ?? '') : text.title
      }
      captionHidden
      density="tight"
      rows={rows}
      rowKey={(row) => row.memberId}
      columns={[
        {
          key: 'member',
          header: text.member,
          rowHeader: true,
          cell: (row) => <Name row={row} />,
          className: STICKY,
          sort: sorting('member'),
        },
        ...figures,
        {
          key: 'answers',
          header: text.answers,
          cell: (row) => row.answers,
          align: 'end',
          className: 'w-18 min-w-18',
          sort: sorting('answers'),
        },
        ...(byGroup ? [] : activityColumns(view, sorting)),
      ]}
    />
  );
}

function activityColumns(
  view: SquadView,
  sorting: (key: SortKey) => Column<SquadRow>['sort'],
): Column<SquadRow>[] {
  return [
    {
      key: 'trained',
      header: text.lastTrained,
      cell: (row) => sayPastDate(row.lastTrained, view.date),
      nowrap: true,
      sort: sorting('trained'),
    },
    {
      key: 'minutes',
      header: text.minutes,
      cell: (row) => text.minutesOf(row.minutesPerDay),
      align: 'end',
      sort: sorting('minutes'),
    },
  ];
}

/** The same address, sorted by a column; a second time the other way round. */
function useSorting({ key: by, direction }: Sort): (key: SortKey) => Column<SquadRow>['sort'] {
  const [search] = useSearchParams();
  return (key) => {
    const next = key !== by ? firstDirection(key) : direction === 'ascending' ? 'descending' : 'ascending';
    const to = new URLSearchParams(search);
    to.set('sort', key);
    to.set('dir', next === 'ascending' ? 'up' : 'down');
    return { direction: key === by ? direction : 'none', href: `/desk/squad?${to}` };
  };
}

function Name({ row }: { row: SquadRow }) {
  return (
    <>
      <AppLink
        href={`/desk/squad/${row.memberId}`}
        className="inline-flex min-h-12 items-center underline-offset-4 hover:underline sm:min-h-8"
      >
        {row.nickname}
      </AppLink>
      {row.role === 'captain' && (
        <span className="block text-xs font-normal leading-none text-ink-2">{text.roles.captain}</span>
      )}
    </>
  );
}

function FigureHead({
  column,
  mean,
  notBegun,
}: {
  column: SquadView['columns'][number];
  mean: number | null;
  notBegun: number;
}) {
  return (
    <>
      {column.dealt !== null && (
        <span className="block text-xs font-normal text-ink-2">
          {text.dealt(column.dealt)}
          <VisuallyHidden>{text.dealtLong}</VisuallyHidden>
        </span>
      )}
      {column.dealt === null && mean !== null && (
        <span className="block text-xs font-normal text-ink-2">
          {text.mean(mean)}
          {text.meanWithout(notBegun)}
        </span>
      )}
      {column.name}
    </>
  );
}

function FigureCell({ row, index, strong }: { row: SquadRow; index: number; strong: boolean }) {
  const cell = row.cells[index];
  if (!cell?.figure) return <span className="text-sm text-ink-2">{text.notAnswering}</span>;
  const { figure, change } = cell;
  if (figure.rests === 'nothing') return <span className="text-sm text-ink-2">{deskText.notBegun}</span>;
  return (
    <FigureBar
      figure={figure}
      text={printFigure(figure)}
      label={sayFigure(figure, change)}
      hollow={figure.few}
      strong={strong}
    />
  );
}

function Change({ change }: { change: number | null }) {
  if (change === null) return <span className="text-ink-2">{deskText.none}</span>;
  return <span className="text-sm font-bold text-ink-2">{deskText.points(change)}</span>;
}
