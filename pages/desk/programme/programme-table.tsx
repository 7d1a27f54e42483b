import { Button, type Column, DataTable, EmptyState } from '#renderer/ui/index.ts';
import type { ProgrammeView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';

const text = deskText.programme;

export type ProgrammeRow = ProgrammeView['rows'][number];

interface RowActions {
  onEdit(row: ProgrammeRow): void;
  onWithdraw(row: ProgrammeRow): void;
}

/** The sets of the programme, with what can be done to each. */
export function ProgrammeTable({ view, onEdit, onWithdraw }: { view: ProgrammeView } & RowActions) {
  if (view.rows.length === 0) {
    return (
      <EmptyState title={text.empty}>
        <p>{text.emptyLead}</p>
      </EmptyState>
    );
  }
  const columns: readonly Column<ProgrammeRow>[] = [
    {
      key: 'set',
      header: text.columns.set,
      rowHeader: true,
      cell: (row) => (
        <>
          {row.name}
          {/* On a phone the last column would lie out of sight. */}
          <span className="mt-2 flex flex-col items-start gap-2 sm:hidden">
            <Actions row={row} onEdit={onEdit} onWithdraw={onWithdraw} />
          </span>
        </>
      ),
    },
    {
      key: 'edition',
      header: text.columns.edition,
      cell: (row) =>
        row.pinnedEdition === null
          ? text.newest(row.newestEdition)
          : text.pinned(row.pinnedEdition, row.newestEdition),
    },
    {
      key: 'limit',
      header: text.columns.limit,
      nowrap: true,
      cell: (row) => text.limit(row.limitMs),
    },
    {
      key: 'auf',
      header: text.columns.auf,
      cell: (row) => (row.asksAuf ? text.asked : text.notAsked),
    },
    { key: 'who', header: text.columns.who, className: 'min-w-40', cell: (row) => whoAnswers(row, view) },
    {
      key: 'actions',
      header: text.columns.actions,
      nowrap: true,
      className: 'hidden sm:table-cell',
      cell: (row) => (
        <span className="inline-flex gap-2">
          <Actions row={row} onEdit={onEdit} onWithdraw={onWithdraw} />
        </span>
      ),
    },
  ];
  return (
    <DataTable
      caption={text.caption}
      captionHidden
      columns={columns}
      rows={view.rows}
      rowKey={(row) => row.setKey}
    />
  );
}

function Actions({ row, onEdit, onWithdraw }: { row: ProgrammeRow } & RowActions) {
  return (
    <>
      <Button
        kind="outlined"
        size="small"
        className="max-sm:min-h-12"
        aria-label={text.editOf(row.name)}
        onClick={() => onEdit(row)}
      >
        {text.edit}
      </Button>
      <Button
        kind="outlined"
        size="small"
        className="max-sm:min-h-12"
        aria-label={text.withdrawOf(row.name)}
        onClick={() => onWithdraw(row)}
      >
        {text.withdraw}
      </Button>
    </>
  );
}

function whoAnswers(row: ProgrammeRow, { members }: ProgrammeView): string {
  if (row.forEveryone) return text.everyone;
  const names = members.filter(({ memberId }) => row.memberIds.includes(memberId));
  return names.length === 0 ? text.nobody : names.map(({ nickname }) => nickname).join(', ');
}
