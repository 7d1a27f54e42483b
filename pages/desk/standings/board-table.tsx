import { type Column, cx, DataTable, EmptyState, FigureBar } from '#renderer/ui/index.ts';
import type { StandingsBoard } from '#shared/contracts/member.ts';
import { deskText } from '#shared/text/desk.ts';
import { numberText } from '#shared/text/numbers.ts';
import { sayFigure } from '../say-figure.ts';

const text = deskText.standings;
const { percent } = numberText;

type Row = StandingsBoard['rows'][number];

function RestsOn({ row, className }: { row: Row; className?: string }) {
  if (row.figure.rests === 'nothing') return null;
  return (
    <span className={cx('whitespace-nowrap text-[0.8125rem] text-ink-2 sm:text-[0.9375rem]', className)}>
      {row.figure.rests === 'elsewhere'
        ? deskText.elsewhere
        : text.restsOn(row.figure.answers, row.daysCounted)}
    </span>
  );
}

const member: Column<Row> = {
  key: 'member',
  header: text.member,
  rowHeader: true,
  nowrap: true,
  cell: (row) => (
    <>
      {row.nickname}
      {row.isMe && <span className="ps-2 text-xs font-normal text-ink-2">{text.isMe}</span>}
    </>
  ),
};

const figure: Column<Row> = {
  key: 'figure',
  header: text.figure,
  className: 'w-[40%] min-w-38',
  cell: (row) =>
    row.figure.rests === 'nothing' ? (
      <span className="text-sm text-ink-2">{deskText.notBegun}</span>
    ) : (
      <>
        <FigureBar
          figure={row.figure}
          text={percent(row.figure.value, 1)}
          label={sayFigure(row.figure)}
          hollow={row.figure.few}
          strong
        />
        <RestsOn row={row} className="block sm:hidden" />
      </>
    ),
};

const rests: Column<Row> = {
  key: 'rests',
  header: text.rests,
  className: 'hidden sm:table-cell',
  cell: (row) => <RestsOn row={row} />,
};

const RANKED: readonly Column<Row>[] = [
  { key: 'rank', header: text.rank, align: 'end', cell: (row) => row.rank, className: 'w-12' },
  member,
  figure,
  { key: 'low', header: text.low, align: 'end', cell: (row) => percent(row.figure.low, 1) },
  rests,
];

const UNRANKED: readonly Column<Row>[] = [member, figure, rests];

/** A board: the ranked, and under them who has answered too little to be. */
export function BoardTable({ board }: { board: StandingsBoard }) {
  if (board.rows.length + board.unranked.length === 0) {
    return (
      <EmptyState title={text.empty}>
        <p>{text.emptyLead}</p>
      </EmptyState>
    );
  }
  return (
    <>
      <DataTable
        caption={text.caption(board.name)}
        captionHidden
        columns={RANKED}
        rows={board.rows}
        rowKey={(row) => row.nickname}
        density="tight"
        empty={text.noRanked}
      />
      {board.unranked.length > 0 && (
        <div className="mt-8">
          <DataTable
            caption={`${text.unranked}. ${text.unrankedLead(board.days)}`}
            columns={UNRANKED}
            rows={board.unranked}
            rowKey={(row) => row.nickname}
            density="tight"
          />
        </div>
      )}
    </>
  );
}
