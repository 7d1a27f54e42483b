import { type Column, DataTable, FigureBar } from '#renderer/ui/index.ts';
import type { StandingsBoard } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';

type Row = StandingsBoard['rows'][number];

const text = memberText.club;

/** One set's board: ranked rows, then those with too few answers to be ranked. */
export function Board({ board }: { board: StandingsBoard }) {
  const columns: Column<Row>[] = [
    {
      key: 'rank',
      header: text.rank,
      className: 'w-12',
      cell: (row) => (row.rank === null ? memberText.none : row.rank),
    },
    {
      key: 'member',
      header: text.member,
      rowHeader: true,
      cell: (row) => (
        <span className={row.isMe ? 'font-bold' : 'font-normal'}>
          {row.nickname}
          {row.isMe && <span className="ms-2 font-normal text-ink-2">{text.you}</span>}
        </span>
      ),
    },
    {
      key: 'recall',
      header: text.recall,
      className: 'w-2/5',
      cell: ({ figure, isMe }) =>
        figure.rests === 'nothing' ? (
          <span className="text-sm text-ink-2">{memberText.notBegun}</span>
        ) : (
          <FigureBar
            figure={figure}
            text={memberText.percent(figure.value)}
            label={memberText.figureLabel(figure)}
            hollow={figure.few}
            strong={isMe}
          />
        ),
    },
  ];
  const rows = [...board.rows, ...board.unranked];
  return (
    <div>
      <DataTable
        caption={text.boardCaption(board.name, board.edition, board.limitMs / 1000)}
        columns={columns}
        rows={rows}
        rowKey={(row) => row.nickname}
        density="tight"
        empty={text.nobodyRanked}
      />
      {board.unranked.length > 0 && <p className="pt-2 text-sm text-ink-2">{text.unranked}</p>}
    </div>
  );
}
