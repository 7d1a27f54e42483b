import { type Column, DataTable, FigureBar } from '#renderer/ui/index.ts';
import type { ClubView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';

type SharedBoardView = ClubView['sharedBoards'][number];
type Row = SharedBoardView['rows'][number];

const text = memberText.club;

const COLUMNS: Column<Row>[] = [
  {
    key: 'club',
    header: text.club,
    rowHeader: true,
    cell: (row) => <span className={row.isMine ? 'font-bold' : 'font-normal'}>{row.club}</span>,
  },
  { key: 'members', header: text.members, align: 'end', cell: (row) => row.members },
  {
    key: 'recall',
    header: text.recall,
    className: 'w-2/5',
    cell: (row) => (
      <FigureBar
        figure={row}
        text={memberText.percent(row.value)}
        label={memberText.teamLabel(row.value, row.low, row.high)}
        strong={row.isMine}
      />
    ),
  },
];

/** Team figures of the clubs on a board. */
export function SharedBoard({ board }: { board: SharedBoardView }) {
  return (
    <DataTable
      caption={`${board.name}, ${board.setName}`}
      columns={COLUMNS}
      rows={board.rows}
      rowKey={(row) => row.club}
      density="tight"
      empty={text.sharedEmpty}
    />
  );
}
