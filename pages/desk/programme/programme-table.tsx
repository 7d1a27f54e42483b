import { Button, type Column, DataTable, EmptyState } from '#renderer/ui/index.ts';
import type { ProgrammeView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';

const text = deskText.programme;

/** Columns that a phone has no room for. */
const WIDER = 'hidden md:table-cell';

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
          {/* On a phone there is room for who answers; the other columns stand under the name. */}
          <span className="block text-sm font-normal text-ink-2 md:hidden">
            {text.inShort(editionOf(row), text.limit(row.limitMs), row.asksAuf)}
          </span>
          <span className="mt-2 flex flex-wrap items-start gap-2 md:hidden">
            <Actions row={row} onEdit={onEdit} onWithdraw={onWithdraw} />
          </span>
        </>
      ),
    },
    {
      key: 'edition',
      header: text.columns.edition,
      className: WIDER,
      cell: editionOf,
    },
    {
      key: 'limit',
      header: text.columns.limit,
      nowrap: true,
      className: WIDER,
      cell: (row) => text.limit(row.limitMs),
    },
    {
      key: 'auf',
      header: text.columns.auf,
      className: WIDER,
      cell: (row) => (row.asksAuf ? text.asked : text.notAsked),
    },
    {
      key: 'who',
      header: text.columns.who,
      className: 'w-[45%] md:w-auto md:min-w-40',
      cell: (row) => whoAnswers(row, view),
    },
    {
      key: 'actions',
      header: text.columns.actions,
      nowrap: true,
      className: WIDER,
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
        className="max-md:min-h-12"
        aria-label={text.editOf(row.name)}
        onClick={() => onEdit(row)}
      >
        {text.edit}
      </Button>
      <Button
        kind="outlined"
        size="small"
        className="max-md:min-h-12"
        aria-label={text.withdrawOf(row.name)}
        onClick={() => onWithdraw(row)}
      >
        {text.withdraw}
      </Button>
    </>
  );
}

function editionOf({ pinnedEdition, newestEdition }: ProgrammeRow): string {
  return pinnedEdition === null ? text.newest(newestEdition) : text.pinned(pinnedEdition, newestEdition);
}

function whoAnswers(row: ProgrammeRow, { members }: ProgrammeView): string {
  if (row.forEveryone) return text.everyone;
  const names = members.filter(({ memberId }) => row.memberIds.includes(memberId));
  return names.length === 0 ? text.nobody : names.map(({ nickname }) => nickname).join(', ');
}
